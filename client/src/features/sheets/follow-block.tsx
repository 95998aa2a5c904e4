import { useMutation, useQuery } from '@apollo/client/react';
import { FollowedDocument, FollowSheetDocument, UnfollowSheetDocument } from '../../gql/graphql';
import { errorMessage } from '../../lib/apollo';
import { usePerson } from '../../lib/session';
import { sheetStrings } from '../../strings/sheets';
import { WordButton } from '../../ui/form/button';
import { MarginBlock } from '../../ui/page/margin-block';

const words = sheetStrings.follow;

/** Whoever has signed in may be told by letter when a version of the sheet is released or withdrawn. */
export function FollowBlock({ sheetId }: { readonly sheetId: string }) {
  const person = usePerson();
  const { data } = useQuery(FollowedDocument, { skip: person === null });
  const refetch = { refetchQueries: [FollowedDocument], awaitRefetchQueries: true, errorPolicy: 'all' as const };
  const [follow, following] = useMutation(FollowSheetDocument, refetch);
  const [unfollow, unfollowing] = useMutation(UnfollowSheetDocument, refetch);
  if (person === null || !data) return null;
  const isFollowed = data.subscriptions.some((subscription) => subscription.sheetId === sheetId);
  const act = isFollowed ? unfollow : follow;
  const error = following.error ?? unfollowing.error;
  return (
    <MarginBlock title={words.title}>
      <p role="status">{isFollowed ? words.followed : words.notFollowed}</p>
      <p>
        <WordButton
          disabled={following.loading || unfollowing.loading}
          onClick={() => void act({ variables: { sheetId } })}
        >
          {isFollowed ? words.unfollow : words.follow}
        </WordButton>
      </p>
      {error && <p role="alert">{errorMessage(error)}</p>}
    </MarginBlock>
  );
}
