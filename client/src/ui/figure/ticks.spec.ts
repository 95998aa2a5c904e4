import { describe, expect, it } from 'vitest';
import { logTicks, readerTicks, roundTicks } from './ticks';

describe('figures of an axis', () => {
  it('are round and within the axis', () => {
    expect(roundTicks(276, 460, 9)).toEqual([300, 325, 350, 375, 400, 425, 450]);
    expect(roundTicks(-6, 9.5, 5)).toEqual([-5, 0, 5]);
  });

  it('follow preferred numbers on a logarithmic axis', () => {
    expect(logTicks(0.105, 0.28, 6)).toEqual([0.12, 0.15, 0.2, 0.25]);
  });

  it('are round in the unit of the reader', () => {
    const celsius = readerTicks('temperature', { min: 276, max: 460, logarithmic: true }, 'degC', 5).map((kelvin) =>
      Number((kelvin - 273.15).toFixed(6)),
    );
    expect(celsius).toEqual([50, 100, 150]);
  });

  it('never exceed what the width allows', () => {
    for (const most of [2, 3, 5, 8]) expect(roundTicks(250, 1100, most).length).toBeLessThanOrEqual(most);
  });
});
