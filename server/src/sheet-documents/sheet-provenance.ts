import { formatDate, formatExtent, formatShort } from './format-quantity.js';
import type { SheetContent } from './sheet-content.types.js';
import type { FitFacts, SheetFacts, StandingFacts, VersionFacts, VersionStatusName } from './sheet-facts.js';
import type {
  MarginEntry,
  SheetCitation,
  SheetMargin,
  SheetStanding,
  SheetVersionRow,
} from './sheet-provenance.types.js';
import { sheetStrings } from './sheet-strings.js';
import { plain, plainText, typeset } from './typeset.js';
import type { TextRun } from './typeset.types.js';

const RELEASED: ReadonlySet<VersionStatusName> = new Set(['RELEASED', 'SUPERSEDED', 'WITHDRAWN']);

/** How a version stands, in words. */
export function sheetStanding(standing: StandingFacts): SheetStanding {
  const word = sheetStrings.states[standing.status];
  return {
    ...standing,
    word,
    banner: bannerOf(standing, word),
    watermark: RELEASED.has(standing.status) && standing.status !== 'WITHDRAWN' ? null : word,
  };
}

function bannerOf(standing: StandingFacts, word: string): string | null {
  const { banners } = sheetStrings;
  switch (standing.status) {
    case 'RELEASED':
      return null;
    case 'SUPERSEDED':
      return banners.superseded.replace('{number}', standing.supersededBy ?? '');
    case 'WITHDRAWN':
      return banners.withdrawn
        .replace('{date}', standing.withdrawnAt === null ? '' : formatDate(standing.withdrawnAt))
        .replace('{reason}', () => asSentence(standing.withdrawalReason ?? ''));
    case 'DRAFT':
    case 'IN_REVIEW':
    case 'RETURNED':
    case 'APPROVED':
      return banners.unreleased.replace('{state}', word);
  }
}

const asSentence = (text: string): string => (/[.!?]$/.test(text) ? text : `${text}.`);

/** Content of a released version with the way it stands today; nothing that was released changes. */
export function withStanding(
  content: SheetContent,
  standing: StandingFacts,
  versions: readonly VersionFacts[],
): SheetContent {
  return { ...content, standing: sheetStanding(standing), versions: versionRows(versions, content.number) };
}

export function versionRows(versions: readonly VersionFacts[], thisNumber: string): SheetVersionRow[] {
  return versions.map((version) => {
    const date = version.withdrawnAt ?? version.releasedAt;
    return {
      number: version.number,
      status: version.status,
      word: sheetStrings.states[version.status],
      date,
      datePrinted: date === null ? '' : formatDate(date),
      change: version.changeNote ?? version.summary,
      isThis: version.number === thisNumber,
    };
  });
}

const joined = (names: readonly string[]): string =>
  names.length < 2 ? (names[0] ?? '') : names.slice(0, -1).join(', ') + sheetStrings.and + (names.at(-1) ?? '');

/** How to cite the version; what is not released says that it is not to be cited. */
export function sheetCitation(facts: SheetFacts, title: string): SheetCitation {
  const { people, releasedAt, doi } = facts;
  const prepared = sheetStrings.citationPrepared.replace('{preparedBy}', () => people.preparedBy);
  const reviewed =
    people.reviewedBy.length === 0
      ? ''
      : sheetStrings.citationReviewed.replace('{reviewedBy}', () => joined(people.reviewedBy));
  const runs = typeset(sheetStrings.citation, {
    publisher: sheetStrings.publisher,
    year: String(new Date(releasedAt ?? facts.fit.createdAt).getUTCFullYear()),
    title: [{ text: sheetStrings.citedTitle.replace('{title}', () => title), style: 'QUANTITY' }],
    code: facts.code,
    number: facts.number,
    people: asSentence(`${prepared}${reviewed}`),
    doi: releasedAt === null ? sheetStrings.citationUnreleased : doi === null ? '' : ` doi:${doi}`,
  });
  return { runs, plain: plainText(runs), doi: releasedAt === null ? null : doi };
}

/** What stands beside the sections. */
export function sheetMargin(facts: SheetFacts, drawnPoints: number): SheetMargin {
  return {
    fitNumber: String(facts.fit.number),
    entries: marginEntries(facts),
    fit: [
      fitSentence(facts.fit),
      ...residualSentence(facts.fit),
      typeset(sheetStrings.margin.engine, { engine: facts.fit.engineVersion }),
    ],
    figures: [typeset(sheetStrings.margin.allPoints, { count: String(drawnPoints) })],
    series: [typeset(sheetStrings.margin.offsets)],
  };
}

function marginEntries(facts: SheetFacts): MarginEntry[] {
  const { margin, pressureBasis } = sheetStrings;
  const { validity } = facts.correlation;
  const { preparedBy, reviewedBy, releasedBy } = facts.people;
  const version =
    facts.replaces === null
      ? facts.number
      : margin.replaces.replace('{number}', facts.number).replace('{earlier}', facts.replaces);
  const entries: readonly (readonly [string, string | null])[] = [
    [margin.version, version],
    [margin.temperature, formatExtent('temperature', validity.temperatureMinimum, validity.temperatureMaximum)],
    [
      margin.pressure,
      `${formatExtent('pressure', validity.pressureMinimum, validity.pressureMaximum)}, ${pressureBasis[validity.pressureBasis]}`,
    ],
    [margin.released, facts.releasedAt === null ? null : formatDate(facts.releasedAt)],
    [margin.prepared, preparedBy],
    [margin.reviewed, reviewedBy.length === 0 ? null : joined(reviewedBy)],
    [margin.releasedBy, releasedBy],
  ];
  return entries.flatMap(([label, value]) => (value === null ? [] : [{ label: typeset(label), value }]));
}

function fitSentence(fit: FitFacts): TextRun[] {
  const { objective, loss, weighting, seriesEffect } = fit.recipe;
  return typeset(sheetStrings.margin.fit, {
    number: String(fit.number),
    date: formatDate(fit.createdAt),
    objective: typeset(sheetStrings.objectives[objective][loss]),
    weighting: typeset(sheetStrings.weightings[weighting]),
    effect: plain(sheetStrings.effects[seriesEffect]),
  });
}

function residualSentence(fit: FitFacts): TextRun[][] {
  const { reducedChiSquare, residualDegreesOfFreedom } = fit.statistics;
  if (reducedChiSquare === null) return [];
  const values = { value: formatShort(reducedChiSquare, 3), degrees: formatShort(residualDegreesOfFreedom, 3) };
  return [typeset(sheetStrings.margin.residual, values)];
}
