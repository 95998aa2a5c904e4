import { DataSource } from 'typeorm';
import {
  EQUATION_COEFFICIENTS,
  type SubstanceConstant as LibraryConstant,
} from '../src/numerics/estimates/constant-kinds.js';
import { Substance, type SubstanceConstant } from '../src/substances/substance.entity.js';
import { type StarterSubstance, starterLibrary } from './library/library.js';

function toConstant(constant: LibraryConstant): SubstanceConstant {
  const isEquation = 'form' in constant;
  return {
    kind: constant.kind,
    value: isEquation ? null : constant.value,
    form: isEquation ? constant.form : null,
    coefficients: isEquation
      ? EQUATION_COEFFICIENTS[constant.form].map((symbol) => ({
          symbol,
          value: constant.coefficients[symbol] ?? Number.NaN,
        }))
      : [],
    unit: constant.unit,
    temperatureMinimum: constant.temperatureMinimumK ?? null,
    temperatureMaximum: constant.temperatureMaximumK ?? null,
    relativeUncertainty: constant.relativeUncertainty ?? null,
    source: constant.source,
    note: constant.note ?? null,
  };
}

function toSubstance(starter: StarterSubstance): Partial<Substance> {
  return {
    name: starter.name,
    formula: starter.formula,
    synonyms: [...starter.synonyms],
    casNumber: starter.casNumber,
    inchi: starter.inchi,
    molarMass: starter.molarMassKgPerMol,
    constants: starter.constants.map(toConstant),
    composition: starter.composition?.constituents.map((part) => ({ ...part })) ?? null,
    cautions: starter.cautions.map(({ text, source }) => ({ text, source })),
    createdById: null,
  };
}

/** Puts in what the library of substances lacks; what people have changed stays. */
export async function seedLibrary(dataSource: DataSource): Promise<void> {
  await dataSource
    .createQueryBuilder()
    .insert()
    .into(Substance)
    .values(starterLibrary().map(toSubstance))
    .orIgnore()
    .updateEntity(false)
    .execute();
}
