import { parseUnit, toSi, type Unit, type UnitQuantity } from '../units/units.js';
import { type Issue, doubt, refusal } from './issues.js';
import {
  type ColumnMapping,
  type ColumnRole,
  type ConstantValue,
  isUncertainty,
  NAME_OF_ROLE,
  QUANTITY_OF_ROLE,
  type TableMapping,
} from './mapping.js';

const ANYWHERE = { row: null, column: null };

/** What is wrong or guessed about a mapping, each thing at its column. */
export function checkMapping(mapping: TableMapping): Issue[] {
  return [...checkPresence(mapping), ...checkConstants(mapping), ...mapping.columns.flatMap(checkColumn)];
}

function checkPresence(mapping: TableMapping): Issue[] {
  const issues: Issue[] = [];
  const roles = mapping.columns.map(({ role }) => role);
  for (const role of new Set(roles.filter((one) => one !== 'IGNORED'))) {
    const second = roles.indexOf(role, roles.indexOf(role) + 1);
    if (second >= 0) {
      issues.push(
        refusal('COLUMN_TWICE', { row: null, column: second }, `Two columns hold the ${NAME_OF_ROLE[role]}. Keep one.`),
      );
    }
  }
  const missing = (role: ColumnRole, instead: string): void => {
    const message = `No column holds the ${NAME_OF_ROLE[role]}. ${instead}`;
    if (!roles.includes(role))
      issues.push({ ...refusal('MISSING_COLUMN', ANYWHERE, message), id: `MISSING_COLUMN:${role}` });
  };
  missing('DIFFUSIVITY', 'Say which one does.');
  if (mapping.temperature === null) missing('TEMPERATURE', 'Say which one does, or give one temperature for all rows.');
  if (mapping.pressure === null) missing('PRESSURE', 'Say which one does, or give one pressure for all rows.');
  return issues;
}

function checkConstants(mapping: TableMapping): Issue[] {
  const wrong = (field: string, message: string): Issue => ({
    ...refusal('BAD_CONSTANT', ANYWHERE, message),
    id: `BAD_CONSTANT:${field}`,
  });
  const check = (field: 'temperature' | 'pressure', constant: ConstantValue | null): Issue[] => {
    if (constant === null) return [];
    const unit = parseUnit(constant.unit, field);
    if (unit === null) return [wrong(field, `“${constant.unit}” is not a unit of ${field}.`)];
    return Number.isFinite(constant.value) && toSi(constant.value, unit) > 0
      ? []
      : [wrong(field, `The ${field} of all rows must be above zero.`)];
  };
  return [
    ...check('temperature', mapping.temperature),
    ...check('pressure', mapping.pressure),
    ...checkConstantUncertainty(mapping, wrong),
  ];
}

function checkConstantUncertainty(mapping: TableMapping, wrong: (field: string, message: string) => Issue): Issue[] {
  const stated = mapping.diffusivityUncertainty;
  if (stated === null) return [];
  const field = 'diffusivityUncertainty';
  if (uncertaintyUnit(stated.unit, 'diffusivity') === null) {
    return [wrong(field, `“${stated.unit}” is neither a unit of diffusivity nor a fraction.`)];
  }
  const { kind, coverageFactor } = stated.reading;
  if (!(stated.value > 0 && Number.isFinite(stated.value)))
    return [wrong(field, 'The uncertainty of all rows must be above zero.')];
  return kind === 'EXPANDED' && !(coverageFactor > 0) ? [wrong(field, 'The coverage factor must be above zero.')] : [];
}

/** The unit of an uncertainty: a fraction of its quantity, or the quantity's own. */
export function uncertaintyUnit(text: string, quantity: UnitQuantity): Unit | null {
  return parseUnit(text, 'fraction') ?? parseUnit(text, quantity);
}

/** The unit of a column, or null when it has none that fits. */
export function columnUnit({ role, unit }: ColumnMapping): Unit | null {
  const quantity = QUANTITY_OF_ROLE[role];
  if (quantity === undefined || unit === null) return null;
  return isUncertainty(role) ? uncertaintyUnit(unit, quantity) : parseUnit(unit, quantity);
}

function checkColumn(mapping: ColumnMapping, column: number): Issue[] {
  const quantity = QUANTITY_OF_ROLE[mapping.role];
  if (quantity === undefined) return [];
  const at = { row: null, column };
  const name = NAME_OF_ROLE[mapping.role];
  if (mapping.unit === null) return [refusal('UNIT_MISSING', at, `Say in which unit the ${name} is.`)];
  if (columnUnit(mapping) === null) {
    const known = parseUnit(mapping.unit);
    const message = known
      ? `“${mapping.unit}” is a unit of ${known.quantity}, but the column holds the ${name}.`
      : `“${mapping.unit}” is not a unit that is known here. Choose the unit of the ${name}.`;
    return [refusal(known ? 'WRONG_UNIT' : 'UNKNOWN_UNIT', at, message)];
  }
  const factor = mapping.uncertainty;
  if (factor?.kind === 'EXPANDED' && !(factor.coverageFactor > 0 && Number.isFinite(factor.coverageFactor))) {
    return [refusal('BAD_COVERAGE_FACTOR', at, 'The coverage factor k of an expanded uncertainty must be above zero.')];
  }
  if (mapping.unitOrigin !== 'GUESSED') return [];
  const message = `No unit is written for the ${name}; ${mapping.unit} would fit the size of the numbers. Is it ${mapping.unit}?`;
  return [doubt('UNIT_GUESSED', at, message, { choices: [{ id: 'KEEP', label: `it is ${mapping.unit}` }] })];
}
