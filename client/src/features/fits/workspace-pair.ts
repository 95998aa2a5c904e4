import { type WorkspaceQuery } from '../../gql/graphql';

/** A pair as its workspace knows it. */
export type Pair = NonNullable<WorkspaceQuery['pairById']>;
