import { readHeader } from './headers.js';
import type { ColumnRole } from './mapping.js';

describe('the text above a column', () => {
  it.each<[string, ColumnRole, string | null]>([
    ['T', 'TEMPERATURE', null],
    ['T / K', 'TEMPERATURE', 'K'],
    ['T/°C', 'TEMPERATURE', '°C'],
    ['T [K]', 'TEMPERATURE', 'K'],
    ['Temperature (deg C)', 'TEMPERATURE', '°C'],
    ['Temp. in °F', 'TEMPERATURE', '°F'],
    ['temperature, K', 'TEMPERATURE', 'K'],
    ['temperature_k', 'TEMPERATURE', 'K'],
    ['p', 'PRESSURE', null],
    ['P (mm Hg)', 'PRESSURE', 'mmHg'],
    ['pressure kPa', 'PRESSURE', 'kPa'],
    ['Total pressure / atm', 'PRESSURE', 'atm'],
    ['pressure_kPa', 'PRESSURE', 'kPa'],
    ['D', 'DIFFUSIVITY', null],
    ['D / cm²/s', 'DIFFUSIVITY', 'cm²/s'],
    ['D / (cm² s⁻¹)', 'DIFFUSIVITY', 'cm²/s'],
    ['D12 [m^2/s]', 'DIFFUSIVITY', 'm²/s'],
    ['D_AB (cm2/s)', 'DIFFUSIVITY', 'cm²/s'],
    ['D₁₂ / cm² s⁻¹', 'DIFFUSIVITY', 'cm²/s'],
    ['D_cm2_s', 'DIFFUSIVITY', 'cm²/s'],
    ['Diffusion coefficient (cm2/sec)', 'DIFFUSIVITY', 'cm²/s'],
    ['Binary diffusion coefficient D12 / mm² s⁻¹', 'DIFFUSIVITY', 'mm²/s'],
    ['D / (10^-5 m²/s)', 'DIFFUSIVITY', '1e-5 m²/s'],
    ['u(D) / cm²/s', 'DIFFUSIVITY_UNCERTAINTY', 'cm²/s'],
    ['u(D)/%', 'DIFFUSIVITY_UNCERTAINTY', '%'],
    ['uD (%)', 'DIFFUSIVITY_UNCERTAINTY', '%'],
    ['u_D', 'DIFFUSIVITY_UNCERTAINTY', null],
    ['ur(D)', 'DIFFUSIVITY_UNCERTAINTY', null],
    ['D error [cm2/s]', 'DIFFUSIVITY_UNCERTAINTY', 'cm²/s'],
    ['uncertainty of D (%)', 'DIFFUSIVITY_UNCERTAINTY', '%'],
    ['standard uncertainty of diffusivity / %', 'DIFFUSIVITY_UNCERTAINTY', '%'],
    ['uncertainty', 'DIFFUSIVITY_UNCERTAINTY', null],
    ['u(T) / K', 'TEMPERATURE_UNCERTAINTY', 'K'],
    ['u(T) [°C]', 'TEMPERATURE_UNCERTAINTY', '°C'],
    ['u(P) (kPa)', 'PRESSURE_UNCERTAINTY', 'kPa'],
    ['x', 'MOLE_FRACTION', null],
    ['x1', 'MOLE_FRACTION', null],
    ['mole fraction / %', 'MOLE_FRACTION', '%'],
    ['N', 'REPLICATES', null],
    ['replicates', 'REPLICATES', null],
    ['Nr.', 'ROW_NUMBER', null],
    ['No.', 'ROW_NUMBER', null],
    ['Datum', 'DATE', null],
  ])('“%s” names the column %s in %s', (header, role, unit) => {
    const read = readHeader(header, null);

    expect(read.role).toBe(role);
    expect(read.unit?.symbol ?? null).toBe(unit);
    expect(read.unknownUnit).toBeNull();
  });

  it('lets a bare ± belong to the column on its left', () => {
    expect(readHeader('±', 'TEMPERATURE').role).toBe('TEMPERATURE_UNCERTAINTY');
    expect(readHeader('+/-', 'DIFFUSIVITY').role).toBe('DIFFUSIVITY_UNCERTAINTY');
    expect(readHeader('± (%)', 'DIFFUSIVITY')).toMatchObject({
      role: 'DIFFUSIVITY_UNCERTAINTY',
      unit: { symbol: '%' },
    });
  });

  it.each([
    ['u(D)', 'STANDARD', 1],
    ['U(D)', 'EXPANDED', 2],
    ['U(D) (k=2)', 'EXPANDED', 2],
    ['U(D), k = 1.96 / cm²/s', 'EXPANDED', 1.96],
    ['expanded uncertainty of D', 'EXPANDED', 2],
  ])('tells from “%s” that the uncertainty is %s with k = %d', (header, kind, coverageFactor) => {
    expect(readHeader(header, null).uncertainty).toEqual({ kind, coverageFactor, scope: 'INDEPENDENT' });
  });

  it('keeps a unit it does not know, to be asked about', () => {
    expect(readHeader('D [furlong²/fortnight]', null)).toMatchObject({
      role: 'DIFFUSIVITY',
      unit: null,
      unknownUnit: 'furlong²/fortnight',
    });
  });

  it.each(['remark', 'ethanol', 'tube', 'colour of the flame', ''])('finds no quantity in “%s”', (header) => {
    expect(readHeader(header, null).role).toBeNull();
  });
});
