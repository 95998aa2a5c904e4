/** Why a point or a series carries no weight: one of a fixed list, then words. */
export const reasonCodes = ['apparatus', 'conditions', 'disturbed', 'duplicate', 'transcription', 'other'] as const;
export type ReasonCode = (typeof reasonCodes)[number];

export interface Reason {
  /** Null where the reason was given without one of the list. */
  readonly code: ReasonCode | null;
  readonly words: string;
}

const isCode = (text: string): text is ReasonCode => (reasonCodes as readonly string[]).includes(text);

/** As it is kept: `apparatus: tubes 12 mm deep`. */
export const reasonText = (code: ReasonCode, words: string): string => `${code}: ${words.trim()}`;

/** A kept reason in its two parts. */
export function parseReason(text: string): Reason {
  const colon = text.indexOf(':');
  const code = text.slice(0, Math.max(0, colon)).trim().toLowerCase();
  return isCode(code) ? { code, words: text.slice(colon + 1).trim() } : { code: null, words: text.trim() };
}
