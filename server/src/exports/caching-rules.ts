import type { StandingFacts, VersionFacts } from '../sheet-documents/sheet-facts.js';
import type { FileFormat } from './representation-rules.js';

/** A released version may be kept for five minutes, then its standing is asked for again. */
export const RELEASED_CACHING = 'public, max-age=300, must-revalidate';
/** Archived bytes never change. */
export const ARCHIVED_CACHING = 'public, max-age=31536000, immutable';
/** Unreleased work is for the group alone, and never kept. */
export const UNRELEASED_CACHING = 'private, no-store';

/** Strong validator (RFC 9110, 8.8.3) of an archived file; its address says all. */
export const archivedTag = (contentHash: string, format: 'JSON' | 'PDF'): string =>
  `"${contentHash}-${format.toLowerCase()}"`;

/** Strong validator of a released version in one form: differs by form, by standing, and by what the listing of versions says. */
export function releasedTag(
  standing: StandingFacts,
  versions: readonly VersionFacts[],
  format: FileFormat,
  paper: string,
): string {
  const listed = versions.map(({ number, status }) => `${number}${status.charAt(0)}`).join('');
  const variant = format === 'PDF' ? `pdf-${paper.toLowerCase()}` : format.toLowerCase();
  return `"${standing.contentHash ?? ''}-${variant}-${standing.status.toLowerCase()}-${listed}"`;
}

/** Whether one of the tags of an `If-None-Match` header is `tag`, weak ones too (RFC 9110, 13.1.2). */
export const matchesTag = (ifNoneMatch: string, tag: string): boolean =>
  ifNoneMatch.trim() === '*' || ifNoneMatch.split(',').some((entry) => entry.trim().replace(/^W\//, '') === tag);

/** Since when a version is not to be used any more; null where it may be. */
function deprecatedAt(standing: StandingFacts, versions: readonly VersionFacts[]): string | null {
  if (standing.status === 'WITHDRAWN') return standing.withdrawnAt;
  const successor = versions.find(({ number }) => number === standing.supersededBy);
  return standing.status === 'SUPERSEDED' ? (successor?.releasedAt ?? null) : null;
}

/** `Deprecation` (RFC 9745) and `Link` to the successor (RFC 5829) of a version that is not current; empty for one that is. */
export function standingHeaders(
  code: string,
  standing: StandingFacts,
  versions: readonly VersionFacts[],
): Readonly<Record<string, string>> {
  const since = deprecatedAt(standing, versions);
  return {
    ...(since === null ? {} : { deprecation: `@${Math.floor(Date.parse(since) / 1000)}` }),
    ...(standing.supersededBy === null
      ? {}
      : { link: `</sheets/${code}/${standing.supersededBy}>; rel="successor-version"` }),
  };
}
