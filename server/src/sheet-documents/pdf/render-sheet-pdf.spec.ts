import { sampleSheetFacts } from '../../../test/builders/sheet-facts.js';
import { readPdf } from '../../../test/read-pdf.js';
import { buildSheetContent } from '../sheet-content.js';
import { renderSheetPdf } from './render-sheet-pdf.js';

const facts = sampleSheetFacts();
const content = buildSheetContent(facts);
const spaced = (text: string): string => text.replace(/\s+/g, ' ');

describe('PDF of a data sheet', () => {
  let bytes: Buffer;
  let pdf: ReturnType<typeof readPdf>;
  beforeAll(async () => {
    bytes = await renderSheetPdf(content);
    pdf = readPdf(bytes);
  });

  it('holds the fitted numbers with their uncertainties', () => {
    for (const printed of ['0.12455(50)', '1.788(27)', '298.15', '101.325', '−0.388'])
      expect(pdf.text).toContain(printed);
  });

  it('holds the recommended values in cm²/s', () => {
    // Evaluated by hand from D0 (T/298.15 K)^n at the ends of the range and at T0, to the place of u.
    for (const value of ['283.15', '0.11357', '0.12455', '448.15', '0.2581']) expect(pdf.text).toContain(value);
    expect(pdf.text).toContain('cm²/s');
  });

  it('sets title, author, subject and language', () => {
    expect(pdf.information.get('Title')).toBe(
      'Ethanol + nitrogen: mutual diffusivity, data sheet DS-0042, version 2.1',
    );
    expect(pdf.information.get('Author')).toBe('Diffolio');
    expect(pdf.information.get('Subject')).toContain('Mutual diffusivity of Ethanol + nitrogen');
    expect(pdf.information.get('Lang')).toBe('en');
  });

  it('embeds every font it names, Work Sans first among them', () => {
    expect(pdf.fonts.filter(({ isEmbedded }) => !isEmbedded)).toEqual([]);
    expect(pdf.fonts.some(({ name }) => name.endsWith('WorkSans-Regular'))).toBe(true);
  });

  it('draws its charts as vectors: no bitmap, and their figures as text', () => {
    expect(pdf.imageCount).toBe(0);
    expect(pdf.text).toContain('f, left out');
    expect(pdf.text).toContain('validity range');
  });

  it('finds a glyph for every character, Greek among them', () => {
    expect(pdf.text).not.toContain('\ufffd');
    expect(pdf.text).toContain('τ');
    expect(pdf.text).toContain('χ');
  });

  it('counts its pages, and names version, state and hash on each', () => {
    for (let page = 1; page <= pdf.pageCount; page += 1) expect(pdf.text).toContain(`page ${page} of ${pdf.pageCount}`);
    expect(pdf.text.split('Ethanol + nitrogen, version 2.1, released')).toHaveLength(pdf.pageCount + 1);
    expect(pdf.text.split('SHA-256 7c1e 04b9')).toHaveLength(pdf.pageCount + 1);
  });

  it('says what U is, what it leaves out, and the cautions', () => {
    const text = spaced(pdf.text);
    expect(text).toContain('expanded uncertainty');
    expect(text).toContain('a bias common to all methods used');
    expect(text).toContain('safety-critical design');
  });

  it('has no watermark once released', () => {
    expect(pdf.text.split('\n').filter((line) => line.trim() === 'released')).toHaveLength(2);
  });

  it('is the same file each time, dated by its release', async () => {
    expect(bytes.equals(await renderSheetPdf(content))).toBe(true);
    expect(pdf.information.get('CreationDate')).toContain('20261104');
  });
});

describe('PDF of a version that is not current', () => {
  const standing = { ...facts.standing, status: 'WITHDRAWN', withdrawnAt: '2026-11-30T00:00:00.000Z' } as const;
  const withdrawn = buildSheetContent({
    ...facts,
    standing: { ...standing, withdrawalReason: 'Series d was misread' },
  });

  it('carries the state behind the text of every page, and says first why it was withdrawn', async () => {
    const { text, pageCount } = readPdf(await renderSheetPdf(withdrawn, 'LETTER'));
    expect(spaced(text)).toContain('Withdrawn on 30 November 2026: Series d was misread. Do not use its numbers.');
    expect(text.split('\n').filter((line) => line.trim() === 'withdrawn').length).toBeGreaterThanOrEqual(pageCount);
  });

  it('prints words of people in other scripts, and a hollow square for what no font has', async () => {
    const words = { ...facts.words, summary: 'Проверено: Łukasz Żak,\n温度 ≤ 400 K' };
    const { text, fonts } = readPdf(await renderSheetPdf(buildSheetContent({ ...facts, words })));
    // Every change of font ends a run, so spaces say nothing here.
    expect(text.replace(/\s+/g, '')).toContain('Проверено:ŁukaszŻak,□□≤400K');
    expect(fonts.every(({ isEmbedded }) => isEmbedded)).toBe(true);
  });
});
