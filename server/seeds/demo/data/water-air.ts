import { type DemoPair, type DemoSeries, type DemoSheet } from './demo.types.js';
import { powerLaw } from './invented-laboratory.js';
import { USUAL_RECIPE } from './recipes.js';
import { seriesKey, seriesOf, type SeriesPlan } from './series-plan.js';

const PAIR: DemoPair = { a: 'water', b: 'air' };
const keyOf = seriesKey.bind(null, PAIR);

/** Nature as in Massman, W. J. Atmos. Environ. 1998, 32, 1111–1127, Table 2: 0.2178 cm²/s (T/273.15 K)^1.81 at 1 atm. */
export const WATER_AIR_LAW = powerLaw(2.178e-5, 273.15, 1.81);

const PLANS: readonly SeriesPlan[] = [
  {
    letter: 'a',
    title: 'Evaporation tube read by level, 283 K to 333 K',
    source: 'Laboratory A, notebook 13, 2015 (invented)',
    method: 'evaporation tube (Arnold cell)',
    apparatus: 'glass tubes, bore 5.01 mm, level by telescope',
    commonRelativeUncertainty: 0.007,
    owner: 'researcher',
    seed: 201,
    temperatures: [283.2, 288.2, 293.2, 298.2, 308.1, 318.2, 333.2],
    bias: 0.005,
    scatter: 0.008,
    statedUncertainty: 0.01,
    temperatureUncertainty: 0.05,
    pressureUncertainty: 30,
    replicates: 2,
  },
  {
    letter: 'b',
    title: 'Evaporation tube on a balance at two pressures, 293 K to 323 K',
    source: 'Laboratory B, internal report 9, 2018 (invented)',
    method: 'evaporation tube (Arnold cell)',
    apparatus: 'tube of 5 mm bore on a balance, in a vessel',
    commonRelativeUncertainty: 0.009,
    owner: 'researcher',
    seed: 202,
    temperatures: [293.2, 303.2, 313.1, 323.2],
    pressures: [80_000, 101_300],
    bias: -0.012,
    scatter: 0.009,
    statedUncertainty: 0.012,
    temperatureUncertainty: 0.08,
    pressureUncertainty: 60,
  },
  {
    letter: 'j',
    title: 'Closed tube, 298 K to 353 K',
    source: 'Laboratory J, 1998 (invented)',
    method: 'closed tube',
    apparatus: 'steel tube, 1.2 m, divided by a gate',
    commonRelativeUncertainty: 0.006,
    owner: 'researcher2',
    seed: 203,
    temperatures: [298.2, 308.2, 323.2, 338.1, 353.2],
    bias: 0.011,
    scatter: 0.006,
    statedUncertainty: 0.008,
    temperatureUncertainty: 0.03,
    pressureUncertainty: 20,
  },
  {
    letter: 'k',
    title: 'Smoothed table, 298 K to 353 K',
    source: 'Handbook of Laboratory J, 2001 (invented)',
    method: 'closed tube',
    apparatus: null,
    dataOrigin: 'SMOOTHED',
    tabulated: true,
    pressures: [101_325],
    commonRelativeUncertainty: null,
    sameDataAs: keyOf('j'),
    owner: 'researcher2',
    seed: 204,
    temperatures: [298.15, 323.15, 353.15],
    bias: 0.011,
    scatter: 0.001,
    statedUncertainty: null,
    temperatureUncertainty: null,
    pressureUncertainty: null,
  },
  {
    letter: 'l',
    title: 'Optical interferometry, 288 K to 318 K',
    source: 'Laboratory L, 2024 (invented)',
    method: 'optical interferometry',
    apparatus: 'cell of 80 mm path',
    commonRelativeUncertainty: 0.004,
    owner: 'researcher',
    seed: 205,
    temperatures: [288.2, 293.2, 298.2, 303.2, 308.2, 318.2],
    bias: -0.003,
    scatter: 0.004,
    statedUncertainty: 0.005,
    temperatureUncertainty: 0.02,
    pressureUncertainty: 15,
  },
];

export const WATER_AIR_SERIES: readonly DemoSeries[] = seriesOf(PAIR, WATER_AIR_LAW, PLANS);

const REPEATED = { seriesKey: keyOf('k'), reason: 'Duplicate: a smoothed table of the points of series j' };

export const WATER_AIR_SHEET: DemoSheet = {
  pair: PAIR,
  versions: [
    {
      seriesKeys: [keyOf('a'), keyOf('b'), keyOf('j')],
      leftOutSeries: [REPEATED],
      excludedPoints: [],
      recipe: USUAL_RECIPE,
      summary: 'Diffusivity of water vapour in air from two evaporation tubes and a closed tube.',
      changeNote: null,
      fate: 'released',
      withdrawalReason: null,
    },
    {
      seriesKeys: [keyOf('a'), keyOf('b'), keyOf('j'), keyOf('l')],
      leftOutSeries: [REPEATED],
      excludedPoints: [],
      recipe: USUAL_RECIPE,
      summary: 'Diffusivity of water vapour in air from four series by three methods.',
      changeNote: 'Series l added, by optical interferometry; it nearly halves the uncertainty near room temperature.',
      fate: 'inReview',
      withdrawalReason: null,
    },
  ],
};
