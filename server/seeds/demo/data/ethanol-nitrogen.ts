import { type DemoPair, type DemoSeries, type DemoSheet } from './demo.types.js';
import { powerLaw } from './invented-laboratory.js';
import { USUAL_RECIPE } from './recipes.js';
import { seriesKey, seriesOf, type SeriesPlan } from './series-plan.js';

const PAIR: DemoPair = { a: 'ethanol', b: 'nitrogen' };

/** Invented, 1.5 % below what Fuller–Schettler–Giddings gives at 298.15 K. */
export const ETHANOL_NITROGEN_LAW = powerLaw(1.242e-5, 298.15, 1.79);

const PLANS: readonly SeriesPlan[] = [
  {
    letter: 'a',
    title: 'Evaporation tube read by level, 283 K to 323 K',
    source: 'Laboratory A, notebook 12, 2014 (invented)',
    method: 'evaporation tube (Arnold cell)',
    apparatus: 'glass tubes, bore 3.02 mm, level by telescope',
    dataOrigin: 'TUBE_RUN',
    commonRelativeUncertainty: 0.0085,
    owner: 'researcher',
    seed: 101,
    temperatures: [283.2, 288.2, 293.2, 298.2, 303.1, 308.2, 313.2, 318.1, 323.2],
    bias: 0.004,
    scatter: 0.008,
    statedUncertainty: 0.011,
    temperatureUncertainty: 0.05,
    pressureUncertainty: 30,
    replicates: 2,
  },
  {
    letter: 'b',
    title: 'Evaporation tube on a balance, 293 K to 333 K',
    source: 'Laboratory B, internal report 7, 2016 (invented)',
    method: 'evaporation tube (Arnold cell)',
    apparatus: 'tube of 5 mm bore on a balance',
    commonRelativeUncertainty: 0.01,
    owner: 'researcher',
    seed: 102,
    temperatures: [293.1, 298.2, 303.2, 313.1, 323.2, 333.2],
    bias: -0.013,
    scatter: 0.01,
    statedUncertainty: 0.014,
    temperatureUncertainty: 0.08,
    pressureUncertainty: 50,
    mishaps: { 4: -0.07 },
  },
  {
    letter: 'c',
    title: 'Two-bulb cell, 298 K to 363 K',
    source: 'Laboratory C, 2009 (invented)',
    method: 'two-bulb cell',
    apparatus: 'glass bulbs, capillary 2.1 mm × 84 mm',
    commonRelativeUncertainty: 0.006,
    owner: 'researcher2',
    seed: 103,
    temperatures: [298.1, 308.2, 318.2, 328.1, 343.2, 353.1, 363.2],
    bias: 0.007,
    scatter: 0.007,
    statedUncertainty: 0.009,
    temperatureUncertainty: 0.05,
    pressureUncertainty: 20,
  },
  {
    letter: 'd',
    title: 'Peak broadening, 323 K to 448 K',
    source: 'Laboratory D, 2019 (invented)',
    method: 'gas chromatography, peak broadening',
    apparatus: 'empty column, 12 m × 4 mm',
    commonRelativeUncertainty: 0.012,
    owner: 'researcher2',
    seed: 104,
    temperatures: [323.2, 338.1, 353.2, 373.2, 393.1, 413.2, 433.1, 448.2],
    bias: -0.006,
    biasOfExponent: -0.02,
    scatter: 0.014,
    statedUncertainty: 0.018,
    temperatureUncertainty: 0.2,
    pressureUncertainty: 100,
  },
  {
    letter: 'e',
    title: 'Closed tube, 303 K to 353 K',
    source: 'Laboratory E, 2021 (invented)',
    method: 'closed tube',
    apparatus: 'steel tube, 0.9 m, divided by a gate',
    commonRelativeUncertainty: 0.005,
    owner: 'researcher',
    seed: 105,
    temperatures: [303.2, 318.1, 333.2, 353.2],
    bias: 0.002,
    scatter: 0.006,
    statedUncertainty: 0.008,
    temperatureUncertainty: 0.03,
    pressureUncertainty: 20,
  },
  {
    letter: 'f',
    title: 'Evaporation tube read by level, 288 K to 323 K, short tubes',
    source: 'Laboratory F, 1987 (invented)',
    method: 'evaporation tube (Arnold cell)',
    apparatus: 'tubes 12 mm deep',
    commonRelativeUncertainty: 0.02,
    owner: 'researcher2',
    seed: 106,
    temperatures: [288.1, 293.2, 303.1, 313.2, 323.1],
    bias: 0.074,
    scatter: 0.012,
    statedUncertainty: 0.015,
    temperatureUncertainty: 0.1,
    pressureUncertainty: 100,
  },
  {
    letter: 'g',
    title: 'Point source, 373 K to 423 K, read from a graph',
    source: 'Laboratory G, 1979 (invented)',
    method: 'point source',
    apparatus: null,
    dataOrigin: 'GRAPH',
    commonRelativeUncertainty: null,
    owner: 'researcher2',
    seed: 107,
    temperatures: [373.2, 398.1, 423.2],
    bias: 0.05,
    scatter: 0.02,
    statedUncertainty: 0.04,
    temperatureUncertainty: null,
    pressureUncertainty: null,
    pressureOrigin: 'ASSIGNED',
    tabulated: true,
    pressures: [101_325],
  },
  {
    letter: 'h',
    title: 'Peak broadening, 348 K to 423 K',
    source: 'Laboratory H, 2023 (invented)',
    method: 'gas chromatography, peak broadening',
    apparatus: 'coated column, 20 m × 2 mm',
    commonRelativeUncertainty: 0.01,
    owner: 'researcher',
    seed: 108,
    temperatures: [348.2, 363.1, 383.2, 403.1, 423.2],
    bias: 0.014,
    biasOfExponent: 0.015,
    scatter: 0.013,
    statedUncertainty: 0.02,
    temperatureUncertainty: 0.15,
    pressureUncertainty: 80,
  },
];

