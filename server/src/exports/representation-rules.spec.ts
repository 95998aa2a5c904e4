import { MEDIA_TYPES, negotiate, readVersionAddress } from './representation-rules.js';

describe('address of a version', () => {
  it('names a version, and a form where it has an extension', () => {
    expect(readVersionAddress('2.1')).toEqual({ number: '2.1', format: null });
    expect(readVersionAddress('12.0.PDF')).toEqual({ number: '12.0', format: 'PDF' });
    expect(readVersionAddress('2.1.xml')).toEqual({ number: '2.1', format: 'UNKNOWN' });
  });

  it('is nothing else', () => {
    for (const other of ['', 'latest', '2', '2.', '2.1.', 'v2.1', '2.1.json.exe', '-1.0']) {
      expect(readVersionAddress(other)).toBeNull();
    }
  });
});

describe('choosing a form by Accept (RFC 9110, 12.5.1)', () => {
  const offered = ['JSON', 'PAGE', 'CSV', 'PDF'] as const;
  const chosen = (accept: string | undefined) => negotiate(accept, offered, MEDIA_TYPES);

  it('gives a browser the page', () => {
    expect(chosen('text/html,application/xhtml+xml,application/xml;q=0.9,image/webp,*/*;q=0.8')).toBe('PAGE');
  });

  it('gives a program JSON when it does not mind', () => {
    expect(chosen(undefined)).toBe('JSON');
    expect(chosen('*/*')).toBe('JSON');
    expect(chosen('application/*')).toBe('JSON');
  });

  it('follows the qualities, the most specific range first', () => {
    expect(chosen('text/csv;q=0.4, application/pdf;q=0.6')).toBe('PDF');
    expect(chosen('*/*;q=0.9, application/json;q=0.1')).toBe('PAGE');
    expect(chosen('application/json;q=0, */*')).toBe('PAGE');
  });

  it('gives nothing when nothing offered is wanted', () => {
    expect(chosen('image/png')).toBeNull();
    expect(chosen('application/json;q=0')).toBeNull();
  });
});
