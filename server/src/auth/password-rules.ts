import { COMMON_PASSWORD_WORDS } from './common-password-words.js';

/**
 * Length is what makes a password strong; any character counts and none is required, nothing is cut off or folded.
 * OWASP ASVS 5.0.0, 6.2.1 and 6.2.4 to 6.2.9: 8 at least, 15 recommended, 64 at least permitted.
 */
export const SHORTEST_PASSWORD = 12;
export const LONGEST_PASSWORD = 256;

/** Letters that are commonly written as digits or signs (common practice, no source). */
const LOOK_ALIKES: Record<string, string> = {
  '0': 'o',
  '1': 'i',
  '!': 'i',
  '3': 'e',
  '4': 'a',
  '@': 'a',
  '5': 's',
  $: 's',
  '7': 't',
  '8': 'b',
  '9': 'g',
};

/** Runs of neighbouring keys and of the alphabet; passwords made of pieces of them are guessed first. */
const RUNS = [
  'abcdefghijklmnopqrstuvwxyz',
  '01234567890',
  'qwertyuiop',
  'asdfghjkl',
  'zxcvbnm',
  'qazwsxedcrfvtgbyhnujmikolp',
];
const SHORTEST_RUN = 3;

/** What is left of a password once common words, runs and repetition are taken out must still be this long. */
const SHORTEST_REMAINDER = 6;
const SHORTEST_WORD = 4;

function plain(text: string): string {
  return [...text.toLowerCase()].map((character) => LOOK_ALIKES[character] ?? character).join('');
}

function withoutRuns(text: string): string {
  let rest = '';
  let at = 0;
  while (at < text.length) {
    const length = runAt(text, at);
    if (length >= SHORTEST_RUN) at += length;
    else {
      rest += text.charAt(at);
      at += 1;
    }
  }
  return rest;
}

/** Length of the longest piece of a run, forwards or backwards, that begins at `at`. */
function runAt(text: string, at: number): number {
  let longest = 0;
  for (const run of [...RUNS, ...RUNS.map((forwards) => [...forwards].reverse().join(''))]) {
    let length = 1;
    while (at + length < text.length && run.includes(text.slice(at, at + length + 1))) length += 1;
    longest = Math.max(longest, length);
  }
  return longest;
}

/** `abcabcabc` and `aaaaaa` count once. */
function withoutRepetition(text: string): string {
  return text.replace(/(.{1,16}?)\1+/gu, '$1');
}

/**
 * Why a new password is refused, or null when it is good enough.
 *
 * @param context words that whoever guesses tries first: name and address of the person, name of the service
 */
export function passwordRefusal(password: string, context: readonly string[]): string | null {
  const length = [...password].length;
  if (length < SHORTEST_PASSWORD) return `A password has at least ${SHORTEST_PASSWORD} characters.`;
  if (length > LONGEST_PASSWORD) return `A password has at most ${LONGEST_PASSWORD} characters.`;
  const known = [...COMMON_PASSWORD_WORDS, ...context.flatMap((words) => words.split(/[\s@._+-]+/))]
    .map(plain)
    .filter((word) => word.length >= SHORTEST_WORD)
    .sort((a, b) => b.length - a.length);
  // Runs are taken out of the digits as typed and of what they stand for.
  const readings = [plain(password), plain(withoutRuns(password.toLowerCase()))];
  const remainders = readings.map((reading) =>
    withoutRepetition(withoutRuns(known.reduce((rest, word) => rest.replaceAll(word, ''), reading))),
  );
  const weak = remainders.some((rest) => rest.length < SHORTEST_REMAINDER);
  return weak ? 'This password is made of words or patterns that are guessed first. Choose another one.' : null;
}
