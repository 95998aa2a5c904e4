import { type DemoPair, type DemoSeries, type DemoSheet } from './demo.types.js';
import { powerLaw } from './invented-laboratory.js';
import { USUAL_RECIPE } from './recipes.js';
import { seriesKey, seriesOf, type SeriesPlan } from './series-plan.js';

const CARBON_DIOXIDE_HELIUM: DemoPair = { a: 'carbon dioxide', b: 'helium' };
const METHANE_AIR: DemoPair = { a: 'methane', b: 'air' };
const HYDROGEN_NITROGEN: DemoPair = { a: 'hydrogen', b: 'nitrogen' };

/**
 * Nature as in Marrero, T. R.; Mason, E. A. J. Phys. Chem. Ref. Data 1972, 1, 3–118, Tables 12 and 13, at 1 atm:
 * carbon dioxide + helium 3.31e-5 T^1.720 cm²/s, methane + air 1.03e-5 T^1.747 cm²/s; hydrogen + nitrogen 0.784 cm²/s
 * at 300 K with the local exponent 1.735.
 */
export const GAS_LAWS = {
  carbonDioxideHelium: powerLaw(3.31e-9 * 300 ** 1.72, 300, 1.72),
  methaneAir: powerLaw(1.03e-9 * 300 ** 1.747, 300, 1.747),
  hydrogenNitrogen: powerLaw(7.842e-5, 300, 1.735),
};

const TWO_BULB = {
  method: 'two-bulb cell',
  apparatus: 'glass bulbs, capillary 2.1 mm × 84 mm',
  temperatureUncertainty: 0.05,
  pressureUncertainty: 50,
} as const;
const BROADENING = {
  method: 'gas chromatography, peak broadening',
  apparatus: 'empty column, 12 m × 4 mm',
  temperatureUncertainty: 0.2,
  pressureUncertainty: 100,
} as const;
const CLOSED_TUBE = {
  method: 'closed tube',
  apparatus: 'steel tube, 0.9 m, divided by a gate',
  temperatureUncertainty: 0.03,
  pressureUncertainty: 20,
} as const;

const CARBON_DIOXIDE_HELIUM_PLANS: readonly SeriesPlan[] = [
  {
    ...TWO_BULB,
    letter: 'a',
    title: 'Two-bulb cell at three pressures, 276 K to 353 K',
    source: 'Laboratory C, 2011 (invented)',
    commonRelativeUncertainty: 0.006,
    owner: 'researcher2',
    seed: 301,
    temperatures: [276.2, 298.2, 323.2, 353.2],
    pressures: [50_000, 100_000, 200_000],
    bias: 0.006,
    scatter: 0.006,
    statedUncertainty: 0.008,
  },
  {
    ...CLOSED_TUBE,
    letter: 'b',
    title: 'Closed tube, 298 K to 373 K',
    source: 'Laboratory E, 2020 (invented)',
    commonRelativeUncertainty: 0.004,
    owner: 'researcher',
    seed: 302,
    temperatures: [298.2, 313.2, 333.1, 353.2, 373.2],
    bias: -0.004,
    scatter: 0.005,
    statedUncertainty: 0.006,
  },
  {
    ...BROADENING,
    letter: 'c',
    title: 'Peak broadening, 323 K to 498 K',
    source: 'Laboratory D, 2017 (invented)',
    commonRelativeUncertainty: 0.011,
    owner: 'researcher2',
    seed: 303,
    temperatures: [323.2, 353.2, 393.1, 423.2, 463.2, 498.2],
    bias: 0.012,
    scatter: 0.013,
    statedUncertainty: 0.015,
  },
];

