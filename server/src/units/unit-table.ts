import { ratioOf, type Ratio } from './exact-decimal.js';

export type UnitQuantity = 'temperature' | 'pressure' | 'diffusivity' | 'fraction';

/**
 * One unit: SI value = (value + offset) · factor, both exact.
 * Differences, uncertainties among them, take the factor alone.
 */
export interface Unit {
  readonly quantity: UnitQuantity;
  /** as it is printed */
  readonly symbol: string;
  /** UCUM code (Unified Code for Units of Measure, case sensitive); null where UCUM has none of this value */
  readonly ucum: string | null;
  readonly factor: Ratio;
  readonly offset: Ratio;
  /** how people type it, besides the symbol and the UCUM code */
  readonly aliases: readonly string[];
  /** where factor and offset come from */
  readonly source: string;
}

const SI_BROCHURE = 'SI Brochure, 9th edition (BIPM 2019)';
const SP_811 = 'NIST SP 811 (2008), appendix B.8';

const ZERO = ratioOf('0');

interface Row {
  symbol: string;
  ucum: string | null;
  factor: Ratio;
  offset?: Ratio;
  aliases?: readonly string[];
  source: string;
}

const unit =
  (quantity: UnitQuantity) =>
  ({ offset = ZERO, aliases = [], ...row }: Row): Unit => ({ quantity, offset, aliases, ...row });

const TEMPERATURES = [
  {
    symbol: 'K',
    ucum: 'K',
    factor: ratioOf('1'),
    aliases: ['kelvin', 'kelvins', 'deg K'],
    source: `${SI_BROCHURE}, table 2`,
  },
  {
    symbol: '°C',
    ucum: 'Cel',
    factor: ratioOf('1'),
    offset: ratioOf('273.15'),
    aliases: ['C', 'deg C', 'degree C', 'degrees C', 'celsius', 'deg celsius', 'degrees celsius', 'centigrade'],
    source: `${SI_BROCHURE}, section 2.3.1: t/°C = T/K − 273.15`,
  },
  {
    symbol: '°F',
    ucum: '[degF]',
    factor: ratioOf('5', '9'),
    offset: ratioOf('459.67'),
    aliases: ['F', 'deg F', 'degrees F', 'fahrenheit', 'degrees fahrenheit'],
    source: `${SP_811}: T/K = (t/°F + 459.67)/1.8`,
  },
  {
    symbol: '°R',
    ucum: '[degR]',
    factor: ratioOf('5', '9'),
    aliases: ['R', 'deg R', 'rankine', 'degrees rankine'],
    source: `${SP_811}: T/K = (T/°R)/1.8`,
  },
].map(unit('temperature'));

const PRESSURES = [
  { symbol: 'Pa', ucum: 'Pa', factor: ratioOf('1'), aliases: ['pascal', 'pascals', 'N/m2'], source: SI_BROCHURE },
  { symbol: 'hPa', ucum: 'hPa', factor: ratioOf('100'), aliases: ['hectopascal'], source: SI_BROCHURE },
  { symbol: 'kPa', ucum: 'kPa', factor: ratioOf('1000'), aliases: ['kilopascal', 'kPa abs'], source: SI_BROCHURE },
  { symbol: 'MPa', ucum: 'MPa', factor: ratioOf('1e6'), aliases: ['megapascal'], source: SI_BROCHURE },
  { symbol: 'bar', ucum: 'bar', factor: ratioOf('1e5'), aliases: ['bars', 'bara', 'bar abs'], source: SP_811 },
  { symbol: 'mbar', ucum: 'mbar', factor: ratioOf('100'), aliases: ['millibar', 'mbars', 'mb'], source: SP_811 },
  {
    symbol: 'atm',
    ucum: 'atm',
    factor: ratioOf('101325'),
    aliases: ['atmosphere', 'atmospheres', 'std atm', 'standard atmosphere'],
    source: `${SP_811}: atmosphere, standard; exact`,
  },
  {
    symbol: 'Torr',
    ucum: null,
    factor: ratioOf('101325', '760'),
    aliases: ['torr', 'torrs'],
    source: `${SP_811}: 1/760 of the standard atmosphere; exact`,
  },
  {
    // UCUM's mm[Hg] is 133.322 Pa, 3 parts in 10^6 smaller than the conventional millimetre of mercury.
    symbol: 'mmHg',
    ucum: null,
    factor: ratioOf('133.322387415'),
    aliases: ['mm Hg', 'mm of Hg', 'mm[Hg]', 'mm mercury', 'millimetre of mercury', 'millimeter of mercury'],
    source: `${SP_811}: conventional millimetre of mercury, 13.5951 g/cm³ × 9.80665 m/s² × 1 mm; exact`,
  },
  {
    symbol: 'psi',
    ucum: '[psi]',
    // pound × standard gravity / inch²
    factor: ratioOf('4.4482216152605', '0.00064516'),
    aliases: ['psia', 'lbf/in2', 'lb/in2'],
    source: `${SP_811}: 0.453 592 37 kg × 9.806 65 m/s² / (0.0254 m)²; exact`,
  },
].map(unit('pressure'));

