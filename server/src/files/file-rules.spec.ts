import fc from 'fast-check';
import { attachment, displayName, mediaTypeOf } from './file-rules.js';

describe('the name of a file', () => {
  it.each([
    ['runs 2019.csv', 'runs 2019.csv'],
    ['C:\\Users\\x\\runs.csv', 'runs.csv'],
    ['../../etc/passwd', 'passwd'],
    ['a\u0000b\r\nc.csv', 'abc.csv'],
    ['exe.\u202evsc', 'exe.vsc'],
    ['..', 'unnamed'],
    ['', 'unnamed'],
    ['x'.repeat(300), 'x'.repeat(200)],
  ])('%j is shown as %j', (name, shown) => {
    expect(displayName(name)).toBe(shown);
  });

  it('never leaves the header of a download', () => {
    fc.assert(
      fc.property(fc.string({ unit: 'grapheme' }).map(displayName), (name) => {
        const header = attachment(name);
        expect(header).toMatch(/^attachment; filename="[\x20-\x7e]*"; filename\*=UTF-8''[A-Za-z0-9!#$&+.^_`|~%-]*$/);
        expect(header.split('"')).toHaveLength(3);
        expect(decodeURIComponent(header.split("''")[1] ?? '')).toBe(name);
      }),
    );
  });
});

describe('the kind of a file', () => {
  it.each([
    ['UTF-8', Buffer.from('T;D\n25;0,12\n')],
    ['Latin-1', Buffer.from('T / °C;D / cm²/s\n', 'latin1')],
    ['UTF-16', Buffer.from('\ufeffT;D\n25;0,12\n', 'utf16le')],
  ])('is text for %s', (_, bytes) => {
    expect(mediaTypeOf(bytes)).toBe('text/plain');
  });

  it.each([
    ['a Windows program', Buffer.from('MZ\x90\x00\x03\x00\x00\x00', 'latin1')],
    ['an older workbook', Buffer.from('d0cf11e0a1b11ae10000', 'hex')],
    ['a compressed file', Buffer.from('1f8b08000000000000', 'hex')],
    ['a PDF', Buffer.from('%PDF-1.7\n')],
    ['an archive that is no workbook', Buffer.from('PK\x03\x04 word/document.xml')],
    ['nothing', Buffer.alloc(0)],
  ])('is not taken for %s', (_, bytes) => {
    expect(mediaTypeOf(bytes)).toBeNull();
  });
});
