import type { EvaluationRequest } from '../fits/correlation-evaluation.js';
import { encodeEvaluation } from './evaluation-encoding.js';

const request: EvaluationRequest = {
  temperatures: Float64Array.of(298.15, 400),
  pressures: Float64Array.of(101_325),
  coverage: 0.95,
  kind: 'MEAN',
  outsideRange: 'FLAG',
};
const evaluation = {
  diffusivities: Float64Array.of(1.24553e-5, 2.1e-5),
  standardUncertainties: Float64Array.of(5e-8, 0.1 + 0.2),
  expandedUncertainties: Float64Array.of(1e-7, 2e-7),
  coverageFactor: 2.57,
  outside: [1],
};
const version = { sheet: 'DS-0042', number: '2.1', status: 'RELEASED', contentHash: null };

describe('values on their way out', () => {
  it('keep every digit in JSON, beside the version that gave them', () => {
    const read: unknown = JSON.parse(encodeEvaluation('JSON', version, request, evaluation));
    expect(read).toEqual({
      ...version,
      diffusivities: [1.24553e-5, 2.1e-5],
      standardUncertainties: [5e-8, 0.30000000000000004],
      expandedUncertainties: [1e-7, 2e-7],
      coverageFactor: 2.57,
      outside: [1],
    });
  });

  it('stand in CSV with their state, one pressure serving all', () => {
    const [, first, second, end] = encodeEvaluation('CSV', version, request, evaluation).split('\r\n');
    expect(first).toBe('298.15,101325,0.0000124553,5e-8,1e-7,false');
    expect(second).toBe('400,101325,0.000021,0.30000000000000004,2e-7,true');
    expect(end).toBe('');
  });

  it('are a state on each line of JSON lines', () => {
    const lines = encodeEvaluation('NDJSON', version, request, evaluation).split('\n');
    expect(lines).toHaveLength(3);
    expect(JSON.parse(lines[1] ?? '')).toMatchObject({ temperature: 400, pressure: 101_325, isOutsideRange: true });
  });
});
