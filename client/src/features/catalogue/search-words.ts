import { parseNumber } from '../../lib/parse-number';
import { pressureUnits, temperatureUnits, toSi, type PressureUnit, type TemperatureUnit } from '../../lib/units';

export interface SearchWords {
  /** For the service: names, formulas, CAS numbers. */
  readonly words: string;
  /** K */
  readonly temperature: number | null;
  /** Pa */
  readonly pressure: number | null;
}

const STATE = /\s+at\s+(.+)$/i;
const QUANTITY = /([+\-\u2212]?[\d.,]+)\s*([°\p{L}]+)/gu;

/** Takes “water + air at 320 K and 90 kPa” apart into what to look for and the state to open it at. */
export function searchWords(text: string): SearchWords {
  const state = STATE.exec(text)?.[1] ?? '';
  let temperature: number | null = null;
  let pressure: number | null = null;
  for (const [, number = '', label = ''] of state.matchAll(QUANTITY)) {
    const value = parseNumber(number);
    const temperatureUnit = unitOf<TemperatureUnit>(temperatureUnits, label);
    const pressureUnit = unitOf<PressureUnit>(pressureUnits, label);
    if (value === null) continue;
    if (temperatureUnit) temperature = toSi('temperature', value, temperatureUnit);
    else if (pressureUnit) pressure = toSi('pressure', value, pressureUnit);
  }
  const isState = temperature !== null || pressure !== null;
  const words = (isState ? text.replace(STATE, '') : text).replace(/\s*\+\s*/g, ' ').trim();
  return { words, temperature, pressure };
}

function unitOf<U extends string>(
  table: Readonly<Record<U, { readonly label: string }>>,
  label: string,
): U | undefined {
  const entries = Object.entries<{ readonly label: string }>(table);
  return entries.find(([, unit]) => unit.label.toLowerCase() === label.toLowerCase())?.[0] as U | undefined;
}
