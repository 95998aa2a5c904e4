import { parseUnit, type Unit } from '../units/units.js';
import { type ColumnRole, STATED_AS_STANDARD, type UncertaintyReading } from './mapping.js';

/** What the text above a column says. */
export interface HeaderReading {
  role: ColumnRole | null;
  unit: Unit | null;
  /** text that stands where a unit stands and names none */
  unknownUnit: string | null;
  uncertainty: UncertaintyReading | null;
}

/** Words and symbols by which tables name their columns, English terms and the usual letter symbols (common practice, no source). */
const NAMES: readonly (readonly [ColumnRole, RegExp])[] = [
  ['ROW_NUMBER', /^(?:nr|no|#|№|row|row (?:nr|no|number)|index|id|point|pt|run|run (?:nr|no|number))$/],
  ['DATE', /^(?:date|day|datum|time|when|measured(?: on)?)$/],
  [
    'REPLICATES',
    /^(?:n|replicates?|repeats?|repetitions|runs|count|number of (?:runs|replicates|measurements)|n runs)$/,
  ],
  [
    'MOLE_FRACTION',
    /^(?:[xy](?: ?[a12])?|mole fraction(?: [^/%()[\]]+)?|mol fraction|mole frac|amount fraction|composition)$/,
  ],
  [
    'TEMPERATURE',
    /^(?:t|θ|temp|temperature|temperatures|bath temperature|tube temperature|mean temperature|t (?:mean|bath|avg))$/,
  ],
  [
    'PRESSURE',
    /^(?:p|pres|press|pressure|total pressure|barometer|barometric pressure|p ?(?:tot|total|atm|abs)|absolute pressure)$/,
  ],
  [
    'DIFFUSIVITY',
    /^(?:d|d ?(?:12|ab|21|ij|exp|meas|obs|va|m)|diffusivity|diffusivities|(?:binary |mutual |gas )*(?:diffusivity|diffusion(?: coefficients?| constant)?|diff coeff?|diffusion coeff?)(?: d(?: ?(?:12|ab))?)?)$/,
  ],
];

const UNCERTAINTY_OF: Partial<Record<ColumnRole, ColumnRole>> = {
  TEMPERATURE: 'TEMPERATURE_UNCERTAINTY',
  PRESSURE: 'PRESSURE_UNCERTAINTY',
  DIFFUSIVITY: 'DIFFUSIVITY_UNCERTAINTY',
};

/** Lower case, without decoration: `D_{AB}` becomes `d ab`. */
const bare = (text: string): string =>
  text
    .toLowerCase()
    .replace(/[₀₁₂₃₄₅₆₇₈₉]/g, (digit) => String('₀₁₂₃₄₅₆₇₈₉'.indexOf(digit)))
    .replace(/[_{}.:,;*"“”'|\\]/g, ' ')
    .replace(/\s+/g, ' ')
    .trim();

const nameOf = (text: string): ColumnRole | null => NAMES.find(([, names]) => names.test(bare(text)))?.[0] ?? null;

/** `u(D)`, `uD`, `U_D`, `ur(D12)`: the letter of the uncertainty around that of the quantity. */
const UNCERTAIN_SYMBOL = /^[uUδΔσs]c?(?:rel|r)?[ _]?[([]?\s*([DdTtPpxy])(?:[ _{]*(?:12|AB)\}?)?\s*[)\]]?$/;
/** What an uncertainty is called before the quantity it belongs to. */
const UNCERTAIN_BEFORE =
  /^(?:(?:standard|std|expanded|relative|rel|combined|absolute|abs)\.? )*(?:uncertainty|unc|error|err|deviation|dev|std|sd|se|sigma|u)\.? (?:of |in |for )?(?:the )?[([]?(.+?)[)\]]?$/i;
const UNCERTAIN_AFTER = /^(.+?)[ _](?:err|error|unc|uncertainty|std|sd|se|sigma|u)$/i;
const UNCERTAIN_ALONE =
  /^(?:±|\+\/?-|\+-|u|σ|unc|uncertainty|(?:rel(?:ative)?|std|standard|expanded|combined|abs(?:olute)?) (?:uncertainty|error|unc)|error|err|std|sd|accuracy|standard deviation)$/i;

/** No name with a unit is longer; what is, is prose. */
const MAX_HEADER_CHARACTERS = 100;

/** Splits `T / K`, `T [K]`, `T (K)`, `T in K`, `T, K`, `temperature_k` into a name and what may be a unit. */
function candidates(text: string): { name: string; unit: string }[] {
  const found: { name: string; unit: string }[] = [];
  const add = (match: RegExpExecArray | null): void => {
    if (match?.[1] !== undefined && match[2] !== undefined) found.push({ name: match[1], unit: match[2] });
  };
  add(/^(.*\S)\s*[[(]([^[\]]*?)[\])]\s*$/.exec(text));
  add(/^(.*?)\s*\/\s*(?:\()?(.+?)(?:\))?$/.exec(text));
  add(/^(.*?)\s+in\s+(.+)$/i.exec(text));
  add(/^(.*?)\s*,\s*(.+)$/.exec(text));
  const words = text.split(/[\s_]+/);
  for (let i = 1; i < words.length; i++) {
    found.push({ name: words.slice(0, i).join(' '), unit: words.slice(i).join(' ') });
    // `d_cm2_s`: a quotient spelt with underscores
    if (text.includes('_')) found.push({ name: words.slice(0, i).join(' '), unit: words.slice(i).join('/') });
  }
  return found;
}

/**
 * Reads the text above a column: quantity, unit, whether it is an uncertainty and of which kind.
 *
 * @param left role of the column to the left, to which a bare `±` belongs
 */
export function readHeader(header: string, left: ColumnRole | null): HeaderReading {
  const { text, coverageFactor } = withoutCoverage(header.trim().slice(0, MAX_HEADER_CHARACTERS));
  const whole = nameAndUncertainty(text, left);
  if (whole !== null) return reading(whole, null, null, coverageFactor, text);
  for (const { name, unit } of candidates(text)) {
    const parsed = parseUnit(unit);
    const role = parsed === null ? null : nameAndUncertainty(name, left);
    if (role !== null) return reading(role, parsed, null, coverageFactor, name);
  }
  for (const { name, unit } of candidates(text)) {
    const role = nameAndUncertainty(name, left);
    if (role !== null) return reading(role, null, unit, coverageFactor, name);
  }
  return { role: null, unit: parseUnit(text), unknownUnit: null, uncertainty: null };
}

function reading(
  role: ColumnRole,
  unit: Unit | null,
  unknownUnit: string | null,
  coverageFactor: number | null,
  name: string,
): HeaderReading {
  if (!role.endsWith('_UNCERTAINTY')) return { role, unit, unknownUnit, uncertainty: null };
  // U is the symbol of an expanded uncertainty, u of a standard one (GUM, JCGM 100:2008, annex J).
  const expanded = coverageFactor !== null || /^U[\s_([]?/.test(name) || /expanded/i.test(name);
  const uncertainty: UncertaintyReading = expanded
    ? { kind: 'EXPANDED', coverageFactor: coverageFactor ?? 2, scope: 'INDEPENDENT' }
    : STATED_AS_STANDARD;
  return { role, unit, unknownUnit, uncertainty };
}

/** `U(D) (k=2)`: the coverage factor, and the text without it. */
function withoutCoverage(header: string): { text: string; coverageFactor: number | null } {
  const match = /[([,;]?\s*\bk\s*=\s*(\d+(?:[.,]\d+)?)\s*[)\]]?/i.exec(header);
  if (!match?.[1]) return { text: header, coverageFactor: null };
  const factor = Number(match[1].replace(',', '.'));
  return {
    text: header.replace(match[0], ' ').replace(/\s+/g, ' ').trim(),
    coverageFactor: factor > 0 ? factor : null,
  };
}

function nameAndUncertainty(text: string, left: ColumnRole | null): ColumnRole | null {
  if (UNCERTAIN_ALONE.test(text.trim())) return UNCERTAINTY_OF[left ?? 'DIFFUSIVITY'] ?? 'DIFFUSIVITY_UNCERTAINTY';
  const plain = nameOf(text);
  if (plain !== null) return plain;
  const inner = [UNCERTAIN_SYMBOL, UNCERTAIN_BEFORE, UNCERTAIN_AFTER]
    .map((pattern) => pattern.exec(text.trim())?.[1])
    .find((found) => found !== undefined);
  const of = inner === undefined ? null : nameOf(inner);
  return of === null ? null : (UNCERTAINTY_OF[of] ?? null);
}
