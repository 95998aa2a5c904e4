import { describe, expect, it } from '@jest/globals';
import { MEASUREMENT_METHODS, methodNamed, UNKNOWN_METHOD, usualRelativeUncertainty } from './measurement-methods.js';

describe('methodNamed', () => {
  it.each([
    ['evaporation tube (Arnold cell)', 'EVAPORATION_TUBE'],
    ['Evaporation tube, level readings', 'EVAPORATION_TUBE'],
    ['Stefan tube', 'EVAPORATION_TUBE'],
    ['unsteady-state evaporation', 'UNSTEADY_EVAPORATION'],
    ['Two-bulb cell', 'TWO_BULB_CELL'],
    ['two‑bulb  apparatus', 'TWO_BULB_CELL'],
    ['Loschmidt tube', 'LOSCHMIDT_TUBE'],
    ['closed tube', 'CLOSED_TUBE'],
    ['point-source', 'POINT_SOURCE'],
    ['peak broadening, chromatographic', 'PEAK_BROADENING'],
    ['Gas chromatography', 'PEAK_BROADENING'],
    ['holographic interferometry in a Loschmidt cell', 'INTERFEROMETRY'],
    ['dissociation', 'DISSOCIATED_GAS'],
  ])('reads %p as %p', (text, code) => {
    expect(methodNamed(text)?.code).toBe(code);
  });

  it('finds every method by its own name', () => {
    const missed = MEASUREMENT_METHODS.filter(({ name, code }) => methodNamed(name)?.code !== code);
    expect(missed).toEqual([]);
  });

  it('knows no method in text that names none', () => {
    expect(methodNamed('by a colleague')).toBeNull();
    expect(methodNamed('')).toBeNull();
  });
});

describe('usualRelativeUncertainty', () => {
  it('gives the usual uncertainty of the method with its source', () => {
    const { value, source } = usualRelativeUncertainty('Evaporation tube');
    expect(value).toBe(0.02);
    expect(source).toMatch(/^Richardson/);
  });

  it('gives 5 % for a method it does not know', () => {
    expect(usualRelativeUncertainty('by a colleague')).toEqual(UNKNOWN_METHOD);
    expect(UNKNOWN_METHOD.value).toBe(0.05);
  });

  it('names for every method a source, or says that there is none', () => {
    const silent = MEASUREMENT_METHODS.filter(
      ({ source }) => source !== 'common practice, no source' && !/\d{4}/.test(source),
    );
    expect(silent).toEqual([]);
  });

  it('stays between 0.5 % and 10 %', () => {
    const values = MEASUREMENT_METHODS.map(({ relativeUncertainty }) => relativeUncertainty);
    expect(Math.min(...values)).toBeGreaterThanOrEqual(0.005);
    expect(Math.max(...values)).toBeLessThanOrEqual(0.1);
  });
});
