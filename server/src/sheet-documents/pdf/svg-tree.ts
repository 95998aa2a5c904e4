/** An element of an SVG text. */
export interface SvgNode {
  readonly tag: string;
  readonly attributes: Readonly<Record<string, string>>;
  readonly children: SvgNode[];
  readonly text: string;
}

const TOKEN =
  /<!\[CDATA\[[\s\S]*?\]\]>|<!--[\s\S]*?-->|<\?[\s\S]*?\?>|<\/[\w:-]+\s*>|<([\w:-]+)((?:\s+[\w:-]+\s*=\s*"[^"]*")*)\s*(\/?)>|([^<]+)/g;

/**
 * Reads the SVG that ECharts writes: well-formed, attributes in double quotes, no entities but the five of XML and numbers.
 *
 * @throws {SyntaxError} when there is no element
 */
export function parseSvg(svg: string): SvgNode {
  const root = { tag: '', attributes: {}, children: [] as SvgNode[], text: '' };
  const open = [root];
  for (const [token, tag, attributes, selfClosed, text] of svg.matchAll(TOKEN)) {
    const parent = open.at(-1) ?? root;
    if (token.startsWith('</')) open.pop();
    else if (tag !== undefined) {
      const node = { tag, attributes: attributesOf(attributes ?? ''), children: [], text: '' };
      parent.children.push(node);
      if (selfClosed === '') open.push(node);
    } else if (text !== undefined) parent.text += unescaped(text);
  }
  const [first] = root.children;
  if (first === undefined) throw new SyntaxError('no element in the SVG');
  return first;
}

const attributesOf = (text: string): Record<string, string> =>
  Object.fromEntries(
    [...text.matchAll(/([\w:-]+)\s*=\s*"([^"]*)"/g)].map(([, name = '', value = '']) => [name, unescaped(value)]),
  );

const unescaped = (text: string): string =>
  text
    .replace(/&#(x?)([\da-f]+);/gi, (_, hex: string, digits: string) =>
      String.fromCodePoint(Number.parseInt(digits, hex === '' ? 10 : 16)),
    )
    .replaceAll('&lt;', '<')
    .replaceAll('&gt;', '>')
    .replaceAll('&quot;', '"')
    .replaceAll('&apos;', "'")
    .replaceAll('&amp;', '&');
