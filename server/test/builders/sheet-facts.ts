import type { EvaluableCorrelation } from '../../src/numerics/fitting/fit.types.js';
import type { EstimatesAt, PointColumns, SeriesFacts, SheetFacts } from '../../src/sheet-documents/sheet-facts.js';

/** Invented for the tests, near enough to nature to look like a sheet: D0 = 0.12455(50) cm²/s, n = 1.788(27). */
export const sampleCorrelation: EvaluableCorrelation = {
  form: 'POWER_LAW',
  parameters: [
    { symbol: 'D0', value: 1.24553e-5, standardUncertainty: 5.0e-8, unit: 'm2/s' },
    { symbol: 'n', value: 1.78812, standardUncertainty: 0.027, unit: '1' },
  ],
  covariance: [
    [2.5e-15, -0.388 * 5.0e-8 * 0.027],
    [-0.388 * 5.0e-8 * 0.027, 7.29e-4],
  ],
  degreesOfFreedom: 5,
  referenceTemperature: 298.15,
  referencePressure: 101_325,
  validity: {
    temperatureMinimum: 283.15,
    temperatureMaximum: 448.15,
    pressureMinimum: 1000,
    pressureMaximum: 400_000,
    pressureBasis: 'STATED',
  },
  betweenSeries: { intercept: 6.1e-5, slope: 4.8e-4, covariance: 0, centre: Math.log(330) },
};

interface SeriesPlan {
  readonly title: string;
  readonly method: string;
  readonly temperatures: readonly number[];
  /** Of ln D */
  readonly bias: number;
  readonly relativeUncertainty: number;
  readonly leftOutBecause?: string;
}

const from = (start: number, step: number, count: number): number[] =>
  Array.from({ length: count }, (_, i) => start + step * i);

const PLANS: readonly SeriesPlan[] = [
  {
    title: 'Laboratory A 2014',
    method: 'evaporation tube',
    temperatures: from(283.15, 5, 9),
    bias: 0.005,
    relativeUncertainty: 0.011,
  },
  {
    title: 'Laboratory B 2016',
    method: 'evaporation tube',
    temperatures: from(293.15, 8, 6),
    bias: -0.011,
    relativeUncertainty: 0.014,
  },
  {
    title: 'Laboratory C 2009',
    method: 'two-bulb cell',
    temperatures: from(298.15, 10.8, 7),
    bias: 0.004,
    relativeUncertainty: 0.009,
  },
  {
    title: 'Laboratory D 2019',
    method: 'peak broadening',
    temperatures: from(323.15, 17.85, 8),
    bias: -0.015,
    relativeUncertainty: 0.018,
  },
  {
    title: 'Laboratory E 2021',
    method: 'closed tube',
    temperatures: from(303.15, 16.6, 4),
    bias: 0,
    relativeUncertainty: 0.008,
  },
  {
    title: 'Laboratory F 1987',
    method: 'evaporation tube',
    temperatures: from(288.15, 8.75, 5),
    bias: 0.071,
    relativeUncertainty: 0.015,
    leftOutBecause:
      'Apparatus: tubes 12 mm deep, end effect not determined; outside the interval for one new laboratory.',
  },
  {
    title: 'Laboratory G 1979',
    method: 'point source',
    temperatures: from(373.15, 25, 3),
    bias: 0.061,
    relativeUncertainty: 0.04,
    leftOutBecause:
      'Conditions: pressure not stated in the source, so that D cannot be reduced to the reference pressure.',
  },
  {
    title: 'Laboratory H 2023',
    method: 'peak broadening',
    temperatures: from(348.15, 18.75, 5),
    bias: 0.02,
    relativeUncertainty: 0.02,
  },
];

function points(plan: SeriesPlan, ordinal: number): PointColumns {
  const column = <T>(value: (temperature: number, index: number) => T): T[] => plan.temperatures.map(value);
  const pressure = (index: number) => 101_325 + 300 * ((index % 3) - 1);
  const diffusivities = column((T, i) => {
    // Scatter without a random generator: the fractional parts of multiples of the golden ratio.
    const scatter = ((0.618034 * (7 * ordinal + i + 1)) % 1) - 0.5;
    return (
      1.24553e-5 *
      (T / 298.15) ** 1.78812 *
      (101_325 / pressure(i)) *
      Math.exp(plan.bias + 1.6 * plan.relativeUncertainty * scatter)
    );
  });
  return {
    temperatures: plan.temperatures,
    pressures: column((_, i) => pressure(i)),
    pressureOrigins: column(() => 'STATED' as const),
    diffusivities,
    diffusivityUncertainties: diffusivities.map((D) => D * plan.relativeUncertainty),
    uncertaintyOrigins: column(() => (ordinal === 7 ? ('ASSIGNED' as const) : ('STATED' as const))),
    temperatureUncertainties: column(() => 0.05),
    pressureUncertainties: column(() => 50),
    moleFractions: column(() => (ordinal === 0 ? 0.05 : null)),
    replicates: column(() => 1),
  };
}

