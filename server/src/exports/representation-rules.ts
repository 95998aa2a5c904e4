/** Forms in which a version can be read. PAGE is the client's page, for a browser. */
export type Format = 'PAGE' | 'JSON' | 'CSV' | 'PDF';
export type FileFormat = Exclude<Format, 'PAGE'>;

export const MEDIA_TYPES: Readonly<Record<Format, string>> = {
  PAGE: 'text/html',
  JSON: 'application/json',
  CSV: 'text/csv',
  PDF: 'application/pdf',
};

/** What an address after `/sheets/{code}/` asks for: a version by its number, in a form where an extension names one. */
export interface AskedVersion {
  readonly number: string;
  /** Null where the `Accept` header decides; UNKNOWN for an extension that is not offered */
  readonly format: FileFormat | 'UNKNOWN' | null;
}

const EXTENSIONS: Readonly<Record<string, FileFormat>> = { json: 'JSON', csv: 'CSV', pdf: 'PDF' };

/** Reads `2.1` or `2.1.pdf`; null for anything else. */
export function readVersionAddress(address: string): AskedVersion | null {
  const match = /^(\d+\.\d+)(?:\.([a-z][a-z\d]*))?$/i.exec(address);
  const [, number, extension] = match ?? [];
  if (number === undefined) return null;
  return { number, format: extension === undefined ? null : (EXTENSIONS[extension.toLowerCase()] ?? 'UNKNOWN') };
}

interface Preference {
  readonly range: string;
  readonly quality: number;
}

function preferencesOf(accept: string): Preference[] {
  return accept.split(',').flatMap((entry) => {
    const [range = '', ...parameters] = entry.split(';').map((part) => part.trim().toLowerCase());
    const quality = Number(parameters.find((parameter) => parameter.startsWith('q='))?.slice(2) ?? '1');
    return range === '' || Number.isNaN(quality) ? [] : [{ range, quality }];
  });
}

/** How much a media type is wanted (RFC 9110, 12.5.1): the most specific range that fits it decides. */
function qualityOf(mediaType: string, preferences: readonly Preference[]): number {
  const [kind = ''] = mediaType.split('/');
  for (const range of [mediaType, `${kind}/*`, '*/*']) {
    const found = preferences.find((preference) => preference.range === range);
    if (found !== undefined) return found.quality;
  }
  return 0;
}

/**
 * The first of `offered` that the `Accept` header wants most; null where it wants none. Without a header anything will do.
 */
export function negotiate<T extends string>(
  accept: string | undefined,
  offered: readonly T[],
  mediaTypes: Readonly<Record<T, string>>,
): T | null {
  const preferences = preferencesOf(accept ?? '*/*');
  let best: T | null = null;
  let most = 0;
  for (const format of offered) {
    const quality = qualityOf(mediaTypes[format], preferences);
    if (quality > most) [best, most] = [format, quality];
  }
  return best;
}
