import { z } from 'zod';
import { MAX_COLUMNS } from './limits.js';
import { COLUMN_ROLES } from './mapping.js';

const unit = z.string().max(60);
const rowNumber = z.int().min(1).max(1_048_576);

const UncertaintyReadingBody = z.object({
  kind: z.enum(['STANDARD', 'EXPANDED']),
  coverageFactor: z.number().positive(),
  scope: z.enum(['INDEPENDENT', 'COMMON']),
});

const ConstantBody = z.object({ value: z.number(), unit });

const MappingBody = z.object({
  headerRow: rowNumber.nullable(),
  unitRow: rowNumber.nullable(),
  columns: z
    .array(
      z.object({
        role: z.enum(COLUMN_ROLES),
        unit: unit.nullable(),
        unitOrigin: z.enum(['STATED', 'GUESSED', 'CHOSEN']),
        uncertainty: UncertaintyReadingBody.nullable(),
      }),
    )
    .max(MAX_COLUMNS),
  temperature: ConstantBody.nullable(),
  pressure: ConstantBody.nullable(),
  diffusivityUncertainty: ConstantBody.extend({ reading: UncertaintyReadingBody }).nullable(),
  pressureOrigin: z.enum(['STATED', 'ASSIGNED', 'REDUCED_BY_SOURCE']),
  decimal: z.enum(['.', ',']),
});

const SubstanceBody = z.union([
  z.strictObject({ id: z.string() }),
  z.strictObject({ casNumber: z.string() }),
  z.strictObject({ name: z.string() }),
]);

const choice = z.enum(['KEEP', 'LEAVE_OUT', 'READ_AS']);

/** What names a table and says how it is to be read and understood; exactly one of `fileId` and `text`. */
const TableBody = z.object({
  fileId: z.string().optional(),
  text: z.string().optional(),
  sheet: z.string().max(200).nullish(),
  delimiter: z.enum([',', ';', '\t']).nullish(),
  decimal: z.enum(['.', ',']).nullish(),
  /** absent: as the table itself suggests */
  mapping: MappingBody.nullish(),
  decisions: z.record(z.string().max(100), choice).default({}),
});

const EXACTLY_ONE = 'give either fileId or text';
const hasOneSource = ({ fileId, text }: { fileId?: string | undefined; text?: string | undefined }): boolean =>
  (fileId === undefined) !== (text === undefined);

export const ReadBody = TableBody.extend({
  a: SubstanceBody.nullish(),
  b: SubstanceBody.nullish(),
  /** of measurement; it tells the usual uncertainty */
  method: z.string().max(500).default(''),
}).refine(hasOneSource, EXACTLY_ONE);
export type ReadRequest = z.infer<typeof ReadBody>;

export const KeepBody = TableBody.extend({
  /** chosen by the caller: the same import is done once, and can be followed and cancelled by this id */
  importId: z.uuid().optional(),
  a: SubstanceBody,
  b: SubstanceBody,
  title: z.string().max(300),
  source: z.string().max(2000),
  method: z.string().max(500),
  apparatus: z.string().max(500).nullish(),
  dataOrigin: z.enum(['TABLE', 'GRAPH', 'SMOOTHED', 'EQUATION', 'TUBE_RUN']).default('TABLE'),
  commonRelativeUncertainty: z.number().nullish(),
  sameDataAsId: z.string().nullish(),
}).refine(hasOneSource, EXACTLY_ONE);
export type KeepRequest = z.infer<typeof KeepBody>;