function series(plan: SeriesPlan, ordinal: number): SeriesFacts {
  const { title, method, bias, leftOutBecause = null } = plan;
  return {
    ordinal,
    title,
    source: `Invented source ${title}`,
    method,
    apparatus: null,
    dataOrigin: ordinal === 3 ? 'GRAPH' : 'TABLE',
    commonRelativeUncertainty: ordinal === 0 ? 0.004 : null,
    points: points(plan, ordinal),
    excluded: ordinal === 1 ? [{ index: 2, reason: 'Disturbed: the bath was refilled during the run.' }] : [],
    offset: { value: bias, standardUncertainty: 0.006 },
    leftOutBecause,
  };
}

const ESTIMATES = [
  {
    method: 'FULLER_SCHETTLER_GIDDINGS',
    label: 'Fuller–Schettler–Giddings',
    usualRelativeError: 0.04,
    d0: 1.26e-5,
    n: 1.75,
  },
  { method: 'CHAPMAN_ENSKOG', label: 'Chapman–Enskog', usualRelativeError: 0.08, d0: 1.195e-5, n: 1.83 },
  { method: 'WILKE_LEE', label: 'Wilke–Lee', usualRelativeError: 0.07, d0: 1.24e-5, n: 1.84 },
] as const;

const estimatesAt: EstimatesAt = ({ temperature, pressure }) =>
  ESTIMATES.map(({ d0, n, ...method }) => ({
    ...method,
    source: `Invented source of ${method.label}`,
    diffusivity: d0 * (temperature / 298.15) ** n * (101_325 / pressure),
  }));

/** Facts of a released version; `changes` says what a test is about. */
export function sampleSheetFacts(changes: Partial<SheetFacts> = {}): SheetFacts {
  return {
    code: 'DS-0042',
    number: '2.1',
    substances: [
      {
        name: 'ethanol',
        formula: 'C2H6O',
        casNumber: '64-17-5',
        molarMass: 0.046069,
        cautions: ['The vapour burns: keep ignition sources away.'],
      },
      {
        name: 'nitrogen',
        formula: 'N2',
        casNumber: '7727-37-9',
        molarMass: 0.028013,
        cautions: ['Displaces air in closed rooms: ventilate.'],
      },
    ],
    correlation: sampleCorrelation,
    fit: {
      number: 14,
      createdAt: '2026-10-02T09:30:00.000Z',
      engineVersion: '1.0.0',
      recipe: {
        form: 'POWER_LAW',
        objective: 'LN_DIFFUSIVITY',
        weighting: 'EFFECTIVE_VARIANCE',
        loss: 'LEAST_SQUARES',
        seriesEffect: 'RANDOM_INTERCEPT_AND_SLOPE',
        betweenSeriesDeviation: null,
        referenceTemperature: 298.15,
        referencePressure: 101_325,
      },
      statistics: {
        pointCount: 38,
        seriesCount: 6,
        residualDegreesOfFreedom: 36,
        chiSquare: 31.3,
        reducedChiSquare: 0.87,
        chiSquareProbability: 0.69,
        residualStandardError: 0.012,
        aicc: -210.4,
        betweenSeriesDeviation: 0.0078,
        betweenSeriesOrigin: 'STATED',
        cochranQ: 14.2,
        iSquared: 0.65,
      },
    },
    series: PLANS.map(series),
    estimates: estimatesAt,
    words: {
      summary: 'Invented for the tests: numbers, laboratories, people.',
      changeNote: 'Wording of cautions; two addresses of sources',
      remarks: { series: 'Series f and g are shown because readers ask for them.' },
    },
    people: { preparedBy: 'M. K.', reviewedBy: ['L. A.'], releasedBy: 'S. O.' },
    releasedAt: '2026-11-04T10:00:00.000Z',
    doi: '10.0000/invented.ds-0042.2.1',
    replaces: '2.0',
    standing: {
      status: 'RELEASED',
      contentHash: '7c1e04b9a3d852f6e90b1d774486c0fa2be3915d08a4f36c7c1e04b9a3d852f6',
      previousHash: 'e90b1d774486c0fa2be3915d08a4f36c7c1e04b9a3d852f6e90b1d774486c0fa',
      supersededBy: null,
      withdrawnAt: null,
      withdrawalReason: null,
    },
    versions: [
      version('2.1', 'RELEASED', '2026-11-04T10:00:00.000Z', null, 'Wording of cautions; two addresses of sources'),
      version(
        '2.0',
        'SUPERSEDED',
        '2026-10-09T10:00:00.000Z',
        null,
        'Series e and h added, f left out; slope of each series free',
      ),
      version('1.0', 'WITHDRAWN', '2024-05-03T10:00:00.000Z', '2025-03-12T10:00:00.000Z', null),
    ],
    ...changes,
  };
}

const version = (
  number: string,
  status: SheetFacts['standing']['status'],
  releasedAt: string,
  withdrawnAt: string | null,
  changeNote: string | null,
) => ({ number, status, releasedAt, withdrawnAt, summary: 'First version', changeNote });
