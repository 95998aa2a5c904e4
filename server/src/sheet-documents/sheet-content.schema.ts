import { z } from 'zod';
import type { SheetContent } from './sheet-content.types.js';

const column = z.array(z.number());
const text = z.string();
const optionalText = z.string().nullable();
const optionalNumber = z.number().nullable();

const runs = z.array(
  z.strictObject({ text, style: z.enum(['PLAIN', 'STRONG', 'QUANTITY', 'SUBSCRIPT', 'SUPERSCRIPT']) }),
);
const paragraphs = z.array(runs);

const equationPiece = z.strictObject({
  runs,
  numerator: runs.nullable(),
  denominator: runs.nullable(),
  bracketed: z.boolean(),
  exponent: runs.nullable(),
});

const parameter = z.strictObject({
  symbol: text,
  label: runs,
  value: z.number(),
  standardUncertainty: optionalNumber,
  unit: text,
  printed: text,
  note: optionalText,
});

const correlation = z.strictObject({
  form: text,
  formName: text,
  equation: z.array(equationPiece),
  spoken: text,
  expression: text,
  parameters: z.array(parameter),
  coefficients: z.array(z.strictObject({ label: runs, value: z.number(), printed: text })),
  degreesOfFreedom: optionalNumber,
  coverageFactor: z.number(),
});

const range = z.strictObject({
  temperatureMinimum: z.number(),
  temperatureMaximum: z.number(),
  pressureMinimum: z.number(),
  pressureMaximum: z.number(),
  pressureBasis: text,
  temperaturePrinted: text,
  pressurePrinted: text,
  sentence: runs,
});

const axis = z.strictObject({ minimum: z.number(), maximum: z.number(), ticks: column });

const figures = z.strictObject({
  pressure: z.number(),
  temperatureAxis: axis,
  diffusivityAxis: axis,
  deviationAxis: axis,
  curve: z.strictObject({
    temperatures: column,
    diffusivities: column,
    relativeExpandedUncertainties: column,
    relativeNewLaboratory: column.nullable(),
    firstInside: z.int(),
    lastInside: z.int(),
  }),
  series: z.array(
    z.strictObject({
      key: text,
      mark: z.int(),
      title: text,
      used: z.boolean(),
      temperatures: column,
      reducedDiffusivities: column,
      relativeUncertainties: column,
      deviations: column,
      leftOut: z.array(z.int()),
    }),
  ),
  estimates: z.array(z.strictObject({ method: text, temperatures: column, deviations: column })),
  diffusivityCaption: runs,
  deviationCaption: runs,
});

const recommended = z.strictObject({
  pressure: z.number(),
  temperatures: column,
  diffusivities: column,
  standardUncertainties: column,
  expandedUncertainties: column,
  newLaboratoryHalfWidths: column.nullable(),
  referenceRow: z.int().nullable(),
  note: runs,
});

const series = z.strictObject({
  key: text,
  mark: z.int(),
  title: text,
  source: text,
  method: text,
  apparatus: optionalText,
  origin: text,
  pointCount: z.int(),
  weightedPointCount: z.int(),
  temperatureMinimum: z.number(),
  temperatureMaximum: z.number(),
  pressureMinimum: z.number(),
  pressureMaximum: z.number(),
  relativeUncertainty: optionalNumber,
  uncertaintyAssigned: z.boolean(),
  commonRelativeUncertainty: optionalNumber,
  offset: optionalNumber,
  offsetStandardUncertainty: optionalNumber,
  reason: optionalText,
});

const excludedPoint = z.strictObject({
  seriesKey: text,
  temperature: z.number(),
  pressure: z.number(),
  diffusivity: z.number(),
  deviation: z.number(),
  reason: text,
});

const estimates = z.strictObject({
  temperatures: column,
  pressure: z.number(),
  methods: z.array(
    z.strictObject({
      method: text,
      diffusivities: column,
      deviations: column,
      usualMeanError: z.number(),
      source: text,
    }),
  ),
  note: runs,
});

const standing = z.strictObject({
  status: text,
  word: text,
  banner: optionalText,
  watermark: optionalText,
  supersededBy: optionalText,
  withdrawnAt: optionalText,
  withdrawalReason: optionalText,
  contentHash: optionalText,
  previousHash: optionalText,
});

const versionRow = z.strictObject({
  number: text,
  status: text,
  word: text,
  date: optionalText,
  datePrinted: text,
  change: text,
  isThis: z.boolean(),
});

const margin = z.strictObject({
  fitNumber: text,
  entries: z.array(z.strictObject({ label: runs, value: text })),
  fit: paragraphs,
  figures: paragraphs,
  series: paragraphs,
});

/** Content as it stands in a snapshot; anything more or less is refused. */
export const sheetContentSchema: z.ZodType<SheetContent> = z.strictObject({
  code: text,
  number: text,
  title: text,
  lead: runs,
  summary: text,
  sections: z.array(z.strictObject({ id: text, number: z.int(), title: text })),
  standing,
  substances: z.array(z.strictObject({ name: text, formula: runs, casNumber: optionalText, molarMass: z.number() })),
  definition: runs,
  correlation,
  range,
  figures,
  recommended,
  seriesUsed: z.array(series),
  seriesLeftOut: z.array(series),
  pointsLeftOut: z.array(excludedPoint),
  estimates,
  uncertainty: z.strictObject({ statement: paragraphs, notIncluded: paragraphs }),
  cautions: paragraphs,
  citation: z.strictObject({ runs, plain: text, doi: optionalText }),
  versions: z.array(versionRow),
  remarks: z.array(z.strictObject({ section: text, text })),
  margin,
});
