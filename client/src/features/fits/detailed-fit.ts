import { type FitDetailQuery } from '../../gql/graphql';

/** A kept fit as its own page knows it. */
export type DetailedFit = NonNullable<FitDetailQuery['fit']>;
