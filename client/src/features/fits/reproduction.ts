import { type CorrelationNumbersFragment } from '../../gql/graphql';

type Parameter = CorrelationNumbersFragment['parameters'][number];

/** One parameter, stored and computed again. */
export interface Reproduced {
  readonly symbol: string;
  readonly stored: number;
  readonly recomputed: number;
  readonly agrees: boolean;
}

/** Relative agreement that is asked for: 12 digits. */
const AGREEMENT = 1e-12;

const agree = (a: number, b: number): boolean => Math.abs(a - b) <= AGREEMENT * Math.max(Math.abs(a), Math.abs(b));

/** Each parameter beside its recomputed value; it agrees when its uncertainty does, too. */
export function compareParameters(stored: readonly Parameter[], recomputed: readonly Parameter[]): Reproduced[] {
  return stored.map(({ symbol, value, standardUncertainty: u }) => {
    const again = recomputed.find((candidate) => candidate.symbol === symbol);
    const sameUncertainty = u == null || agree(u, again?.standardUncertainty ?? NaN);
    return {
      symbol,
      stored: value,
      recomputed: again?.value ?? NaN,
      agrees: agree(value, again?.value ?? NaN) && sameUncertainty,
    };
  });
}
