import { useQuery } from '@apollo/client/react';
import { type ReactNode } from 'react';
import { Link } from 'react-router-dom';
import { CatalogueNewsDocument, type NewsVersionFragment } from '../../gql/graphql';
import { formatShortDate } from '../../lib/format-quantity';
import { paths } from '../../lib/paths';
import { catalogueStrings } from '../../strings/catalogue';
import { StateMark } from '../../ui/marks/state-mark';
import { MarginBlock, type MarginEntry } from '../../ui/page/margin-block';
import { pairTitle } from './catalogue-row';

/** In the margin: what was released last, and what was withdrawn and why. */
export function CatalogueNews() {
  const { data } = useQuery(CatalogueNewsDocument);
  if (!data || data.latestReleases.length + data.latestWithdrawals.length === 0) return null;
  const releases = data.latestReleases.map((version): MarginEntry => [
    version.releasedAt ? dayAndMonth(version.releasedAt) : '',
    <News key={version.id} version={version}>
      {version.changeNote ?? version.summary}
    </News>,
  ]);
  const withdrawals = data.latestWithdrawals.map((version): MarginEntry => [
    version.withdrawnAt ? dayAndMonth(version.withdrawnAt) : '',
    <News key={version.id} version={version}>
      <StateMark state="withdrawn" />
      {version.withdrawalReason && `: ${version.withdrawalReason}`}
    </News>,
  ]);
  return (
    <>
      {releases.length > 0 && <MarginBlock kind="news" title={catalogueStrings.news} entries={releases} />}
      {withdrawals.length > 0 && <MarginBlock kind="news" title={catalogueStrings.withdrawn} entries={withdrawals} />}
    </>
  );
}

const dayAndMonth = (iso: string): string => formatShortDate(iso).replace(/ \d{4}$/, '');

const News = ({
  version: { number, sheet },
  children,
}: {
  readonly version: NewsVersionFragment;
  readonly children: ReactNode;
}) => (
  <>
    <Link to={paths.version(sheet.code, number)}>{`${pairTitle(sheet.pair.substances)} ${number}`}</Link>
    <br />
    {children}
  </>
);
