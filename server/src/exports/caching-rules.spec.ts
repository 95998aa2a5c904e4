import type { StandingFacts, VersionFacts } from '../sheet-documents/sheet-facts.js';
import { archivedTag, matchesTag, releasedTag, standingHeaders } from './caching-rules.js';

const hash = '7c'.repeat(32);
const standing: StandingFacts = {
  status: 'RELEASED',
  contentHash: hash,
  previousHash: null,
  supersededBy: null,
  withdrawnAt: null,
  withdrawalReason: null,
};
const version = (number: string, status: VersionFacts['status'], releasedAt: string): VersionFacts => ({
  number,
  status,
  releasedAt,
  withdrawnAt: null,
  summary: '',
  changeNote: null,
});
const versions = [version('1.0', 'RELEASED', '2026-01-02T00:00:00.000Z')];
const superseded = { ...standing, status: 'SUPERSEDED', supersededBy: '1.1' } as const;
const successor = version('1.1', 'RELEASED', '2026-11-04T10:00:00.000Z');

describe('validator of a released version', () => {
  const tag = releasedTag(standing, versions, 'JSON', 'A4');

  it('is strong: quoted, without W/', () => {
    expect(tag).toMatch(/^"[\w.-]+"$/);
  });

  it('differs by form, by paper, by standing and when another version is released', () => {
    const tags = [
      tag,
      releasedTag(standing, versions, 'CSV', 'A4'),
      releasedTag(standing, versions, 'PDF', 'A4'),
      releasedTag(standing, versions, 'PDF', 'LETTER'),
      releasedTag(superseded, versions, 'JSON', 'A4'),
      releasedTag(standing, [...versions, successor], 'JSON', 'A4'),
    ];
    expect(new Set(tags).size).toBe(tags.length);
  });

  it('is found in a list, weak or strong, and in a star', () => {
    expect(matchesTag(`"x", W/${tag}`, tag)).toBe(true);
    expect(matchesTag('*', tag)).toBe(true);
    expect(matchesTag('"x"', tag)).toBe(false);
    expect(matchesTag(archivedTag(hash, 'PDF'), archivedTag(hash, 'JSON'))).toBe(false);
  });
});

describe('headers of a version that is not current', () => {
  it('name the successor and the second of its release (RFC 9745, RFC 5829)', () => {
    expect(standingHeaders('DS-0042', superseded, [successor, ...versions])).toEqual({
      deprecation: '@1793786400',
      link: '</sheets/DS-0042/1.1>; rel="successor-version"',
    });
  });

  it('name the second of the withdrawal, and no successor where there is none', () => {
    const withdrawn = { ...standing, status: 'WITHDRAWN', withdrawnAt: '2026-11-04T10:00:00.000Z' } as const;
    expect(standingHeaders('DS-0042', withdrawn, versions)).toEqual({ deprecation: '@1793786400' });
  });

  it('are none for the current version', () => {
    expect(standingHeaders('DS-0042', standing, versions)).toEqual({});
  });
});