const METHANE_AIR_PLANS: readonly SeriesPlan[] = [
  {
    ...TWO_BULB,
    letter: 'a',
    title: 'Two-bulb cell, 298 K to 373 K',
    source: 'Laboratory C, 2012 (invented)',
    commonRelativeUncertainty: 0.007,
    owner: 'researcher',
    seed: 311,
    temperatures: [298.2, 313.2, 333.2, 353.2, 373.2],
    bias: 0.008,
    scatter: 0.007,
    statedUncertainty: 0.009,
  },
  {
    ...BROADENING,
    letter: 'b',
    title: 'Peak broadening, 303 K to 473 K',
    source: 'Laboratory H, 2022 (invented)',
    commonRelativeUncertainty: 0.01,
    owner: 'researcher2',
    seed: 312,
    temperatures: [303.2, 343.2, 383.2, 423.2, 473.2],
    bias: -0.009,
    biasOfExponent: 0.02,
    scatter: 0.012,
    statedUncertainty: 0.016,
  },
  {
    letter: 'c',
    title: 'Point source, 400 K to 700 K',
    source: 'Laboratory M, 1968 (invented)',
    method: 'point source',
    apparatus: 'heated duct, probe traversed',
    commonRelativeUncertainty: 0.02,
    owner: 'researcher2',
    seed: 313,
    temperatures: [400.2, 500.3, 600.1, 700.2],
    bias: 0.018,
    scatter: 0.02,
    statedUncertainty: 0.03,
    temperatureUncertainty: 2,
    pressureUncertainty: 200,
  },
];

const HYDROGEN_NITROGEN_PLANS: readonly SeriesPlan[] = [
  {
    ...TWO_BULB,
    letter: 'a',
    title: 'Two-bulb cell, 273 K to 353 K',
    source: 'Laboratory C, 2013 (invented)',
    commonRelativeUncertainty: 0.006,
    owner: 'researcher',
    seed: 321,
    temperatures: [273.2, 293.2, 313.2, 333.2, 353.2],
    bias: 0.003,
    scatter: 0.006,
    statedUncertainty: 0.008,
  },
  {
    ...CLOSED_TUBE,
    letter: 'b',
    title: 'Closed tube, 288 K to 373 K',
    source: 'Laboratory E, 2022 (invented)',
    commonRelativeUncertainty: 0.004,
    owner: 'researcher2',
    seed: 322,
    temperatures: [288.2, 308.2, 328.2, 348.2, 373.2],
    bias: -0.005,
    scatter: 0.005,
    statedUncertainty: 0.006,
  },
  {
    ...BROADENING,
    letter: 'c',
    title: 'Peak broadening, no uncertainty stated, 323 K to 423 K',
    source: 'Laboratory N, 1994 (invented)',
    commonRelativeUncertainty: null,
    owner: 'researcher2',
    seed: 323,
    temperatures: [323.2, 348.2, 373.2, 398.2, 423.2],
    bias: 0.015,
    scatter: 0.016,
    statedUncertainty: null,
  },
];

export const GAS_SERIES: readonly DemoSeries[] = [
  ...seriesOf(CARBON_DIOXIDE_HELIUM, GAS_LAWS.carbonDioxideHelium, CARBON_DIOXIDE_HELIUM_PLANS),
  ...seriesOf(METHANE_AIR, GAS_LAWS.methaneAir, METHANE_AIR_PLANS),
  ...seriesOf(HYDROGEN_NITROGEN, GAS_LAWS.hydrogenNitrogen, HYDROGEN_NITROGEN_PLANS),
];

const RELEASED = {
  leftOutSeries: [],
  excludedPoints: [],
  recipe: USUAL_RECIPE,
  changeNote: null,
  fate: 'released',
  withdrawalReason: null,
} as const;

/** Hydrogen + nitrogen has three accepted series and waits for its first fit. */
export const GAS_SHEETS: readonly DemoSheet[] = [
  {
    pair: CARBON_DIOXIDE_HELIUM,
    versions: [
      {
        ...RELEASED,
        seriesKeys: ['a', 'b', 'c'].map((letter) => seriesKey(CARBON_DIOXIDE_HELIUM, letter)),
        summary: 'Diffusivity of carbon dioxide in helium from three series by three methods, 50 kPa to 200 kPa.',
      },
    ],
  },
  {
    pair: METHANE_AIR,
    versions: [
      {
        ...RELEASED,
        seriesKeys: ['a', 'b', 'c'].map((letter) => seriesKey(METHANE_AIR, letter)),
        summary: 'Diffusivity of methane in air from three series. Above 473 K one method only, point source.',
      },
    ],
  },
];
