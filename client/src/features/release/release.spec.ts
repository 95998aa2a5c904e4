import { describe, expect, it } from 'vitest';
import { changeRows, isNewEdition, largestChange } from './changes';
import { acts } from './who-did-what';

describe('what changes for readers', () => {
  const values = (D: number[]) => ({
    diffusivities: D,
    standardUncertainties: D.map((d) => 0.01 * d),
    expandedUncertainties: D.map((d) => 0.02 * d),
  });

  it('is told relative and in the older U', () => {
    const rows = changeRows([300, 400], values([1e-5, 2e-5]), values([1.01e-5, 1.95e-5]));
    expect(rows[0]?.change).toBeCloseTo(0.01, 12);
    expect(rows[0]?.inOlderU).toBeCloseTo(0.5, 12);
    expect(largestChange(rows)?.temperature).toBe(400);
  });

  it('is a new edition or a new revision by the number', () => {
    expect(isNewEdition('3.0', '2.1')).toBe(true);
    expect(isNewEdition('2.2', '2.1')).toBe(false);
  });
});

describe('who did what', () => {
  const event = (action: string, name: string, at: string) => ({
    action,
    status: 'DRAFT' as const,
    remark: null,
    at,
    person: { id: name, name },
  });
  const version = {
    preparedBy: { id: 'Ada', name: 'Ada' },
    events: [
      event('draft', 'Ada', '1'),
      event('change', 'Ada', '2'),
      event('change', 'Ada', '3'),
      event('submit', 'Ada', '4'),
      event('approve', 'Ben', '5'),
    ],
  };

  it('tells changes in a row once, and ends with the reader who is about to release', () => {
    const told = acts(version, { id: 'Cleo', name: 'Cleo' });
    expect(told.map(({ act, at }) => [act, at])).toEqual([
      ['drafted', '1'],
      ['changed', '3'],
      ['submitted for review', '4'],
      ['approved', '5'],
      ['releases', null],
    ]);
    expect(told[3]?.check).not.toBeNull();
    expect(told[4]?.check).not.toBeNull();
  });

  it('ticks no release by the one who prepared the version', () => {
    expect(acts(version, { id: 'Ada', name: 'Ada' }).at(-1)?.check).toBeNull();
  });
});
