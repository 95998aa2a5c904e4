import { skipToken, useQuery } from '@apollo/client/react';
import { FitsToCompareDocument } from '../../gql/graphql';
import { errorMessage } from '../../lib/apollo';
import { pairTitle } from '../../lib/pair-title';
import { paths } from '../../lib/paths';
import { fitStrings } from '../../strings/fits';
import { Empty, Failed, Loading } from '../../ui/feedback/states';
import { Page } from '../../ui/page/page';
import { Opening } from '../../ui/page/section';
import { CompareSection } from './compare-section';

const pairs = { name: fitStrings.path.pairs, to: paths.pairs() };
const title = fitStrings.compare.title;

/** Kept fits of one pair side by side, on a page of their own. */
export function ComparePage({ ids }: { readonly ids: readonly string[] }) {
  const [first] = ids;
  const { data, error, refetch } = useQuery(
    FitsToCompareDocument,
    first === undefined ? skipToken : { variables: { id: first } },
  );
  const pair = data?.fit?.pair;
  if (!pair) {
    return (
      <Page title={title} path={[pairs, { name: title }]}>
        <Opening small title={title}>
          {error && <Failed what={fitStrings.failed.fit} why={errorMessage(error)} onRetry={() => void refetch()} />}
          {!error && !data && first !== undefined && <Loading what={fitStrings.what.comparison} />}
          {(data || first === undefined) && <Empty sentence={fitStrings.missing.fit} />}
        </Opening>
      </Page>
    );
  }
  const name = pairTitle(pair.substances);
  return (
    <Page title={`${title}, ${name}`} path={[pairs, { name, to: paths.pair(pair.id) }, { name: title }]}>
      <Opening small title={name} />
      <CompareSection own fits={pair.fits} pairId={pair.id} initial={ids} />
    </Page>
  );
}
