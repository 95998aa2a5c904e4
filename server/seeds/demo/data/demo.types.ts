import { type FitRecipe } from '../../../src/numerics/fitting/fit.types.js';

/** The form of the demo scenario. Everything in it is invented, apart from the constants of substances. Units are SI. */

export const DEMO_PERSON_KEYS = [
  'researcher',
  'researcher2',
  'modeller',
  'editor',
  'editor2',
  'administrator',
] as const;
export type DemoPersonKey = (typeof DEMO_PERSON_KEYS)[number];

export interface DemoPerson {
  readonly key: DemoPersonKey;
  readonly name: string;
  readonly email: string;
  readonly roles: readonly ('MODELLER' | 'RESEARCHER' | 'EDITOR' | 'ADMINISTRATOR')[];
}

/** An apparatus of the group whose story the demo tells. */
export interface DemoInstrument {
  readonly key: string;
  readonly name: string;
  readonly method: string;
  readonly note: string;
}

/** Two substances by their names in the library, in the order of display. */
export interface DemoPair {
  readonly a: string;
  readonly b: string;
}

export interface DemoPoint {
  /** K */
  readonly temperature: number;
  readonly temperatureUncertainty: number | null;
  /** Pa */
  readonly pressure: number;
  readonly pressureUncertainty: number | null;
  readonly pressureOrigin: 'STATED' | 'ASSIGNED';
  /** m²/s; the uncertainty is the part independent from point to point, null where the source states none */
  readonly diffusivity: number;
  readonly diffusivityUncertainty: number | null;
  readonly replicates: number | null;
}

export type DemoSeriesFate = 'accepted' | 'submitted' | 'returned' | 'draft';

export interface DemoSeries extends DemoPair {
  readonly key: string;
  readonly title: string;
  readonly source: string;
  readonly method: string;
  readonly apparatus: string | null;
  readonly dataOrigin: 'TABLE' | 'GRAPH' | 'SMOOTHED' | 'EQUATION' | 'TUBE_RUN';
  readonly commonRelativeUncertainty: number | null;
  /** Key of the series whose data this one repeats */
  readonly sameDataAs: string | null;
  readonly owner: 'researcher' | 'researcher2';
  readonly points: readonly DemoPoint[];
  readonly fate: DemoSeriesFate;
  /** Why it was returned */
  readonly remark: string | null;
}

export interface DemoExcludedPoint {
  readonly seriesKey: string;
  /** From 0 */
  readonly index: number;
  readonly reason: string;
}

export interface DemoLeftOutSeries {
  readonly seriesKey: string;
  readonly reason: string;
}

export type DemoVersionFate = 'released' | 'inReview' | 'withdrawn';

/** One version of a sheet. Series of the pair named in neither list came in later. */
export interface DemoVersion {
  readonly seriesKeys: readonly string[];
  readonly leftOutSeries: readonly DemoLeftOutSeries[];
  readonly excludedPoints: readonly DemoExcludedPoint[];
  readonly recipe: FitRecipe;
  readonly summary: string;
  /** Null for the first version */
  readonly changeNote: string | null;
  readonly fate: DemoVersionFate;
  /** Where the fate is `withdrawn`, which follows a release */
  readonly withdrawalReason: string | null;
}

/** A sheet and its versions, oldest first. Prepared by `editor`, reviewed and released by `editor2`. */
export interface DemoSheet {
  readonly pair: DemoPair;
  readonly versions: readonly DemoVersion[];
}

/** Raw readings of one evaporation tube. */
export interface DemoTubeRun {
  readonly key: string;
  /** The series its point belongs to */
  readonly seriesKey: string;
  readonly liquid: string;
  readonly gas: string;
  /** K, of the bath */
  readonly temperature: number;
  readonly temperatureUncertainty: number;
  /** Pa */
  readonly pressure: number;
  readonly pressureUncertainty: number;
  /** m */
  readonly boreDiameter: number;
  /** s on the clock of `times`; null where nobody wrote it down */
  readonly filledAt: number | null;
  /** s */
  readonly times: readonly number[];
  /** m below the mouth; null for a run read by mass */
  readonly depths: readonly number[] | null;
  /** kg lost since the first reading, with the depth at the first; null for a run read by level */
  readonly masses: readonly number[] | null;
  readonly startDepth: number | null;
  /** m or kg, standard, of one reading */
  readonly readingUncertainty: number;
  /** Readings left out, with the reason */
  readonly leftOut: readonly { readonly index: number; readonly reason: string }[];
  readonly note: string;
}

export interface DemoScenario {
  /** Shown wherever the demo is: what is invented and what is not */
  readonly statement: string;
  readonly group: string;
  readonly people: readonly DemoPerson[];
  readonly instruments: readonly DemoInstrument[];
  readonly pairs: readonly DemoPair[];
  readonly series: readonly DemoSeries[];
  readonly sheets: readonly DemoSheet[];
  readonly tubeRuns: readonly DemoTubeRun[];
}
