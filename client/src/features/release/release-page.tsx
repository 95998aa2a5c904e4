import { useQuery } from '@apollo/client/react';
import { chakra, useSlotRecipe } from '@chakra-ui/react';
import { type ReactNode } from 'react';
import { Link } from 'react-router-dom';
import {
  RehearseReleaseDocument,
  type VersionAtReleaseFragment,
  VersionToReleaseDocument,
  type VersionToReleaseQuery,
} from '../../gql/graphql';
import { errorMessage } from '../../lib/apollo';
import { fill } from '../../lib/fill';
import { formatDate } from '../../lib/format-quantity';
import { pairTitle } from '../../lib/pair-title';
import { paths } from '../../lib/paths';
import { usePerson } from '../../lib/session';
import { versionStrings } from '../../strings/versions';
import { Empty, Failed, Loading } from '../../ui/feedback/states';
import { TickMark, WarnMark } from '../../ui/marks/marks';
import { StateMark, stateOf } from '../../ui/marks/state-mark';
import { QuantityRange } from '../../ui/numbers/quantity';
import { Typeset } from '../../ui/numbers/typeset';
import { MarginBlock } from '../../ui/page/margin-block';
import { Page } from '../../ui/page/page';
import { Opening, Section } from '../../ui/page/section';
import { dryRunRecipe } from '../../ui/recipes/content.recipe';
import { DataTable } from '../../ui/table/data-table';
import { isNewEdition } from './changes';
import { ChangesSection } from './changes-section';
import { ReleaseForm } from './release-form';
import { acts } from './who-did-what';

const words = versionStrings.release;
const sheets = { name: versionStrings.path.sheets, to: paths.catalogue() };
type Latest = VersionToReleaseQuery['latestReleases'][number];

/** An approved version: what its release will do, who did what, and the password beside the one button. */
export function ReleasePage({ id }: { readonly id: string }) {
  const { data, error, refetch } = useQuery(VersionToReleaseDocument, {
    variables: { id },
    fetchPolicy: 'network-only',
    nextFetchPolicy: 'cache-first',
  });
  const version = data?.node?.__typename === 'DataSheetVersion' ? data.node : null;
  if (version?.status === 'APPROVED')
    return <Release version={version} latest={data?.latestReleases[0] ?? null} onReload={() => void refetch()} />;
  const title = versionStrings.path.release;
  return (
    <Page
      title={title}
      path={[sheets, { name: title }]}
      folio={version && <StateMark state={stateOf(version.status)} />}
    >
      <Opening small title={version ? pairTitle(version.sheet.pair.substances) : title}>
        {error && <Failed what={versionStrings.failed} why={errorMessage(error)} onRetry={() => void refetch()} />}
        {!error && !data && <Loading what={versionStrings.what} />}
        {data && !version && <Empty sentence={versionStrings.missing} />}
        {version && (
          <Empty sentence={fill(versionStrings.closed, { state: stateOf(version.status), cannot: words.cannot })}>
            <Link to={paths.version(version.sheet.code, version.number)}>{versionStrings.toSheet}</Link>
          </Empty>
        )}
      </Opening>
    </Page>
  );
}

interface ReleaseProps {
  readonly version: VersionAtReleaseFragment;
  readonly latest: Latest | null;
  readonly onReload: () => void;
}

function Release({ version, latest, onReload }: ReleaseProps) {
  const { number, sheet } = version;
  const name = pairTitle(sheet.pair.substances);
  const title = fill(words.title, { title: `${name.charAt(0).toLowerCase()}${name.slice(1)}`, number });
  return (
    <Page
      title={title}
      path={[
        sheets,
        { name, to: paths.sheet(sheet.code) },
        { name: fill(versionStrings.path.version, { number }), to: paths.version(sheet.code, number) },
        { name: versionStrings.path.release },
      ]}
      folio={
        <>
          <StateMark state="approved">{fill(versionStrings.folio, { number, state: 'approved' })}</StateMark>
          <span>{formatDate(version.updatedAt)}</span>
        </>
      }
    >
      <Opening small title={title} lead={words.lead} margin={<FactsBlock version={version} />} />
      <Section
        number={1}
        title={words.happens}
        id="what-will-happen"
        tight
        margin={
          <MarginBlock title={words.failing}>
            <p>{words.failingNote}</p>
          </MarginBlock>
        }
      >
        <DryRun version={version} latest={latest} />
      </Section>
      <ChangesSection version={version} />
      <WhoSection version={version} />
      <Section number={4} title={words.release} id="release">
        <ReleaseForm version={version} onReload={onReload} />
      </Section>
    </Page>
  );
}

