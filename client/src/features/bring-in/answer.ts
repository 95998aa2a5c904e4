import { z } from 'zod';

/** What a column of a table can hold, in the order in which it is offered. */
export const COLUMN_ROLES = [
  'TEMPERATURE',
  'PRESSURE',
  'DIFFUSIVITY',
  'DIFFUSIVITY_UNCERTAINTY',
  'TEMPERATURE_UNCERTAINTY',
  'PRESSURE_UNCERTAINTY',
  'MOLE_FRACTION',
  'REPLICATES',
  'ROW_NUMBER',
  'DATE',
  'IGNORED',
] as const;
export type ColumnRole = (typeof COLUMN_ROLES)[number];

export const CHOICE_IDS = ['KEEP', 'LEAVE_OUT', 'READ_AS'] as const;
export type ChoiceId = (typeof CHOICE_IDS)[number];

export const DECIMALS = ['.', ','] as const;
export const DELIMITERS = ['\t', ';', ','] as const;
export const PRESSURE_ORIGINS = ['STATED', 'ASSIGNED', 'REDUCED_BY_SOURCE'] as const;

const uncertaintySchema = z.object({
  kind: z.enum(['STANDARD', 'EXPANDED']),
  coverageFactor: z.number(),
  scope: z.enum(['INDEPENDENT', 'COMMON']),
});
/** How a stated uncertainty is meant; relative or absolute is told by its unit. */
export type UncertaintyReading = z.infer<typeof uncertaintySchema>;

const columnSchema = z.object({
  role: z.enum(COLUMN_ROLES),
  unit: z.string().nullable(),
  unitOrigin: z.enum(['STATED', 'GUESSED', 'CHOSEN']),
  uncertainty: uncertaintySchema.nullable(),
});
export type ColumnMapping = z.infer<typeof columnSchema>;

const constantSchema = z.object({ value: z.number(), unit: z.string() });

export const mappingSchema = z.object({
  headerRow: z.number().nullable(),
  unitRow: z.number().nullable(),
  columns: z.array(columnSchema),
  temperature: constantSchema.nullable(),
  pressure: constantSchema.nullable(),
  diffusivityUncertainty: constantSchema.extend({ reading: uncertaintySchema }).nullable(),
  pressureOrigin: z.enum(PRESSURE_ORIGINS),
  decimal: z.enum(DECIMALS),
});
/** How a table is understood. Rows are numbered as a spreadsheet numbers them, columns from 0. */
export type TableMapping = z.infer<typeof mappingSchema>;

const pointSchema = z.object({
  temperature: z.number(),
  pressure: z.number(),
  diffusivity: z.number(),
  diffusivityUncertainty: z.number().nullable(),
  temperatureUncertainty: z.number().nullable(),
  pressureUncertainty: z.number().nullable(),
  moleFraction: z.number().nullable(),
  replicates: z.number().nullable(),
});
/** SI; null for what was not stated. */
export type UnderstoodPoint = z.infer<typeof pointSchema>;

const rowSchema = z.object({
  number: z.number(),
  cells: z.array(z.string()),
  state: z.enum(['KEPT', 'LEFT_OUT', 'OPEN']),
  point: pointSchema.nullable(),
  estimate: z.number().nullable(),
});
/** A row as it was brought and as it was understood. */
export type ShownRow = z.infer<typeof rowSchema>;

const issueSchema = z.object({
  id: z.string(),
  code: z.string(),
  severity: z.enum(['REFUSAL', 'DOUBT']),
  row: z.number().nullable(),
  column: z.number().nullable(),
  message: z.string(),
  choices: z.array(z.object({ id: z.enum(CHOICE_IDS), label: z.string() })),
  suggested: z.enum(CHOICE_IDS).nullable(),
  decided: z.enum(CHOICE_IDS).nullable(),
  sameAsRow: z.number().nullable(),
});
/** What is wrong or doubtful, at its cell, row, column, or about the whole table. */
export type Issue = z.infer<typeof issueSchema>;

const spanSchema = z.object({ minimum: z.number(), maximum: z.number() }).nullable();

export const readAnswerSchema = z.object({
  source: z.object({
    origin: z.enum(['TEXT', 'WORKBOOK']),
    encoding: z.string().nullable(),
    delimiter: z.enum(DELIMITERS).nullable(),
    decimal: z.enum(DECIMALS),
    sheet: z.string().nullable(),
    sheets: z.array(z.string()),
    columnCount: z.number(),
    rowCount: z.number(),
  }),
  columns: z.array(z.object({ header: z.string(), reason: z.string().nullable() })),
  mapping: mappingSchema,
  rows: z.array(rowSchema),
  issues: z.array(issueSchema),
  issueCounts: z.record(z.string(), z.number()),
  openCount: z.number(),
  pointCount: z.number(),
  temperature: spanSchema,
  pressure: spanSchema,
  commonRelativeUncertainty: z.number().nullable(),
  assignedUncertainty: z.object({ relative: z.number(), source: z.string(), pointCount: z.number() }),
  estimateLabel: z.string().nullable(),
  isComplete: z.boolean(),
});
/** What the service understood of a table. */
export type ReadAnswer = z.infer<typeof readAnswerSchema>;

export const progressSchema = z.object({
  phase: z.enum(['READING', 'CHECKING', 'STORING', 'DONE', 'REFUSED', 'CANCELLED']),
  rows: z.number(),
  kept: z.object({ seriesId: z.string(), pointCount: z.number() }).nullable(),
});
/** How far an import is. */
export type ImportProgress = z.infer<typeof progressSchema>;

export const isUncertainty = (role: ColumnRole): boolean => role.endsWith('_UNCERTAINTY');

/** Issues in the order of the table, each with the number under which it stands in cell and margin. */
export function numbered(issues: readonly Issue[]): { issue: Issue; number: number }[] {
  const ordered = [...issues].sort((a, b) => (a.row ?? 0) - (b.row ?? 0) || (a.column ?? -1) - (b.column ?? -1));
  return ordered.map((issue, i) => ({ issue, number: i + 1 }));
}
export type NumberedIssue = ReturnType<typeof numbered>[number];

/** An issue with what was chosen a moment ago, before the service has answered; a choice it does not offer decides nothing. */
export function asDecided(issue: Issue, decisions: Readonly<Record<string, ChoiceId>>): Issue {
  const chosen = decisions[issue.id] ?? decisions[issue.code];
  return { ...issue, decided: issue.choices.find(({ id }) => id === chosen)?.id ?? null };
}
