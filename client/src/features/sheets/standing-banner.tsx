import { chakra } from '@chakra-ui/react';
import { type ReactNode } from 'react';
import { Link } from 'react-router-dom';
import { type SheetPageFragment } from '../../gql/graphql';
import { fill } from '../../lib/fill';
import { formatDate } from '../../lib/format-quantity';
import { paths } from '../../lib/paths';
import { sheetStrings } from '../../strings/sheets';
import { Banner } from '../../ui/feedback/banner';
import { StateMark, stateOf } from '../../ui/marks/state-mark';

const words = sheetStrings.banner;

interface StandingBannerProps {
  readonly version: SheetPageFragment;
  readonly code: string;
  /** Number of the version in force, when there is another. */
  readonly current: string | null;
}

/** What stands above the title of a version that is not in force. */
export function StandingBanner({ version, code, current }: StandingBannerProps) {
  const { number, status } = version;
  const state = stateOf(status);
  const see = current !== null && current !== number && (
    <>
      {words.see} <Link to={paths.version(code, current)}>{current}</Link>.
    </>
  );
  switch (status) {
    case 'RELEASED':
      return null;
    case 'SUPERSEDED':
      return (
        <Placed>
          <Banner mark={<StateMark state={state}>{fill(words.superseded, { number })}</StateMark>}>
            <Superseded version={version} code={code} /> {fill(words.supersededKeep, { number })}
          </Banner>
        </Placed>
      );
    case 'WITHDRAWN':
      return (
        <Placed>
          <Banner tone="warning" mark={<StateMark state={state}>{fill(words.withdrawn, { number })}</StateMark>}>
            {version.withdrawnAt &&
              fill(words.withdrawnOn, {
                date: formatDate(version.withdrawnAt),
                reason: version.withdrawalReason ?? '',
              })}{' '}
            {words.doNotUse} {see}
          </Banner>
        </Placed>
      );
    case 'DRAFT':
    case 'IN_REVIEW':
    case 'RETURNED':
    case 'APPROVED':
      return (
        <Placed>
          <Banner
            tone="warning"
            mark={<StateMark state={state}>{fill(words.unreleased, { number, state })}</StateMark>}
          >
            {words.unreleasedWords} {see}
          </Banner>
        </Placed>
      );
  }
}

const Placed = ({ children }: { readonly children: ReactNode }) => (
  <chakra.div
    paddingTop={{ base: '12px', md: '24px' }}
    marginLeft={{ base: 0, md: '32px', lg: '48px' }}
    maxWidth="896px"
  >
    {children}
  </chakra.div>
);

function Superseded({
  version: { supersededBy },
  code,
}: {
  readonly version: SheetPageFragment;
  readonly code: string;
}) {
  if (!supersededBy) return null;
  return (
    <>
      {words.supersededWords} <Link to={paths.version(code, supersededBy.number)}>{supersededBy.number}</Link>
      {supersededBy.releasedAt ? fill(words.supersededOn, { date: formatDate(supersededBy.releasedAt) }) : '.'}{' '}
      {supersededBy.changeNote}
    </>
  );
}
