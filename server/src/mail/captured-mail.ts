/** What a reader of captured mail sees of one message. */
export interface CapturedMail {
  readonly subject: string;
  readonly to: string;
  readonly messageId: string;
  readonly sentAt: string;
  readonly text: string;
}

interface MimePart {
  readonly headers: ReadonlyMap<string, string>;
  readonly body: string;
}

function splitPart(source: string): MimePart {
  const end = source.indexOf('\r\n\r\n');
  const head = (end < 0 ? source : source.slice(0, end)).replace(/\r\n[ \t]+/g, ' ');
  const headers = new Map<string, string>();
  for (const line of head.split('\r\n')) {
    const colon = line.indexOf(':');
    if (colon > 0) headers.set(line.slice(0, colon).trim().toLowerCase(), line.slice(colon + 1).trim());
  }
  return { headers, body: end < 0 ? '' : source.slice(end + 4) };
}

function decodeQuotedPrintable(text: string): string {
  const bytes = text
    .replace(/=\r?\n/g, '')
    .replace(/=([0-9A-F]{2})/gi, (_, hex: string) => String.fromCharCode(Number.parseInt(hex, 16)));
  return Buffer.from(bytes, 'latin1').toString('utf8');
}

/** RFC 2047 encoded words, UTF-8 only, which is all that is sent from here. */
function decodeHeader(value: string): string {
  return value
    .replace(/\?=\s+=\?/g, '?==?')
    .replace(/=\?utf-8\?([qb])\?([^?]*)\?=/gi, (_, encoding: string, word: string) =>
      encoding.toLowerCase() === 'b'
        ? Buffer.from(word, 'base64').toString('utf8')
        : decodeQuotedPrintable(word.replace(/_/g, '=20')),
    );
}

function textOf(part: MimePart): string {
  const type = part.headers.get('content-type') ?? 'text/plain';
  const boundary = /boundary="?([^";]+)"?/i.exec(type)?.[1];
  if (boundary !== undefined) {
    const parts = part.body
      .split(`--${boundary}`)
      .slice(1, -1)
      .map((source) => splitPart(source.replace(/^\r\n/, '')));
    const plain = parts.find(({ headers }) => headers.get('content-type')?.startsWith('text/plain'));
    return plain ? textOf(plain) : '';
  }
  const encoding = part.headers.get('content-transfer-encoding')?.toLowerCase();
  if (encoding === 'base64') return Buffer.from(part.body, 'base64').toString('utf8');
  if (encoding === 'quoted-printable') return decodeQuotedPrintable(part.body);
  return Buffer.from(part.body, 'latin1').toString('utf8');
}

/**
 * Reads a message that this server sent (RFC 5322 with a plain-text alternative).
 *
 * @param source the message, one character per byte
 */
export function readCapturedMail(source: string): CapturedMail {
  const message = splitPart(source);
  const header = (name: string) => decodeHeader(message.headers.get(name) ?? '');
  return {
    subject: header('subject'),
    to: header('to'),
    messageId: header('message-id'),
    sentAt: header('date'),
    text: textOf(message).replace(/\r\n/g, '\n').trim(),
  };
}
