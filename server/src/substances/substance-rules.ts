import { isCasNumber } from '../numerics/identifiers/cas-number.js';
import { type Problem } from '../common/problem.js';
import {
  CONSTANT_KINDS,
  type ConstantKind,
  EQUATION_COEFFICIENTS,
  type EquationForm,
} from '../numerics/estimates/constant-kinds.js';

/** What somebody enters about a substance. */
export interface SubstanceFacts {
  name: string;
  formula: string;
  casNumber?: string | null;
  molarMass: number;
  constants?: readonly ConstantFacts[] | null;
}

export interface ConstantFacts {
  kind: ConstantKind;
  value?: number | null;
  unit: string;
  form?: EquationForm | null;
  coefficients?: readonly { symbol: string; value: number }[] | null;
  temperatureMinimum?: number | null;
  temperatureMaximum?: number | null;
  source: string;
}

/** No molecule of a gas is heavier than this, kg/mol; beyond it somebody typed g/mol. */
const HEAVIEST_MOLAR_MASS = 1;

const bad = (message: string, path: string): Problem => ({ code: 'BAD_INPUT', message, path });

function coefficientProblems(form: EquationForm, given: readonly { symbol: string }[], path: string): Problem[] {
  const symbols = new Set(given.map(({ symbol }) => symbol));
  const missing = EQUATION_COEFFICIENTS[form].filter((symbol) => !symbols.has(symbol));
  return missing.length > 0 ? [bad(`The equation lacks ${missing.join(', ')}.`, path)] : [];
}

function constantProblems(constant: ConstantFacts, path: string): Problem[] {
  const problems: Problem[] = [];
  const hasValue = constant.value !== null && constant.value !== undefined;
  if (hasValue === Boolean(constant.form)) {
    problems.push(bad('Give either a value or an equation with its coefficients.', `${path}.value`));
  }
  if (constant.form) {
    problems.push(...coefficientProblems(constant.form, constant.coefficients ?? [], `${path}.coefficients`));
  }
  if (constant.unit !== CONSTANT_KINDS[constant.kind].unit) {
    problems.push(bad(`This constant is kept in ${CONSTANT_KINDS[constant.kind].unit}.`, `${path}.unit`));
  }
  if (constant.source.trim() === '') problems.push(bad('Every constant names its source.', `${path}.source`));
  const { temperatureMinimum: low, temperatureMaximum: high } = constant;
  if (low !== null && low !== undefined && low <= 0)
    problems.push(bad('A temperature is above 0 K.', `${path}.temperatureMinimum`));
  if (low !== null && low !== undefined && high !== null && high !== undefined && high <= low) {
    problems.push(bad('The range ends above its beginning.', `${path}.temperatureMaximum`));
  }
  return problems;
}

/** What must be mended before a substance is kept; empty when nothing. */
export function substanceProblems(facts: SubstanceFacts): Problem[] {
  const problems: Problem[] = [];
  if (facts.name.trim() === '') problems.push(bad('A substance has a name.', 'name'));
  if (facts.formula.trim() === '') problems.push(bad('A substance has a formula.', 'formula'));
  if (facts.casNumber && !isCasNumber(facts.casNumber)) {
    problems.push(bad(`${facts.casNumber} is not a CAS Registry Number: its check digit does not agree.`, 'casNumber'));
  }
  if (!(facts.molarMass > 0 && facts.molarMass < HEAVIEST_MOLAR_MASS)) {
    problems.push(bad('The molar mass is in kg/mol: between 0 and 1.', 'molarMass'));
  }
  facts.constants?.forEach((constant, i) => problems.push(...constantProblems(constant, `constants.${i}`)));
  return problems;
}
