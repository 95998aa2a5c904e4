/** What a letter says, by its kind. Values are plain text; `renderLetter` escapes them where it must. */
export interface Letters {
  invitation: { link: string; roles: string; until: string };
  passwordReset: { link: string; minutes: string };
  /** `changes` is the editor's note; empty for a first version. */
  releaseNotice: { sheet: string; pair: string; number: string; earlier: string; changes: string; link: string };
  withdrawalNotice: { sheet: string; pair: string; number: string; reason: string; link: string };
  seriesReturned: { series: string; remark: string; by: string; link: string };
}
export type LetterKind = keyof Letters;

/** One letter to one address. */
export type Letter = { [Kind in LetterKind]: { to: string; template: Kind; values: Letters[Kind] } }[LetterKind];

interface Draft {
  readonly subject: string;
  readonly paragraphs: readonly string[];
  /** The one thing to do, as words and address. */
  readonly action: { readonly words: string; readonly link: string };
  readonly closing: string;
}

const DRAFTS: { [Kind in LetterKind]: (values: Letters[Kind]) => Draft } = {
  invitation: ({ link, roles, until }) => ({
    subject: 'Your invitation to Diffolio',
    paragraphs: [`You are invited to Diffolio as ${roles}.`, `The link holds until ${until} and works once.`],
    action: { words: 'Accept the invitation', link },
    closing: 'If you did not expect this letter, ignore it; no account is made without you.',
  }),
  passwordReset: ({ link, minutes }) => ({
    subject: 'A new password for Diffolio',
    paragraphs: [
      `Somebody, presumably you, asked for a new password. The link holds for ${minutes} minutes and works once.`,
    ],
    action: { words: 'Choose a new password', link },
    closing: 'If it was not you, ignore this letter; the old password stays.',
  }),
  releaseNotice: ({ sheet, pair, number, earlier, changes, link }) => ({
    subject: `${sheet}, ${pair}: version ${number} is released`,
    paragraphs: [
      `Version ${number} of data sheet ${sheet}, ${pair}, is released.`,
      ...(earlier ? [`It supersedes version ${earlier}, which stays readable at its own address.`] : []),
      ...(changes ? [`What changed: ${changes}`] : []),
    ],
    action: { words: 'Read the sheet', link },
    closing: 'You get this letter because you follow the sheet; the page of the sheet ends that.',
  }),
  withdrawalNotice: ({ sheet, pair, number, reason, link }) => ({
    subject: `${sheet}, ${pair}: version ${number} is withdrawn`,
    paragraphs: [
      `Version ${number} of data sheet ${sheet}, ${pair}, is withdrawn. Do not use its values any longer.`,
      `The reason: ${reason}`,
    ],
    action: { words: 'Read the sheet', link },
    closing: 'You get this letter because you follow the sheet; the page of the sheet ends that.',
  }),
  seriesReturned: ({ series, remark, by, link }) => ({
    subject: `Returned to you: ${series}`,
    paragraphs: [`${by} returned the series “${series}” with this remark:`, remark],
    action: { words: 'Open the series', link },
    closing: 'An edit makes it a draft again; then it can be submitted anew.',
  }),
};

export interface RenderedLetter {
  readonly to: string;
  readonly subject: string;
  readonly text: string;
  readonly html: string;
}

const ESCAPES: Record<string, string> = { '&': '&amp;', '<': '&lt;', '>': '&gt;', '"': '&quot;', "'": '&#39;' };

function escapeHtml(text: string): string {
  return text.replace(/[&<>"']/g, (character) => ESCAPES[character] ?? character);
}

/** Control characters, line breaks and their Unicode kin among them. */
const CONTROL = /[\p{Cc}\p{Zl}\p{Zp}]+/gu;
const ADDRESS = /^[^\s@<>(),;:"\\[\]]{1,64}@[^\s@<>(),;:"\\[\]]{1,255}$/u;

/** Whether a letter can go to this address: one address, nothing that could begin a header of its own. */
export function isAddress(text: string): boolean {
  return ADDRESS.test(text) && text.match(CONTROL) === null;
}

/**
 * The letter as plain text and as HTML.
 *
 * @throws {RangeError} for an address that is none; a subject is put on one line instead, since it may quote a title
 */
export function renderLetter(letter: Letter): RenderedLetter {
  if (!isAddress(letter.to)) throw new RangeError('A letter needs one address.');
  // The kind chooses the draft, so that the values fit it; TypeScript does not follow the pairing through the lookup.
  const { subject, paragraphs, action, closing } = (DRAFTS[letter.template] as (values: Letter['values']) => Draft)(
    letter.values,
  );
  const html = [
    ...paragraphs.map((paragraph) => `<p>${escapeHtml(paragraph)}</p>`),
    `<p><a href="${escapeHtml(action.link)}">${escapeHtml(action.words)}</a></p>`,
    `<p>${escapeHtml(closing)}</p>`,
  ].join('\n');
  return {
    to: letter.to,
    subject: subject.replace(CONTROL, ' ').trim(),
    text: [...paragraphs, `${action.words}:\n${action.link}`, closing, ''].join('\n\n'),
    html: `<!doctype html>\n<html lang="en"><body>\n${html}\n</body></html>\n`,
  };
}
