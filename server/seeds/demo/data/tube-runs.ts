import { evaluateConstant } from '../../../src/numerics/estimates/constant-equations.js';
import { equationsOf, type ConstantKind } from '../../../src/numerics/estimates/constant-kinds.js';
import { standardNormals } from '../../../src/numerics/random/normals.js';
import { starterLibrary, type StarterSubstance } from '../../library/library.js';
import { type DemoTubeRun } from './demo.types.js';
import { ETHANOL_NITROGEN_LAW } from './ethanol-nitrogen.js';
import { type DiffusivityLaw, roundTo } from './invented-laboratory.js';
import { WATER_AIR_LAW } from './water-air.js';

const MOLAR_GAS_CONSTANT = 8.314462618;
const HOUR = 3600;
const MILLIMETRE = 1e-3;
const MILLIGRAM = 1e-6;

/** A tube in an invented nature: what the readings of a run follow from. */
interface TubePlan extends Pick<
  DemoTubeRun,
  'key' | 'seriesKey' | 'liquid' | 'gas' | 'temperature' | 'pressure' | 'filledAt' | 'note'
> {
  readonly law: DiffusivityLaw;
  readonly seed: number;
  /** m */
  readonly boreDiameter: number;
  readonly startDepth: number;
  /** δ, m: the path is longer than the depth by this much */
  readonly endEffect: number;
  /** K: the surface is colder than the bath */
  readonly surfaceCooling: number;
  readonly hours: readonly number[];
  readonly readBy: 'level' | 'mass';
  /** Readings that went wrong: index from 0, displacement in m, and what the notebook says */
  readonly mishaps: readonly { readonly index: number; readonly displacement: number; readonly reason: string }[];
}

const PLANS: readonly TubePlan[] = [
  {
    key: 'tube-run-27',
    seriesKey: 'ethanol-nitrogen-a',
    liquid: 'ethanol',
    gas: 'nitrogen',
    law: ETHANOL_NITROGEN_LAW,
    seed: 501,
    temperature: 313.15,
    pressure: 101_210,
    boreDiameter: 3.02 * MILLIMETRE,
    startDepth: 24.36 * MILLIMETRE,
    endEffect: 0.74 * MILLIMETRE,
    surfaceCooling: 0.13,
    hours: [0, 1, 2.5, 5, 8, 12, 17, 22.5, 28, 34, 40, 46, 52, 58, 64],
    readBy: 'level',
    filledAt: -28 * 60,
    mishaps: [
      {
        index: 7,
        displacement: 0.084 * MILLIMETRE,
        reason: 'Disturbed: meniscus moved while topping up the sweep gas',
      },
    ],
    note: 'Long run: the level falls by more than the first depth, so that the end effect can be found from the readings.',
  },
  {
    key: 'tube-run-31',
    seriesKey: 'ethanol-nitrogen-a',
    liquid: 'ethanol',
    gas: 'nitrogen',
    law: ETHANOL_NITROGEN_LAW,
    seed: 502,
    temperature: 298.15,
    pressure: 100_840,
    boreDiameter: 3.02 * MILLIMETRE,
    startDepth: 30.52 * MILLIMETRE,
    endEffect: 0.7 * MILLIMETRE,
    surfaceCooling: 0.06,
    hours: [0, 4, 8, 16, 24, 32, 40, 48],
    readBy: 'level',
    filledAt: null,
    mishaps: [],
    note: 'Short run: the end effect stays with its prior and rules the uncertainty. Nobody wrote down the filling.',
  },
  {
    key: 'tube-run-44',
    seriesKey: 'water-air-b',
    liquid: 'water',
    gas: 'air',
    law: WATER_AIR_LAW,
    seed: 503,
    temperature: 323.15,
    pressure: 101_300,
    boreDiameter: 5.01 * MILLIMETRE,
    startDepth: 20.1 * MILLIMETRE,
    endEffect: 1.1 * MILLIMETRE,
    surfaceCooling: 0.2,
    hours: [0, 2, 4, 7, 10, 14, 18, 24, 30, 36],
    readBy: 'mass',
    filledAt: -45 * 60,
    mishaps: [],
    note: 'Read by mass on a balance.',
  },
];

