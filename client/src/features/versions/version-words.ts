import { z } from 'zod';
import { type EditedVersionFragment, type UpdateDraftInput, type VersionStatus } from '../../gql/graphql';
import { formatShort } from '../../lib/format-quantity';
import { parseNumber } from '../../lib/parse-number';
import { versionStrings } from '../../strings/versions';

const draft = versionStrings.draft;
const edit = versionStrings.edit;

interface Numbered {
  readonly number: string;
  readonly status: VersionStatus;
}

const OPEN: readonly VersionStatus[] = ['DRAFT', 'IN_REVIEW', 'RETURNED', 'APPROVED'];
export const openVersions = <V extends Numbered>(versions: readonly V[]): V[] =>
  versions.filter(({ status }) => OPEN.includes(status));

/** The newest version that was ever released, or null: from the second version on, what changed must be said. */
export const wasReleased = (versions: readonly Numbered[]): string | null =>
  versions.find(({ status }) => !OPEN.includes(status))?.number ?? null;

const summary = z.string().trim().min(1, draft.needsSummary);
const changeNote = (isFirst: boolean) =>
  isFirst ? z.string().trim() : z.string().trim().min(1, draft.needsChangeNote);

export const wordsSchema = (isFirst: boolean) => z.object({ summary, changeNote: changeNote(isFirst) });

/** Sections of a sheet that may carry words of the editor. */
export const sections = [
  'correlation',
  'figures',
  'recommended',
  'series',
  'estimates',
  'uncertainty',
  'cautions',
  'citation',
  'versions',
] as const;
export type SectionId = (typeof sections)[number];
export const isSection = (id: string): id is SectionId => (sections as readonly string[]).includes(id);

const isPressure = (text: string): boolean => (parseNumber(text) ?? 0) > 0;

/** All words of a version. The range in P is typed in kPa, and only read where `states` says so. */
export const editSchema = (isFirst: boolean) =>
  z
    .object({
      summary,
      changeNote: changeNote(isFirst),
      remarks: z.record(z.enum(sections), z.string()),
      range: z.object({ states: z.boolean(), minimum: z.string(), maximum: z.string(), reason: z.string() }),
    })
    .superRefine(({ range }, context) => {
      if (!range.states) return;
      const refuse = (field: 'minimum' | 'maximum' | 'reason', message: string) =>
        context.addIssue({ code: 'custom', path: ['range', field], message });
      if (!isPressure(range.minimum)) refuse('minimum', edit.badPressure);
      if (!isPressure(range.maximum)) refuse('maximum', edit.badPressure);
      else if ((parseNumber(range.maximum) ?? 0) <= (parseNumber(range.minimum) ?? 0)) refuse('maximum', edit.badOrder);
      if (range.reason.trim() === '') refuse('reason', edit.needsReason);
    });
export type VersionFields = z.infer<ReturnType<typeof editSchema>>;

const plain = (pascal: number): string => formatShort(pascal / 1000, 8).replaceAll('\u2009', '');

/** The words of a version as they stand in the form. */
export function versionFields(version: EditedVersionFragment): VersionFields {
  const own = new Map(version.remarks.map(({ section, text }) => [section, text]));
  const remarks = Object.fromEntries(
    sections.map((section) => [section, own.get(section) ?? '']),
  ) as VersionFields['remarks'];
  return { summary: version.summary, changeNote: version.changeNote ?? '', remarks, range: rangeFields(version) };
}

/**
 * The stated range in P. Its reason stands behind the editor's own words for the correlation, so it is what is left of the
 * sheet's words there when those are taken away.
 */
function rangeFields(version: EditedVersionFragment): VersionFields['range'] {
  const { validity } = version.correlation;
  const fitted = version.fit.correlation.validity;
  const shown = { minimum: plain(validity.pressureMinimum), maximum: plain(validity.pressureMaximum) };
  const own = version.remarks.find(({ section }) => section === 'correlation')?.text ?? '';
  const whole = version.content.remarks.find(({ section }) => section === 'correlation')?.text ?? '';
  const reason = whole.startsWith(own) ? whole.slice(own.length).trim() : '';
  const differs =
    validity.pressureMinimum !== fitted.pressureMinimum ||
    validity.pressureMaximum !== fitted.pressureMaximum ||
    validity.pressureBasis !== fitted.pressureBasis;
  return { ...shown, states: differs || reason !== '', reason };
}

/** The words as the service takes them, whole; pressures in Pa. */
export function draftInput(
  version: { readonly id: string; readonly lockVersion: number },
  fields: VersionFields,
): UpdateDraftInput {
  const { range } = fields;
  return {
    versionId: version.id,
    lockVersion: version.lockVersion,
    summary: fields.summary.trim(),
    changeNote: fields.changeNote.trim() || null,
    remarks: sections.flatMap((section) => {
      const text = fields.remarks[section].trim();
      return text === '' ? [] : [{ section, text }];
    }),
    pressureRange: range.states
      ? { minimum: pascal(range.minimum), maximum: pascal(range.maximum), reason: range.reason.trim() }
      : null,
  };
}

const pascal = (kilopascal: string): number => Number((1000 * (parseNumber(kilopascal) ?? NaN)).toPrecision(14));
