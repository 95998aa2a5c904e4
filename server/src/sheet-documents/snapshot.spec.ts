import { createHash } from 'node:crypto';
import { sampleSheetFacts } from '../../test/builders/sheet-facts.js';
import { evaluateCorrelation } from '../numerics/fitting/evaluate-correlation.js';
import { readSnapshot, snapshotOf } from './snapshot.js';

const facts = sampleSheetFacts();
const release = {
  releasedAt: '2026-11-04T10:00:00.000Z',
  releasedBy: 'S. O.',
  doi: '10.0000/invented.ds-0042.2.1',
  previousHash: 'e'.repeat(64),
};
const { text, contentHash } = snapshotOf(facts, release);

describe('snapshot of a release', () => {
  it('is named by the SHA-256 of its bytes', () => {
    expect(contentHash).toBe(createHash('sha256').update(Buffer.from(text, 'utf8')).digest('hex'));
  });

  it('is canonical: members sorted, no white space, numbers in their shortest form (RFC 8785, sections 3.2.1 to 3.2.3)', () => {
    expect(text.startsWith('{"changeNote":')).toBe(true);
    // White space between tokens would shorten under a reparse; what stands inside strings would not.
    expect(JSON.stringify(JSON.parse(text))).toBe(text);
    expect(text).toContain('"value":0.0000124553');
    const members = Object.keys(JSON.parse(text) as object);
    expect(members).toEqual([...members].sort());
  });

  it('is the same, bit for bit, for the same facts in another order of their members', () => {
    const reordered = { ...Object.fromEntries(Object.entries(facts).reverse()) } as unknown as typeof facts;
    expect(snapshotOf(reordered, release)).toEqual({ text, contentHash });
  });

  it('changes its hash with any digit of any point', () => {
    const [first, ...others] = facts.series;
    if (first === undefined) throw new Error('the sample has series');
    const [D0 = 0, ...rest] = first.points.diffusivities;
    const changed = { ...first, points: { ...first.points, diffusivities: [D0 * (1 + 1e-15), ...rest] } };
    expect(snapshotOf({ ...facts, series: [changed, ...others] }, release).contentHash).not.toBe(contentHash);
  });

  it('names the release before it, and not itself', () => {
    const snapshot = readSnapshot(text);
    expect(snapshot.previousHash).toBe(release.previousHash);
    expect(snapshot.content.standing).toMatchObject({ status: 'RELEASED', contentHash: null });
    expect(text).not.toContain(contentHash);
  });

  it('gives back the facts that its numbers come from, to the last bit', () => {
    const snapshot = readSnapshot(text);
    expect(snapshot.series).toEqual(facts.series);
    expect(snapshot.fit).toEqual(facts.fit);
    const states = [[298.15], [101_325], { coverage: 0.95, kind: 'MEAN' }] as const;
    expect(evaluateCorrelation(snapshot.correlation, ...states)).toEqual(
      evaluateCorrelation(facts.correlation, ...states),
    );
  });

  it('does not depend on how the version stood before its release', () => {
    const versions = facts.versions.map((version) => {
      if (version.number === facts.number) return { ...version, status: 'APPROVED', releasedAt: null } as const;
      return version.status === 'SUPERSEDED' ? ({ ...version, status: 'RELEASED' } as const) : version;
    });
    const standing = { ...facts.standing, status: 'APPROVED' } as const;
    const draft = { ...facts, releasedAt: null, standing, versions };
    expect(snapshotOf(draft, release).contentHash).toBe(contentHash);
  });

  it('is refused when it is of another format, lacks a part, or has columns of unequal length', () => {
    const snapshot = JSON.parse(text) as Record<string, unknown> & { series: { points: { pressures: number[] } }[] };
    expect(() => readSnapshot(JSON.stringify({ ...snapshot, formatVersion: 2 }))).toThrow('formatVersion');
    expect(() => readSnapshot(JSON.stringify({ ...snapshot, correlation: undefined }))).toThrow('correlation');
    snapshot.series[0]?.points.pressures.pop();
    expect(() => readSnapshot(JSON.stringify(snapshot))).toThrow('equal length');
    expect(() => readSnapshot('{')).toThrow(SyntaxError);
  });

  it('refuses a number that is not finite', () => {
    const { correlation } = facts;
    const broken = { ...facts, correlation: { ...correlation, degreesOfFreedom: Number.POSITIVE_INFINITY } };
    expect(() => snapshotOf(broken, release)).toThrow('not allowed');
  });
});
