import { z } from 'zod';
import type { EvaluableCorrelation, FitRecipe } from '../numerics/fitting/fit.types.js';
import { sheetContentSchema } from './sheet-content.schema.js';
import type { FitFacts, PointColumns, SeriesFacts } from './sheet-facts.js';

const column = z.array(z.number());
const gappyColumn = z.array(z.number().nullable());
const text = z.string();
const sha256 = z.string().regex(/^[0-9a-f]{64}$/);

const form = z.enum([
  'POWER_LAW',
  'POWER_LAW_FREE_PRESSURE',
  'SUTHERLAND',
  'LOG_QUADRATIC',
  'THREE_TERM',
  'KINETIC_THEORY',
]);

const correlation: z.ZodType<EvaluableCorrelation> = z.strictObject({
  form,
  parameters: z.array(
    z.strictObject({ symbol: text, value: z.number(), standardUncertainty: z.number().nullable(), unit: text }),
  ),
  covariance: z.array(column),
  degreesOfFreedom: z.number().nullable(),
  referenceTemperature: z.number(),
  referencePressure: z.number(),
  validity: z.strictObject({
    temperatureMinimum: z.number(),
    temperatureMaximum: z.number(),
    pressureMinimum: z.number(),
    pressureMaximum: z.number(),
    pressureBasis: z.enum(['MEASURED', 'STATED']),
  }),
  betweenSeries: z
    .strictObject({ intercept: z.number(), slope: z.number(), covariance: z.number(), centre: z.number() })
    .nullable(),
});

const recipe: z.ZodType<FitRecipe> = z.strictObject({
  form,
  objective: z.enum(['LN_DIFFUSIVITY', 'DIFFUSIVITY']),
  weighting: z.enum(['STATED', 'EFFECTIVE_VARIANCE', 'EQUAL']),
  loss: z.enum(['LEAST_SQUARES', 'HUBER', 'BISQUARE']),
  seriesEffect: z.enum(['POOLED', 'RANDOM_INTERCEPT', 'RANDOM_INTERCEPT_AND_SLOPE']),
  betweenSeriesDeviation: z.number().nullable(),
  referenceTemperature: z.number(),
  referencePressure: z.number(),
});

const fit: z.ZodType<FitFacts> = z.strictObject({
  number: z.int(),
  createdAt: text,
  engineVersion: text,
  recipe,
  statistics: z.strictObject({
    pointCount: z.int(),
    seriesCount: z.int(),
    residualDegreesOfFreedom: z.number(),
    chiSquare: z.number().nullable(),
    reducedChiSquare: z.number().nullable(),
    chiSquareProbability: z.number().nullable(),
    residualStandardError: z.number().nullable(),
    aicc: z.number().nullable(),
    betweenSeriesDeviation: z.number().nullable(),
    betweenSeriesOrigin: z.enum(['STATED', 'ASSIGNED']).nullable(),
    cochranQ: z.number().nullable(),
    iSquared: z.number().nullable(),
  }),
});

const points: z.ZodType<PointColumns> = z
  .strictObject({
    temperatures: column,
    pressures: column,
    pressureOrigins: z.array(z.enum(['STATED', 'ASSIGNED', 'REDUCED_BY_SOURCE'])),
    diffusivities: column,
    diffusivityUncertainties: gappyColumn,
    uncertaintyOrigins: z.array(z.enum(['STATED', 'ASSIGNED']).nullable()),
    temperatureUncertainties: gappyColumn,
    pressureUncertainties: gappyColumn,
    moleFractions: gappyColumn,
    replicates: gappyColumn,
  })
  .refine((columns) => new Set(Object.values(columns).map((one) => one.length)).size === 1, {
    error: 'The columns of the points are not of equal length.',
  });

const series: z.ZodType<SeriesFacts> = z.strictObject({
  ordinal: z.int(),
  title: text,
  source: text,
  method: text,
  apparatus: text.nullable(),
  dataOrigin: z.enum(['TABLE', 'GRAPH', 'SMOOTHED', 'EQUATION', 'TUBE_RUN']),
  commonRelativeUncertainty: z.number().nullable(),
  points,
  excluded: z.array(z.strictObject({ index: z.int(), reason: text })),
  offset: z.strictObject({ value: z.number(), standardUncertainty: z.number() }).nullable(),
  leftOutBecause: text.nullable(),
});

/** Name and version of the format of a release; a reader refuses any other. */
export const SNAPSHOT_FORMAT = { format: 'diffolio-release', formatVersion: 1 } as const;

export const snapshotSchema = z.strictObject({
  format: z.literal(SNAPSHOT_FORMAT.format),
  formatVersion: z.literal(SNAPSHOT_FORMAT.formatVersion),
  sheet: text,
  number: text,
  releasedAt: text,
  doi: text,
  previousHash: sha256.nullable(),
  people: z.strictObject({ preparedBy: text, reviewedBy: z.array(text), releasedBy: text }),
  changeNote: text.nullable(),
  correlation,
  fit,
  series: z.array(series),
  content: sheetContentSchema,
});

/**
 * What a release freezes: what the sheet says, and all that its numbers can be computed from again. Quantities SI, times
 * ISO 8601. `content` is the sheet as it read on the day of its release; its own hash cannot stand in it.
 */
export type Snapshot = z.infer<typeof snapshotSchema>;