const LENGTHS = [
  { symbol: 'm', ucum: 'm', squared: '1', aliases: ['metre', 'meter'] },
  { symbol: 'dm', ucum: 'dm', squared: '1e-2', aliases: [] },
  { symbol: 'cm', ucum: 'cm', squared: '1e-4', aliases: ['centimetre', 'centimeter'] },
  { symbol: 'mm', ucum: 'mm', squared: '1e-6', aliases: ['millimetre', 'millimeter'] },
  { symbol: 'µm', ucum: 'um', squared: '1e-12', aliases: ['um', 'μm', 'micrometre', 'micrometer'] },
  { symbol: 'ft', ucum: '[ft_i]', squared: '0.09290304', aliases: ['foot', 'feet'] },
  { symbol: 'in', ucum: '[in_i]', squared: '0.00064516', aliases: ['inch'] },
] as const;

const TIMES = [
  { symbol: 's', ucum: 's', seconds: '1', aliases: ['sec', 'second', 'seconds'] },
  { symbol: 'min', ucum: 'min', seconds: '60', aliases: ['minute', 'minutes'] },
  { symbol: 'h', ucum: 'h', seconds: '3600', aliases: ['hr', 'hour', 'hours'] },
  { symbol: 'd', ucum: 'd', seconds: '86400', aliases: ['day', 'days'] },
] as const;

/** Length squared per time, in every combination, the usual ones first. */
const DIFFUSIVITIES: readonly Unit[] = TIMES.flatMap((time) =>
  LENGTHS.map((length) =>
    unit('diffusivity')({
      symbol: `${length.symbol}²/${time.symbol}`,
      ucum: `${length.ucum}2/${time.ucum}`,
      factor: ratioOf(length.squared, time.seconds),
      source: `${SI_BROCHURE}, tables 2, 7 and 8; foot 0.3048 m and inch 0.0254 m exact (${SP_811})`,
      aliases: [length.symbol, ...length.aliases].flatMap((l) =>
        [time.symbol, ...time.aliases].map((t) => `${l}2/${t}`),
      ),
    }),
  ),
);

const FRACTIONS = [
  {
    symbol: '1',
    ucum: '1',
    factor: ratioOf('1'),
    aliases: ['mol/mol', 'mole fraction', 'fraction', 'mol frac', '-', 'none', 'dimensionless', 'relative'],
    source: `${SI_BROCHURE}, section 2.3.3`,
  },
  {
    symbol: '%',
    ucum: '%',
    factor: ratioOf('1', '100'),
    aliases: ['percent', 'per cent', 'pct', 'mol%', 'mol %', 'mol percent', 'rel %', '% rel'],
    source: `${SI_BROCHURE}, section 5.4.7`,
  },
  { symbol: '‰', ucum: '[ppth]', factor: ratioOf('1e-3'), aliases: ['permille', 'mmol/mol'], source: SI_BROCHURE },
  { symbol: 'ppm', ucum: '[ppm]', factor: ratioOf('1e-6'), aliases: ['µmol/mol', 'umol/mol'], source: SI_BROCHURE },
].map(unit('fraction'));

/** Every unit Diffolio reads and prints; the first of each quantity is its SI unit. */
export const UNITS: readonly Unit[] = [...TEMPERATURES, ...PRESSURES, ...DIFFUSIVITIES, ...FRACTIONS];
