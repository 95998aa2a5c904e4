import { z } from 'zod';
import {
  CONSTANT_KINDS,
  type ConstantKind,
  EQUATION_COEFFICIENTS,
  type EquationForm,
  type SubstanceConstant,
} from '../../src/numerics/estimates/constant-kinds.js';
import substances from './substances.json' with { type: 'json' };

/** Hazards a caution may name; the closed list of the library. */
export const HAZARDS = [
  'ASPHYXIANT',
  'CARCINOGENIC',
  'CORROSIVE',
  'FLAMMABLE_GAS',
  'FLAMMABLE_VAPOUR',
  'OXIDISER',
  'OZONE_DEPLETING',
  'PEROXIDE_FORMER',
  'TOXIC',
] as const;
export type Hazard = (typeof HAZARDS)[number];

export interface StarterCaution {
  readonly hazard: Hazard;
  /** One sentence for the reader of a sheet. */
  readonly text: string;
  /** Full citation, or the words “common practice, no source” */
  readonly source: string;
}

/** What a mixture bath is made of. */
export interface StarterComposition {
  readonly constituents: readonly { readonly casNumber: string; readonly moleFraction: number }[];
  readonly source: string;
  readonly note?: string | undefined;
}

/** A substance every installation starts with. */
export interface StarterSubstance {
  readonly name: string;
  readonly synonyms: readonly string[];
  /** As usually written; “air” for air, which has none */
  readonly formula: string;
  /** CAS Registry Number with its check digit */
  readonly casNumber: string | null;
  readonly inchi: string | null;
  readonly molarMassKgPerMol: number;
  readonly molarMassSource: string;
  readonly constants: readonly SubstanceConstant[];
  readonly cautions: readonly StarterCaution[];
  /** For a mixture handled as a substance of its own, such as air */
  readonly composition: StarterComposition | null;
}

const kind = z.enum(Object.keys(CONSTANT_KINDS) as [ConstantKind, ...ConstantKind[]]);
const form = z.enum(Object.keys(EQUATION_COEFFICIENTS) as [EquationForm, ...EquationForm[]]);
const sentence = z.string().min(1);
const kelvin = z.number().positive();
const origin = {
  kind,
  unit: z.string(),
  temperatureMinimumK: kelvin.optional(),
  temperatureMaximumK: kelvin.optional(),
  relativeUncertainty: z.number().positive().lt(1).optional(),
  source: sentence,
  note: sentence.optional(),
};

const constant = z
  .union([
    z.strictObject({ ...origin, value: z.number().positive() }),
    z.strictObject({ ...origin, form, coefficients: z.record(z.string(), z.number()) }),
  ])
  .refine((read) => read.unit === CONSTANT_KINDS[read.kind].unit, 'a constant is kept in the unit of its kind')
  .refine(
    (read) => !('form' in read) || EQUATION_COEFFICIENTS[read.form].every((name) => name in read.coefficients),
    'an equation has every coefficient of its form',
  );

const library = z.strictObject({
  /** Key of a source to its full citation: each citation is written once. */
  sources: z.record(z.string(), sentence),
  substances: z.array(
    z.strictObject({
      name: sentence,
      synonyms: z.array(sentence),
      formula: sentence,
      casNumber: z.string().nullable(),
      inchi: z.string().startsWith('InChI=1S/').nullable(),
      molarMassKgPerMol: z.number().positive().lt(10),
      molarMassSource: sentence,
      constants: z.array(constant),
      cautions: z.array(z.strictObject({ hazard: z.enum(HAZARDS), text: sentence, source: sentence })),
      composition: z
        .strictObject({
          constituents: z.array(z.strictObject({ casNumber: z.string(), moleFraction: z.number().positive().lte(1) })),
          source: sentence,
          note: sentence.optional(),
        })
        .nullable(),
    }),
  ),
});

/**
 * The substances of the starter library with their citations written out.
 *
 * Lennard-Jones constants are those of one set, Poling, Prausnitz, O'Connell 2001, Appendix B (after Svehla 1962);
 * diffusion volumes are those of one set, Fuller, Ensley, Giddings 1969. A substance that set lacks has none.
 *
 * @throws {z.ZodError} when the file does not have the form of the library
 * @throws {RangeError} when a source is named that the file does not cite
 */
export function starterLibrary(): StarterSubstance[] {
  const { sources, substances: entries } = library.parse(substances);
  const cited = <T extends { readonly source: string }>(item: T): T => ({
    ...item,
    source: cite(sources, item.source),
  });
  return entries.map((entry) => ({
    ...entry,
    molarMassSource: cite(sources, entry.molarMassSource),
    constants: entry.constants.map(cited),
    cautions: entry.cautions.map(cited),
    composition: entry.composition && cited(entry.composition),
  }));
}

function cite(sources: Readonly<Record<string, string>>, key: string): string {
  const citation = sources[key];
  if (citation === undefined) throw new RangeError(`the library cites no source ${key}`);
  return citation;
}
