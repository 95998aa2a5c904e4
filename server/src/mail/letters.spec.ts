import { isAddress, type Letter, renderLetter } from './letters.js';

const NOTICE = (changes: string, earlier = '1.0'): Letter => ({
  to: 'modeller@group.example',
  template: 'releaseNotice',
  values: {
    sheet: 'DS-0042',
    pair: 'helium + argon',
    number: '1.1',
    earlier,
    changes,
    link: 'https://sheets.example/sheets/DS-0042/1.1?a=1&b="2"',
  },
});

describe('a letter', () => {
  it('says the same in plain text and in HTML', () => {
    const letter = renderLetter(NOTICE('U is smaller above 400 K.'));

    expect(letter.subject).toBe('DS-0042, helium + argon: version 1.1 is released');
    for (const body of [letter.text, letter.html]) {
      expect(body).toContain('Version 1.1 of data sheet DS-0042, helium + argon, is released.');
      expect(body).toContain('It supersedes version 1.0');
      expect(body).toContain('What changed: U is smaller above 400 K.');
      expect(body).toContain('the page of the sheet ends that');
    }
    expect(letter.text).toContain('https://sheets.example/sheets/DS-0042/1.1?a=1&b="2"');
    expect(letter.html).toContain('href="https://sheets.example/sheets/DS-0042/1.1?a=1&amp;b=&quot;2&quot;"');
  });

  it('leaves out what a first version has not', () => {
    const { text } = renderLetter(NOTICE('', ''));
    expect(text).not.toMatch(/supersedes|changed/);
  });

  it('shows markup as it was written', () => {
    const { text, html } = renderLetter(NOTICE(`<img src=x onerror="alert('D')"> & more`));
    expect(text).toContain(`<img src=x onerror="alert('D')"> & more`);
    expect(html).not.toContain('<img');
    expect(html).toContain('&lt;img src=x onerror=&quot;alert(&#39;D&#39;)&quot;&gt; &amp; more');
  });

  it('has a subject of one line', () => {
    const letter = NOTICE('');
    const values = { ...letter.values, pair: 'helium\r\nBcc: all@elsewhere.example\u2028+ argon\u0000' };
    expect(renderLetter({ ...letter, values } as Letter).subject).toBe(
      'DS-0042, helium Bcc: all@elsewhere.example + argon : version 1.1 is released',
    );
  });
});

describe('an address', () => {
  it.each(['editor@group.example', 'first.last+tag@sub.group.example', "o'hara@group.example", 'größe@gruppe.example'])(
    'may be %s',
    (address) => {
      expect(isAddress(address)).toBe(true);
    },
  );

  it.each([
    'editor',
    '@group.example',
    'editor@',
    'two@at@group.example',
    'a@group.example,b@group.example',
    'Editor <editor@group.example>',
    'editor@group.example\nBcc: x@group.example',
    'editor@group.example\u2028',
    'edi tor@group.example',
    `${'e'.repeat(65)}@group.example`,
  ])('is not %j', (address) => {
    expect(isAddress(address)).toBe(false);
  });
});
