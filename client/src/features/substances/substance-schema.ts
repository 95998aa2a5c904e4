import { z } from 'zod';
import { type SubstanceConstantKind, type SubstanceFieldsFragment, type SubstanceInput } from '../../gql/graphql';
import { parseNumber } from '../../lib/parse-number';
import { substanceStrings } from '../../strings/substances';
import { CONSTANT_UNITS } from './constant-units';

const problems = substanceStrings.form.problems;

/** Digits of a CAS Registry Number weighted 1, 2, 3, … from the right; their sum modulo 10 is the check digit. */
export function isCasNumber(text: string): boolean {
  if (!/^[1-9]\d{1,6}-\d{2}-\d$/.test(text)) return false;
  const digits = [...text.replaceAll('-', '')].map(Number);
  const check = digits.pop();
  const sum = digits.reverse().reduce((total, digit, i) => total + digit * (i + 1), 0);
  return sum % 10 === check;
}

const isEmptyOrNumber = (text: string) => text.trim() === '' || parseNumber(text) !== null;
const positive = z
  .string()
  .refine((text) => parseNumber(text) !== null, problems.number)
  .refine((text) => (parseNumber(text) ?? 1) > 0, problems.positive);
const optionalNumber = z.string().refine(isEmptyOrNumber, problems.number);

const constantSchema = z
  .object({
    kind: z.string().refine((kind): kind is SubstanceConstantKind => Object.hasOwn(CONSTANT_UNITS, kind)),
    value: positive,
    temperatureMinimum: optionalNumber,
    temperatureMaximum: optionalNumber,
    relativePercent: optionalNumber.refine((text) => {
      const value = parseNumber(text) ?? 0;
      return value >= 0 && value < 100;
    }, problems.relative),
    source: z.string().trim().min(1, problems.source),
    note: z.string(),
  })
  .refine(
    ({ temperatureMinimum, temperatureMaximum }) =>
      (parseNumber(temperatureMinimum) ?? 0) <= (parseNumber(temperatureMaximum) ?? Infinity),
    { path: ['temperatureMaximum'], error: problems.range },
  );

/** What is typed, in the units of the laboratory; `toInput` turns it into the API's. */
export const substanceSchema = z.object({
  name: z.string().trim().min(1, problems.name),
  formula: z
    .string()
    .trim()
    .regex(/^[A-Za-z0-9()]+$/, problems.formula),
  casNumber: z
    .string()
    .trim()
    .refine((text) => text === '' || isCasNumber(text), problems.cas),
  inchi: z.string().trim(),
  molarMassGrams: positive,
  synonyms: z.string(),
  constants: z.array(constantSchema),
});

export type SubstanceFormValues = z.input<typeof substanceSchema>;
type SubstanceParsed = z.output<typeof substanceSchema>;

export const emptyConstant = (): SubstanceFormValues['constants'][number] => ({
  kind: 'DIFFUSION_VOLUME',
  value: '',
  temperatureMinimum: '',
  temperatureMaximum: '',
  relativePercent: '',
  source: '',
  note: '',
});

export const emptySubstance: SubstanceFormValues = {
  name: '',
  formula: '',
  casNumber: '',
  inchi: '',
  molarMassGrams: '',
  synonyms: '',
  constants: [],
};

const typed = (value: number | null | undefined): string =>
  value == null ? '' : String(Number(value.toPrecision(12)));

/** A substance as it stands in the form; constants that are equations are not edited there. */
export const toFormValues = (substance: SubstanceFieldsFragment): SubstanceFormValues => ({
  name: substance.name,
  formula: substance.formula,
  casNumber: substance.casNumber ?? '',
  inchi: substance.inchi ?? '',
  molarMassGrams: typed(1000 * substance.molarMass),
  synonyms: substance.synonyms.join('; '),
  constants: substance.constants.flatMap((constant) =>
    constant.value == null
      ? []
      : [
          {
            kind: constant.kind,
            value: typed(constant.value),
            temperatureMinimum: typed(constant.temperatureMinimum),
            temperatureMaximum: typed(constant.temperatureMaximum),
            relativePercent: constant.relativeUncertainty == null ? '' : typed(100 * constant.relativeUncertainty),
            source: constant.source,
            note: constant.note ?? '',
          },
        ],
  ),
});

type Kept = SubstanceFieldsFragment['constants'];

/** What was typed, as the API takes it: kg/mol, UCUM units, relative uncertainties; equations as they were. */
export const toInput = (values: SubstanceParsed, kept: Kept = []): SubstanceInput => ({
  name: values.name,
  formula: values.formula,
  casNumber: values.casNumber || null,
  inchi: values.inchi || null,
  molarMass: (parseNumber(values.molarMassGrams) ?? NaN) / 1000,
  synonyms: values.synonyms
    .split(';')
    .map((synonym) => synonym.trim())
    .filter((synonym) => synonym !== ''),
  constants: [
    ...values.constants.map((constant) => {
      const percent = parseNumber(constant.relativePercent);
      return {
        kind: constant.kind,
        value: parseNumber(constant.value),
        unit: CONSTANT_UNITS[constant.kind],
        temperatureMinimum: parseNumber(constant.temperatureMinimum),
        temperatureMaximum: parseNumber(constant.temperatureMaximum),
        relativeUncertainty: percent === null ? null : percent / 100,
        source: constant.source,
        note: constant.note || null,
      };
    }),
    ...kept.filter((constant) => constant.value == null).map(equationInput),
  ],
});

const equationInput = ({
  kind,
  form,
  coefficients,
  unit,
  temperatureMinimum,
  temperatureMaximum,
  relativeUncertainty,
  source,
  note,
}: Kept[number]) => ({
  kind: kind,
  form: form ?? null,
  coefficients: coefficients.map(({ symbol, value }) => ({ symbol, value })),
  unit,
  temperatureMinimum: temperatureMinimum ?? null,
  temperatureMaximum: temperatureMaximum ?? null,
  relativeUncertainty: relativeUncertainty ?? null,
  source,
  note: note ?? null,
});