export const ETHANOL_NITROGEN_SERIES: readonly DemoSeries[] = seriesOf(PAIR, ETHANOL_NITROGEN_LAW, PLANS);

const keyOf = seriesKey.bind(null, PAIR);

const WITHOUT_PRESSURE = {
  seriesKey: keyOf('g'),
  reason: 'Conditions: pressure not stated in the source, so D cannot be reduced to 101.325 kPa',
};
const JERKED = {
  seriesKey: keyOf('b'),
  index: 4,
  reason: 'Disturbed: the notebook says that the balance was touched during the run',
};

const FIRST = {
  seriesKeys: ['a', 'b', 'c', 'd', 'f'].map((letter) => keyOf(letter)),
  leftOutSeries: [WITHOUT_PRESSURE],
  excludedPoints: [JERKED],
  recipe: USUAL_RECIPE,
  fate: 'released',
  withdrawalReason: null,
} as const;

export const ETHANOL_NITROGEN_SHEET: DemoSheet = {
  pair: PAIR,
  versions: [
    {
      ...FIRST,
      summary: 'Diffusivity of ethanol vapour in nitrogen from evaporation tubes, a two-bulb cell and peak broadening.',
      changeNote: null,
    },
    {
      ...FIRST,
      summary:
        'Diffusivity of ethanol vapour in nitrogen from evaporation tubes, a two-bulb cell and peak broadening. Above 363 K one method only.',
      changeNote: 'Words only: the summary names where one method stands alone.',
    },
    {
      ...FIRST,
      seriesKeys: ['a', 'b', 'c', 'd', 'e', 'h'].map((letter) => keyOf(letter)),
      leftOutSeries: [
        { seriesKey: keyOf('f'), reason: 'Apparatus: tubes 12 mm deep, end effect not determined' },
        WITHOUT_PRESSURE,
      ],
      summary:
        'Diffusivity of ethanol vapour in nitrogen from six series by four methods, which agree within 2 %. Above 363 K one method only, peak broadening.',
      changeNote:
        'Series e and h added; series f left out, because the end effect of its short tubes was not determined.',
    },
  ],
};