function FactsBlock({ version }: { readonly version: VersionAtReleaseFragment }) {
  const { validity } = version.correlation;
  const { current } = version.sheet;
  const kind =
    current === null || current === undefined
      ? words.first
      : isNewEdition(version.number, current.number)
        ? words.edition
        : words.revision;
  return (
    <MarginBlock
      entries={[
        [words.version, `${version.number}, ${kind}`],
        [
          <Typeset key="T">{words.rangeT}</Typeset>,
          <QuantityRange
            key="T"
            kind="temperature"
            low={validity.temperatureMinimum}
            high={validity.temperatureMaximum}
          />,
        ],
        [
          <Typeset key="P">{words.rangeP}</Typeset>,
          <QuantityRange key="P" kind="pressure" low={validity.pressureMinimum} high={validity.pressureMaximum} />,
        ],
        [
          words.replaces,
          current && (
            <span key="current">
              <Link to={paths.version(version.sheet.code, current.number)}>{current.number}</Link>
              {current.releasedAt && `, ${formatDate(current.releasedAt)}`}
            </span>
          ),
        ],
        [words.rehearsed, <Rehearsal key="rehearsal" id={version.id} />],
      ]}
    />
  );
}

/** The fit computed once more, before anybody is asked for a password. */
function Rehearsal({ id }: { readonly id: string }) {
  const { data, error } = useQuery(RehearseReleaseDocument, { variables: { id }, fetchPolicy: 'network-only' });
  if (error) return <>{errorMessage(error)}</>;
  if (!data) return <>{words.rehearsing}</>;
  const agrees = data.reproduceVersion.every((number) => number.agrees);
  return (
    <span role="status">
      {agrees ? <TickMark /> : <WarnMark />}
      {agrees ? words.rehearsedYes : words.rehearsedNo}
    </span>
  );
}

const OPEN = ['DRAFT', 'IN_REVIEW', 'RETURNED', 'APPROVED'];

function DryRun({ version, latest }: Omit<ReleaseProps, 'onReload'>) {
  const { steps } = words;
  const { sheet, number } = version;
  const others = sheet.versions.filter(({ id, status }) => id !== version.id && OPEN.includes(status));
  const chain =
    latest === null
      ? steps.chainFirst
      : fill(steps.chainDetail, {
          title: pairTitle(latest.sheet.pair.substances),
          number: latest.number,
          hash: (latest.contentHash ?? '').slice(0, 8),
          date: latest.releasedAt ? formatDate(latest.releasedAt) : '',
        });
  return (
    <Steps
      steps={[
        [steps.freeze, steps.freezeDetail],
        [steps.chain, chain],
        [steps.doi, steps.doiDetail],
        [
          steps.archive,
          <>
            {steps.archiveDetail} <Link to={paths.version(sheet.code, number)}>{steps.pdf}</Link>
          </>,
        ],
        ...(sheet.current
          ? [
              [
                fill(steps.supersede, { number: sheet.current.number }),
                fill(steps.supersedeDetail, { next: number }),
              ] as const,
            ]
          : []),
        ...(others.length > 0
          ? [
              [
                steps.others,
                fill(steps.othersDetail, { versions: others.map((other) => other.number).join(', ') }),
              ] as const,
            ]
          : []),
        [steps.tell, version.changeNote ? fill(steps.tellDetail, { note: version.changeNote }) : steps.tellFirst],
      ]}
    />
  );
}

function Steps({ steps }: { readonly steps: readonly (readonly [string, ReactNode])[] }) {
  const styles = useSlotRecipe({ recipe: dryRunRecipe })();
  return (
    <chakra.ol css={styles.root}>
      {steps.map(([what, detail], i) => (
        <chakra.li css={styles.step} key={what}>
          <chakra.span css={styles.when}>
            {i === 0 ? words.when.first : i === steps.length - 1 ? words.when.last : words.when.then}
          </chakra.span>
          <div>
            <chakra.p css={styles.what}>{what}</chakra.p>
            <chakra.p css={styles.detail}>{detail}</chakra.p>
          </div>
        </chakra.li>
      ))}
    </chakra.ol>
  );
}

function WhoSection({ version }: { readonly version: VersionAtReleaseFragment }) {
  const rows = acts(version, usePerson());
  return (
    <Section
      number={3}
      title={words.who}
      id="who"
      margin={
        <MarginBlock>
          <p>{words.nobody}</p>
        </MarginBlock>
      }
    >
      <DataTable
        label={words.who}
        rows={rows}
        rowId={({ id }) => id}
        file={`${version.sheet.code}-${version.number}-acts`}
        filterable={false}
        emphasised={({ at }) => at === null}
        columns={[
          { id: 'act', head: words.act, name: words.act, sortable: false, value: ({ act }) => act },
          { id: 'person', head: words.person, name: words.person, sortable: false, value: ({ person }) => person },
          {
            id: 'at',
            head: words.date,
            name: words.date,
            numeric: true,
            sortable: false,
            value: ({ at }) => at ?? words.now,
            cell: ({ at }) => (at === null ? words.now : formatDate(at)),
          },
          {
            id: 'check',
            head: words.check,
            name: words.check,
            sortable: false,
            wideOnly: true,
            value: ({ check }) => check,
            cell: ({ check }) =>
              check && (
                <>
                  <TickMark />
                  {check}
                </>
              ),
          },
        ]}
      />
    </Section>
  );
}
