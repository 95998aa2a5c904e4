import { canonicalJson, sha256Of } from './canonical-json.js';
import { buildSheetContent } from './sheet-content.js';
import type { SheetFacts, VersionFacts } from './sheet-facts.js';
import { SNAPSHOT_FORMAT, type Snapshot, snapshotSchema } from './snapshot.schema.js';

/** What only the act of release knows. */
export interface ReleaseFacts {
  /** ISO 8601 */
  readonly releasedAt: string;
  readonly releasedBy: string;
  readonly doi: string;
  /** Hash of the release before this one in the whole service; null for the first */
  readonly previousHash: string | null;
}

/**
 * The frozen text of a release: canonical JSON (RFC 8785), whose SHA-256 is its name.
 *
 * @returns the text, and the lower-case hex SHA-256 of its UTF-8 bytes
 * @throws {Error} when a number is not finite
 */
export function snapshotOf(facts: SheetFacts, release: ReleaseFacts): { text: string; contentHash: string } {
  const { releasedAt, releasedBy, doi, previousHash } = release;
  const people = { ...facts.people, releasedBy };
  const standing = {
    status: 'RELEASED',
    contentHash: null,
    previousHash,
    supersededBy: null,
    withdrawnAt: null,
    withdrawalReason: null,
  } as const;
  const { correlation, fit, series } = facts;
  const text = canonicalJson({
    ...SNAPSHOT_FORMAT,
    sheet: facts.code,
    number: facts.number,
    releasedAt,
    doi,
    previousHash,
    people,
    changeNote: facts.words.changeNote,
    correlation,
    fit,
    series,
    content: buildSheetContent({
      ...facts,
      people,
      releasedAt,
      doi,
      standing,
      versions: facts.versions.map((version) => onRelease(version, facts.number, releasedAt)),
    }),
  });
  return { text, contentHash: sha256Of(text) };
}

/** How a version of the sheet stands once version `number` is released. */
function onRelease(version: VersionFacts, number: string, releasedAt: string): VersionFacts {
  if (version.number === number) return { ...version, status: 'RELEASED', releasedAt };
  return version.status === 'RELEASED' ? { ...version, status: 'SUPERSEDED' } : version;
}

/**
 * Reads the frozen text of a release.
 *
 * @throws {ZodError} when it is no snapshot of a format known here
 */
export const readSnapshot = (text: string): Snapshot => snapshotSchema.parse(JSON.parse(text));
