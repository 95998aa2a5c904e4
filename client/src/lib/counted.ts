import { fill } from './fill';

/** Words for none, one, and `{n}` of a thing: the entry that fits, with its number. */
export const counted = (words: readonly [string, string, string], n: number): string =>
  fill(words[Math.min(n, 2)] ?? '', { n });
