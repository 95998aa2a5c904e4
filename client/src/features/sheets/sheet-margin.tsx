import { chakra } from '@chakra-ui/react';
import { type ReactNode } from 'react';
import { Link } from 'react-router-dom';
import { type SheetPageFragment } from '../../gql/graphql';
import { downloadFile } from '../../lib/download';
import { paths } from '../../lib/paths';
import { hasRole, usePerson } from '../../lib/session';
import { sheetStrings } from '../../strings/sheets';
import { WordButton } from '../../ui/form/button';
import { StateMark, stateOf } from '../../ui/marks/state-mark';
import { QuantityRange } from '../../ui/numbers/quantity';
import { Runs } from '../../ui/numbers/typeset';
import { MarginBlock, type MarginEntry } from '../../ui/page/margin-block';

const words = sheetStrings.margin;

interface MarginProps {
  readonly version: SheetPageFragment;
  readonly code: string;
}

/** State, version, ranges, dates, people: as the sheet states them, ranges in the reader's units. */
export function StandingBlock({ version }: MarginProps) {
  const { range, margin } = version.content;
  const shown = (value: string): ReactNode => {
    const [first] = value.split(', ');
    if (value.includes(' to ') && first?.includes('Pa')) {
      return (
        <>
          <QuantityRange kind="pressure" low={range.pressureMinimum} high={range.pressureMaximum} />,{' '}
          {range.pressureBasis.toLowerCase()}
        </>
      );
    }
    if (value.includes(' to ') && value.endsWith('K'))
      return <QuantityRange kind="temperature" low={range.temperatureMinimum} high={range.temperatureMaximum} />;
    return value;
  };
  const entries = margin.entries.map(({ label, value }): MarginEntry => [
    <Runs key="label" runs={label} />,
    shown(value),
  ]);
  return (
    <MarginBlock entries={[[words.state, <StateMark key="state" state={stateOf(version.status)} />], ...entries]} />
  );
}

/** PDF, CSV, JSON; plain links where anyone may have them. */
export function DownloadsBlock({ version, code }: MarginProps) {
  const { number } = version;
  const files = [
    ['pdf', words.pdf],
    ['csv', words.csv],
    ['json', words.json],
  ] as const;
  const isPublic = version.contentHash !== null && version.contentHash !== undefined;
  return (
    <MarginBlock title={words.take}>
      <chakra.ul listStyle="none" lineHeight={{ base: '36px', md: '24px' }} color="ink">
        {files.map(([format, name]) => {
          const path = paths.versionFile(code, number, format);
          const file = `${code}-${number}.${format}`;
          return (
            <li key={format}>
              {isPublic ? (
                <a href={path} download={file}>
                  {name}
                </a>
              ) : (
                <WordButton onClick={() => void downloadFile(path, file)}>{name}</WordButton>
              )}
            </li>
          );
        })}
        <li>
          <Link to={paths.apiGuide(code, number)}>{words.inCode}</Link>
        </li>
      </chakra.ul>
    </MarginBlock>
  );
}

/** SHA-256 in groups of four, and the archived bytes. */
export function IdentityBlock({ version }: { readonly version: SheetPageFragment }) {
  const { contentHash, doi } = version;
  if (!contentHash) return null;
  return (
    <MarginBlock title={words.identity}>
      <chakra.p fontFeatureSettings='"tnum"' letterSpacing="0.02em" color="ink">
        {contentHash.match(/.{1,4}/g)?.join(' ')}
      </chakra.p>
      <p>
        {words.identityNote} <a href={paths.release(contentHash, 'json')}>JSON</a>,{' '}
        <a href={paths.release(contentHash, 'pdf')}>PDF</a>
      </p>
      {doi && (
        <p>
          {words.doi} {doi}
        </p>
      )}
    </MarginBlock>
  );
}

/** Where researchers and editors go on from here. */
export function WorkBlock({ version, pairId }: MarginProps & { readonly pairId: string }) {
  const person = usePerson();
  if (!hasRole(person, 'RESEARCHER', 'EDITOR')) return null;
  const { status } = version;
  const act = hasRole(person, 'EDITOR') ? actOf(status, version.id) : null;
  return (
    <MarginBlock title={words.work}>
      <p>
        <Link to={paths.pair(pairId)}>{words.workspace}</Link>
      </p>
      {act && (
        <p>
          <Link to={act.to}>{act.name}</Link>
        </p>
      )}
    </MarginBlock>
  );
}

function actOf(status: SheetPageFragment['status'], id: string): { to: string; name: string } | null {
  switch (status) {
    case 'DRAFT':
    case 'RETURNED':
      return { to: paths.editVersion(id), name: words.edit };
    case 'IN_REVIEW':
      return { to: paths.review(id), name: words.review };
    case 'APPROVED':
      return { to: paths.releaseVersion(id), name: words.release };
    case 'RELEASED':
    case 'SUPERSEDED':
      return { to: paths.withdrawVersion(id), name: words.withdraw };
    case 'WITHDRAWN':
      return null;
  }
}