const LEVEL_READING = { uncertainty: 0.02 * MILLIMETRE, step: 0.01 * MILLIMETRE };
const MASS_READING = { uncertainty: 0.1 * MILLIGRAM, step: 0.1 * MILLIGRAM };

/** Raw readings as the invented laboratories took them; the same at every call. */
export function demoTubeRuns(): DemoTubeRun[] {
  const library = starterLibrary();
  return PLANS.map((plan) => {
    const liquid = library.find(({ name }) => name === plan.liquid);
    if (!liquid) throw new Error(`the library lacks ${plan.liquid}`);
    return readingsOf(plan, liquid);
  });
}

/**
 * Quasi-steady evaporation through stagnant gas, (z + δ)² = (z₀ + δ)² + κ t with κ = 2 D (c/c_L) ln[1/(1 − p_sat/P)].
 *
 * Source: R. B. Bird, W. E. Stewart, E. N. Lightfoot, *Transport Phenomena*, 2nd ed., 2002, §18.2.
 */
function readingsOf(plan: TubePlan, liquid: StarterSubstance): DemoTubeRun {
  const { temperature, pressure, boreDiameter, startDepth, endEffect } = plan;
  const surface = temperature - plan.surfaceCooling;
  const vapourFraction = evaluate(liquid, 'VAPOUR_PRESSURE', surface) / pressure;
  const liquidMolarDensity = molarDensity(liquid, surface);
  const gasMolarDensity = pressure / (MOLAR_GAS_CONSTANT * temperature);
  const kappa =
    2 * plan.law(temperature, pressure) * (gasMolarDensity / liquidMolarDensity) * -Math.log(1 - vapourFraction);

  const normals = standardNormals(plan.seed);
  const times = plan.hours.map((hours) => hours * HOUR);
  const depthAt = (time: number) => Math.sqrt((startDepth + endEffect) ** 2 + kappa * time) - endEffect;
  const read = (value: number, { uncertainty, step }: typeof LEVEL_READING) =>
    roundTo(value + uncertainty * normals.next(), step);
  const displacedDepths = times.map((time, index) => depthAt(time) + displacementAt(plan, index));
  const massPerDepth = liquidMolarDensity * liquid.molarMassKgPerMol * Math.PI * (boreDiameter / 2) ** 2;
  const byLevel = plan.readBy === 'level';

  return {
    key: plan.key,
    seriesKey: plan.seriesKey,
    liquid: plan.liquid,
    gas: plan.gas,
    temperature,
    temperatureUncertainty: 0.05,
    pressure,
    pressureUncertainty: 30,
    boreDiameter,
    filledAt: plan.filledAt,
    times,
    depths: byLevel ? displacedDepths.map((depth) => read(depth, LEVEL_READING)) : null,
    masses: byLevel
      ? null
      : displacedDepths.map((depth, index) =>
          index === 0 ? 0 : read(massPerDepth * (depth - startDepth), MASS_READING),
        ),
    startDepth: byLevel ? null : roundTo(startDepth, LEVEL_READING.step),
    readingUncertainty: byLevel ? LEVEL_READING.uncertainty : MASS_READING.uncertainty,
    leftOut: plan.mishaps.map(({ index, reason }) => ({ index, reason })),
    note: plan.note,
  };
}

function displacementAt(plan: TubePlan, index: number): number {
  return plan.mishaps.find((mishap) => mishap.index === index)?.displacement ?? 0;
}

/** By the equation in use. */
function evaluate(liquid: StarterSubstance, kind: ConstantKind, temperature: number): number {
  const [inUse] = equationsOf(liquid.constants, kind);
  if (!inUse) throw new Error(`${liquid.name} has no equation for ${kind}`);
  return evaluateConstant(inUse, temperature);
}

function molarDensity(liquid: StarterSubstance, temperature: number): number {
  const hasMolar = equationsOf(liquid.constants, 'LIQUID_MOLAR_DENSITY').length > 0;
  if (hasMolar) return evaluate(liquid, 'LIQUID_MOLAR_DENSITY', temperature);
  return evaluate(liquid, 'LIQUID_DENSITY', temperature) / liquid.molarMassKgPerMol;
}
