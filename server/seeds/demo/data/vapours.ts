import { type DemoPair, type DemoSeries, type DemoSheet } from './demo.types.js';
import { powerLaw } from './invented-laboratory.js';
import { USUAL_RECIPE } from './recipes.js';
import { seriesKey, seriesOf, type SeriesPlan } from './series-plan.js';

const ACETONE_AIR: DemoPair = { a: 'acetone', b: 'air' };
const BENZENE_AIR: DemoPair = { a: 'benzene', b: 'air' };
const TOLUENE_AIR: DemoPair = { a: 'toluene', b: 'air' };
const HEXANE_NITROGEN: DemoPair = { a: 'hexane', b: 'nitrogen' };

/**
 * Invented near nature. Measured at 1 atm in cm²/s: benzene + air 0.0962 at 298 K (Welty, Wicks, Wilson 1984), toluene +
 * air 0.086 at 299.1 K and hexane + nitrogen 0.0757 at 288.6 K (Fuller, Schettler, Giddings 1966, Table III); acetone +
 * air 0.109 at 273.15 K (Perry, 7th ed., Table 2-371), above what the estimates give.
 */
export const VAPOUR_LAWS = {
  acetoneAir: powerLaw(1.074e-5, 298.15, 1.86),
  benzeneAir: powerLaw(9.4e-6, 298.15, 1.83),
  tolueneAir: powerLaw(8.53e-6, 298.15, 1.82),
  hexaneNitrogen: powerLaw(7.57e-6, 288.6, 1.77),
};

const LEVEL_TUBE = {
  method: 'evaporation tube (Arnold cell)',
  apparatus: 'glass tubes, bore 3.02 mm, level by telescope',
  temperatureUncertainty: 0.05,
  pressureUncertainty: 30,
} as const;

const ACETONE_AIR_PLANS: readonly SeriesPlan[] = [
  {
    ...LEVEL_TUBE,
    letter: 'a',
    title: 'Evaporation tube read by level, 278 K to 313 K',
    source: 'Laboratory A, notebook 10, 2012 (invented)',
    apparatus: 'glass tubes, bore 5.01 mm, level by telescope',
    commonRelativeUncertainty: 0.012,
    owner: 'researcher',
    seed: 401,
    temperatures: [278.2, 288.2, 298.2, 308.1, 313.2],
    bias: -0.052,
    scatter: 0.01,
    statedUncertainty: 0.013,
  },
  {
    ...LEVEL_TUBE,
    letter: 'b',
    title: 'Evaporation tube read by level, 283 K to 308 K',
    source: 'Laboratory F, 1991 (invented)',
    apparatus: 'tubes of 6 mm bore',
    commonRelativeUncertainty: 0.015,
    owner: 'researcher2',
    seed: 402,
    temperatures: [283.2, 293.2, 298.2, 308.2],
    bias: -0.046,
    scatter: 0.012,
    statedUncertainty: 0.015,
  },
];

const BENZENE_AIR_PLANS: readonly SeriesPlan[] = [
  {
    ...LEVEL_TUBE,
    letter: 'a',
    title: 'Evaporation tube read by level, 288 K to 333 K',
    source: 'Laboratory A, notebook 11, 2013 (invented)',
    commonRelativeUncertainty: 0.009,
    owner: 'researcher',
    seed: 411,
    temperatures: [288.2, 298.2, 308.2, 318.2, 333.2],
    bias: 0.006,
    scatter: 0.008,
    statedUncertainty: 0.011,
  },
  {
    letter: 'b',
    title: 'Peak broadening, 323 K to 373 K',
    source: 'Laboratory D, 2018 (invented)',
    method: 'gas chromatography, peak broadening',
    apparatus: 'empty column, 12 m × 4 mm',
    commonRelativeUncertainty: 0.012,
    owner: 'researcher2',
    seed: 412,
    temperatures: [323.2, 338.2, 353.1, 373.2],
    bias: -0.011,
    scatter: 0.012,
    statedUncertainty: 0.018,
    temperatureUncertainty: 0.2,
    pressureUncertainty: 100,
  },
];

const TOLUENE_AIR_PLANS: readonly SeriesPlan[] = [
  {
    ...LEVEL_TUBE,
    letter: 'a',
    title: 'Evaporation tube read by level, 298 K to 348 K',
    source: 'Laboratory A, notebook 15, 2026 (invented)',
    commonRelativeUncertainty: 0.009,
    owner: 'researcher2',
    seed: 421,
    temperatures: [298.2, 308.2, 318.2, 333.2, 348.2],
    bias: 0.002,
    scatter: 0.009,
    statedUncertainty: 0.011,
    fate: 'submitted',
  },
  {
    ...LEVEL_TUBE,
    letter: 'b',
    title: 'Evaporation tube read by level, second bore, not yet complete',
    source: 'Laboratory A, notebook 15, 2026 (invented)',
    commonRelativeUncertainty: null,
    owner: 'researcher',
    seed: 422,
    temperatures: [303.2, 313.2],
    bias: 0.004,
    scatter: 0.009,
    statedUncertainty: null,
    fate: 'draft',
  },
];

const HEXANE_NITROGEN_PLANS: readonly SeriesPlan[] = [
  {
    letter: 'a',
    title: 'Two-bulb cell, 288 K to 333 K',
    source: 'Laboratory C, 2010 (invented)',
    method: 'two-bulb cell',
    apparatus: null,
    commonRelativeUncertainty: 0.008,
    owner: 'researcher',
    seed: 431,
    temperatures: [288.2, 298.2, 313.2, 333.2],
    bias: -0.006,
    scatter: 0.01,
    statedUncertainty: 0.012,
    temperatureUncertainty: 0.1,
    pressureUncertainty: null,
    fate: 'returned',
    remark:
      'The source gives the pressure only as “atmospheric”. Please add the barometer readings, or say that there are none.',
  },
];

export const VAPOUR_SERIES: readonly DemoSeries[] = [
  ...seriesOf(ACETONE_AIR, VAPOUR_LAWS.acetoneAir, ACETONE_AIR_PLANS),
  ...seriesOf(BENZENE_AIR, VAPOUR_LAWS.benzeneAir, BENZENE_AIR_PLANS),
  ...seriesOf(TOLUENE_AIR, VAPOUR_LAWS.tolueneAir, TOLUENE_AIR_PLANS),
  ...seriesOf(HEXANE_NITROGEN, VAPOUR_LAWS.hexaneNitrogen, HEXANE_NITROGEN_PLANS),
];

const FIRST = { leftOutSeries: [], excludedPoints: [], recipe: USUAL_RECIPE, changeNote: null } as const;

export const VAPOUR_SHEETS: readonly DemoSheet[] = [
  {
    pair: ACETONE_AIR,
    versions: [
      {
        ...FIRST,
        seriesKeys: [seriesKey(ACETONE_AIR, 'a'), seriesKey(ACETONE_AIR, 'b')],
        summary: 'Diffusivity of acetone vapour in air from two evaporation tubes.',
        fate: 'withdrawn',
        withdrawalReason:
          'Both series were reduced with the bath temperature although the surface of the liquid was cooled by evaporation. D is about 5 % low. The runs are being reduced again.',
      },
    ],
  },
  {
    pair: BENZENE_AIR,
    versions: [
      {
        ...FIRST,
        seriesKeys: [seriesKey(BENZENE_AIR, 'a'), seriesKey(BENZENE_AIR, 'b')],
        summary:
          'Diffusivity of benzene vapour in air from two series. The scatter between laboratories is assigned, not found.',
        fate: 'released',
        withdrawalReason: null,
      },
    ],
  },
];
