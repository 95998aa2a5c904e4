/** A row of Marrero and Mason's tables, in their units. */
export interface MarreroMasonRow {
  readonly pair: string;
  /** atm cm² s⁻¹ K⁻ˢ */
  readonly a: number;
  readonly s: number;
  /** φ0/k, K; 0 where equation 4.3-2 holds */
  readonly phi: number;
  /** S in K and S′ in K² */
  readonly capitalS: number;
  readonly capitalSPrime: number;
  /** K */
  readonly range: readonly [number, number];
  /** The group of their figure 4; null where the limit is stated for the pair alone, in a table we do not have */
  readonly group: keyof typeof LIMITS | null;
}

/** Limits of uncertainty, percent, at these temperatures in K: their figure 4, read between by ln T. */
const LIMIT_TEMPERATURES = [65, 300, 500, 1000, 10000];
const LIMITS = { I: [2, 1, 2, 5, 10], II: [4, 2, 3, 7, 15], III: [null, 3, 4, 10, 20] } as const;

/**
 * Source: T. R. Marrero, E. A. Mason, *J. Phys. Chem. Ref. Data* 1 (1972) 3, Tables 12 and 13, doi:10.1063/1.3253094.
 */
export const marreroMasonRows: readonly MarreroMasonRow[] = [
  {
    pair: 'helium–nitrogen',
    a: 0.0158,
    s: 1.524,
    phi: 26500000.0,
    capitalS: 0,
    capitalSPrime: 0,
    range: [77.0, 10000.0],
    group: 'II',
  },
  {
    pair: 'neon–argon',
    a: 0.008779,
    s: 1.546,
    phi: 194000000.0,
    capitalS: 1.82,
    capitalSPrime: 1170.0,
    range: [90.0, 10000.0],
    group: 'I',
  },
  {
    pair: 'argon–xenon',
    a: 0.005,
    s: 1.563,
    phi: 3680000000.0,
    capitalS: 59.9,
    capitalSPrime: 0,
    range: [169.0, 10000.0],
    group: 'I',
  },
  {
    pair: 'argon–hydrogen',
    a: 0.0235,
    s: 1.519,
    phi: 48800000.0,
    capitalS: 39.8,
    capitalSPrime: 0,
    range: [242.0, 10000.0],
    group: 'II',
  },
  {
    pair: 'hydrogen–nitrogen',
    a: 0.01539,
    s: 1.548,
    phi: 31600000.0,
    capitalS: -2.8,
    capitalSPrime: 1067.0,
    range: [65.0, 10000.0],
    group: 'I',
  },
  {
    pair: 'helium–oxygen',
    a: 4.37e-5,
    s: 1.71,
    phi: 0,
    capitalS: 0,
    capitalSPrime: 0,
    range: [244.0, 10000.0],
    group: 'II',
  },
  {
    pair: 'helium–air',
    a: 3.78e-5,
    s: 1.729,
    phi: 0,
    capitalS: 0,
    capitalSPrime: 0,
    range: [244.0, 10000.0],
    group: 'II',
  },
  {
    pair: 'helium–carbon dioxide',
    a: 3.31e-5,
    s: 1.72,
    phi: 0,
    capitalS: 0,
    capitalSPrime: 0,
    range: [200.0, 530.0],
    group: 'II',
  },
  {
    pair: 'nitrogen–water',
    a: 1.87e-6,
    s: 2.072,
    phi: 0,
    capitalS: 0,
    capitalSPrime: 0,
    range: [282.0, 373.0],
    group: null,
  },
  {
    pair: 'nitrogen–carbon dioxide',
    a: 3.15e-5,
    s: 1.57,
    phi: 0,
    capitalS: 113.6,
    capitalSPrime: 0,
    range: [288.0, 1800.0],
    group: 'II',
  },
  {
    pair: 'air–water',
    a: 1.87e-6,
    s: 2.072,
    phi: 0,
    capitalS: 0,
    capitalSPrime: 0,
    range: [282.0, 450.0],
    group: null,
  },

  {
    pair: 'air–carbon dioxide',
    a: 2.7e-5,
    s: 1.59,
    phi: 0,
    capitalS: 102.1,
    capitalSPrime: 0,
    range: [280.0, 1800.0],
    group: 'III',
  },
  {
    pair: 'carbon dioxide–water',
    a: 9.24e-5,
    s: 1.5,
    phi: 0,
    capitalS: 307.9,
    capitalSPrime: 0,
    range: [296.0, 1640.0],
    group: null,
  },
];

/** D at 101 325 Pa, m²/s: equations 4.3-1 (φ0 given) and 4.3-2. */
export function marreroMason(row: MarreroMasonRow, temperature: number): number {
  const softness = row.phi > 0 ? -2 * Math.log(Math.log(row.phi / temperature)) : 0;
  const ofTemperature =
    row.s * Math.log(temperature) - row.capitalS / temperature - row.capitalSPrime / temperature ** 2;
  return 1e-4 * row.a * Math.exp(ofTemperature + softness);
}

/** The limit of uncertainty relative to D; null where none is at hand. */
export function marreroMasonLimit({ group }: MarreroMasonRow, temperature: number): number | null {
  if (!group) return null;
  const limits = LIMITS[group];
  const i = LIMIT_TEMPERATURES.findLastIndex((knot, k) => k < limits.length - 1 && knot <= temperature);
  const [low, high] = [limits[i], limits[i + 1]];
  if (low === undefined || high === undefined || high === null) return null;
  if (low === null) return high / 100;
  const part =
    Math.log(temperature / LIMIT_TEMPERATURES[i]!) / Math.log(LIMIT_TEMPERATURES[i + 1]! / LIMIT_TEMPERATURES[i]!);
  return (low + (high - low) * part) / 100;
}
