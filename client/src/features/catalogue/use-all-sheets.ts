import { useQuery } from '@apollo/client/react';
import { useEffect } from 'react';
import { CatalogueDocument } from '../../gql/graphql';

/**
 * The released sheets that match, page after page: the list is sorted and filtered as a whole, and one query for all of it
 * would cost more than the service allows.
 */
export function useAllSheets(search: string) {
  const { data, error, refetch, fetchMore } = useQuery(CatalogueDocument, { variables: { search: search || null } });
  const page = data?.dataSheets.pageInfo;
  const next = page?.hasNextPage ? (page.endCursor ?? null) : null;
  useEffect(() => {
    if (next === null) return;
    void fetchMore({
      variables: { after: next },
      updateQuery: (before, { fetchMoreResult: after }) => ({
        dataSheets: { ...after.dataSheets, edges: [...before.dataSheets.edges, ...after.dataSheets.edges] },
      }),
    });
  }, [next, fetchMore]);
  return { data, error, refetch };
}
