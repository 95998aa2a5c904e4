import { z } from 'zod';
import { remembered, type Remembered } from '../../lib/remembered';
import { CHOICE_IDS, DECIMALS, DELIMITERS, mappingSchema } from './answer';
import { emptyGrid, typedText } from './typed-table';

const substanceSchema = z.object({ id: z.string(), name: z.string() });
/** A substance as chosen, or only its name as far as typed; then the id is empty. */
export type SubstanceChoice = z.infer<typeof substanceSchema>;

const fileSchema = z.object({ id: z.string(), name: z.string(), size: z.number(), sha256: z.string() });
/** A file as the service keeps it. */
export type UploadedFile = z.infer<typeof fileSchema>;

export const WAYS = ['PASTE', 'UPLOAD', 'TYPE'] as const;
/** How the table comes in. */
export type Way = (typeof WAYS)[number];

const draftSchema = z.object({
  way: z.enum(WAYS),
  text: z.string(),
  file: fileSchema.nullable(),
  grid: z.object({ units: z.array(z.string()), rows: z.array(z.array(z.string())) }),
  sheet: z.string().nullable(),
  delimiter: z.enum(DELIMITERS).nullable(),
  decimal: z.enum(DECIMALS).nullable(),
  /** null: as the table itself suggests */
  mapping: mappingSchema.nullable(),
  decisions: z.record(z.string(), z.enum(CHOICE_IDS)),
  header: z.object({
    first: substanceSchema,
    second: substanceSchema,
    method: z.string(),
    dataOrigin: z.enum(['TABLE', 'GRAPH', 'SMOOTHED', 'EQUATION']),
    title: z.string(),
    source: z.string(),
    apparatus: z.string(),
    commonPercent: z.string(),
    sameDataAsId: z.string(),
  }),
  /** of an import that was begun */
  importId: z.string().nullable(),
});
/** Everything typed on the page; it survives a reload. */
export type Draft = z.infer<typeof draftSchema>;
export type HeaderValues = Draft['header'];

const nobody: SubstanceChoice = { id: '', name: '' };

export const emptyHeader: HeaderValues = {
  first: nobody,
  second: nobody,
  method: '',
  dataOrigin: 'TABLE',
  title: '',
  source: '',
  apparatus: '',
  commonPercent: '',
  sameDataAsId: '',
};

const asRead = { sheet: null, delimiter: null, decimal: null, mapping: null, decisions: {} } as const;

export const emptyDraft = (): Draft => ({
  way: 'PASTE',
  text: '',
  file: null,
  grid: draftSchema.shape.grid.parse(emptyGrid()),
  ...asRead,
  header: emptyHeader,
  importId: null,
});

const drafts = new Map<string, Remembered<Draft>>();

/** The draft of one person in this browser. */
export function draftOf(personId: string): Remembered<Draft> {
  const known = drafts.get(personId);
  if (known) return known;
  const draft = remembered(`diffolio.bring-in.${personId}`, emptyDraft, (stored) => draftSchema.safeParse(stored).data);
  drafts.set(personId, draft);
  return draft;
}

/** Names the table for the service; null while there is none. */
export function tableOf(draft: Draft): { text: string } | { fileId: string } | null {
  if (draft.way === 'UPLOAD') return draft.file === null ? null : { fileId: draft.file.id };
  const text = textOf(draft);
  return text.trim() === '' ? null : { text };
}

const textOf = ({ way, text, grid }: Draft): string => (way === 'TYPE' ? typedText(grid) : text);

/** How the text of the table is to be read; a typed one has tabs. */
export const readingOf = ({ way, sheet, delimiter, decimal }: Draft) => ({
  sheet,
  delimiter: way === 'TYPE' ? ('\t' as const) : delimiter,
  decimal,
});

/** The draft with another table or another part of it: what was corrected and decided stays where it still fits. */
export function withTable(draft: Draft, change: Partial<Pick<Draft, 'way' | 'text' | 'file' | 'grid'>>): Draft {
  const next = { ...draft, ...change };
  const isSameFile = next.way === 'UPLOAD' && draft.way === 'UPLOAD' && next.file?.id === draft.file?.id;
  if (isSameFile) return next;
  const [before, after] = [textOf(draft).split('\n'), textOf(next).split('\n')];
  if (next.way !== draft.way || next.way === 'UPLOAD' || before[0] !== after[0]) return { ...next, ...asRead };
  return { ...next, decisions: stillFitting(draft.decisions, before, after) };
}

/** Decisions about a row hold only while that row reads as it did. */
function stillFitting(
  decisions: Draft['decisions'],
  before: readonly string[],
  after: readonly string[],
): Draft['decisions'] {
  const holds = (id: string): boolean => {
    const row = Number(id.split(':')[1] ?? '');
    return row === 0 || before[row - 1] === after[row - 1];
  };
  return Object.fromEntries(Object.entries(decisions).filter(([id]) => holds(id)));
}

/** The draft with a column meant otherwise: what was decided about its cells is asked again. */
export function withMapping(draft: Draft, mapping: Draft['mapping'], changedColumn: number | null): Draft {
  const concerns = (id: string): boolean => changedColumn !== null && id.endsWith(`:${changedColumn}`);
  const decisions = Object.fromEntries(Object.entries(draft.decisions).filter(([id]) => !concerns(id)));
  return { ...draft, mapping, decisions };
}

/** The draft read in another way from the beginning. */
export const readAgain = (draft: Draft, change: Partial<Pick<Draft, 'sheet' | 'delimiter' | 'decimal'>>): Draft => ({
  ...draft,
  ...change,
  mapping: null,
  decisions: {},
});
