import { sampleCorrelation, sampleSheetFacts } from '../../test/builders/sheet-facts.js';
import { documentSubject, documentTitle } from './document-names.js';
import { buildSheetContent } from './sheet-content.js';
import { withStanding } from './sheet-provenance.js';
import { singleMethodStretches } from './sheet-uncertainty.js';
import { plainText } from './typeset.js';

const facts = sampleSheetFacts();
const content = buildSheetContent(facts);
const texts = (paragraphs: readonly (typeof content.lead)[]): string => paragraphs.map(plainText).join('\n');

describe('content of a data sheet', () => {
  it('survives JSON and is the same for the same facts', () => {
    expect(JSON.parse(JSON.stringify(content))).toEqual(content);
    expect(JSON.stringify(buildSheetContent(sampleSheetFacts()))).toBe(JSON.stringify(content));
  });

  it('says in its first sentence what was fitted, and where it holds in T and P', () => {
    expect(plainText(content.lead).replaceAll('\u00a0', ' ')).toBe(
      'Mutual diffusivity of the dilute gas pair, D(T, P), from 283.15 K to 448.15 K and 1 kPa to 400 kPa, ' +
        'fitted to 38 points in six series by four methods of measurement.',
    );
  });

  it('prints fitted parameters concisely, and the reference state as exact', () => {
    const printed = content.correlation.parameters.map(({ symbol, printed: text, note }) => [symbol, text, note]);
    expect(printed).toEqual([
      ['D0', '0.12455(50)\u00a0cm²/s', null],
      ['n', '1.788(27)', null],
      ['T0', '298.15\u00a0K', 'exact'],
      ['P0', '101.325\u00a0kPa', 'exact'],
      ['tau', '0.78\u00a0%', 'between series'],
      ['tau_n', '0.022', 'of the exponent'],
    ]);
    expect(content.correlation.coefficients.map(({ printed: text }) => text)).toEqual(['−0.388']);
  });

  it('recommends D0 with its own uncertainty at the reference state', () => {
    const { recommended } = content;
    const row = recommended.referenceRow ?? -1;
    expect(recommended.temperatures[row]).toBe(298.15);
    expect(recommended.diffusivities[row]).toBeCloseTo(1.24553e-5, 15);
    expect(recommended.standardUncertainties[row]).toBeCloseTo(5e-8, 15);
    // k of Student's t for ν = 5 at 95 %: GUM, JCGM 100:2008, table G.2 gives 2.57.
    expect(content.correlation.coverageFactor).toBeCloseTo(2.57, 2);
    expect(recommended.expandedUncertainties[row]).toBeCloseTo(5e-8 * content.correlation.coverageFactor, 15);
  });

  it('tabulates the whole validity range and nothing outside it', () => {
    const { temperatures } = content.recommended;
    expect(temperatures[0]).toBe(283.15);
    expect(temperatures.at(-1)).toBe(448.15);
    expect(temperatures).toEqual([...temperatures].sort((a, b) => a - b));
    expect(temperatures.length).toBeGreaterThanOrEqual(10);
  });

  it('keeps the interval for one new laboratory apart from U, and wider', () => {
    const widths = content.recommended.newLaboratoryHalfWidths ?? [];
    expect(widths).toHaveLength(content.recommended.temperatures.length);
    widths.forEach((width, i) => {
      expect(width).toBeGreaterThan(content.recommended.expandedUncertainties[i] ?? Number.POSITIVE_INFINITY);
    });
  });

  it('predicts no new laboratory where nothing is known of the scatter between series', () => {
    const pooled = buildSheetContent({ ...facts, correlation: { ...sampleCorrelation, betweenSeries: null } });
    expect(pooled.recommended.newLaboratoryHalfWidths).toBeNull();
    expect(pooled.figures.curve.relativeNewLaboratory).toBeNull();
    expect(texts(pooled.uncertainty.statement)).not.toContain('new laboratory');
  });

  it('reduces points to the reference pressure along the correlation', () => {
    const [a] = content.figures.series;
    const points = facts.series[0]?.points;
    const pressure = points?.pressures[0] ?? Number.NaN;
    expect(pressure).not.toBe(101_325);
    expect(a?.reducedDiffusivities[0]).toBeCloseTo(((points?.diffusivities[0] ?? 0) * pressure) / 101_325, 15);
  });

  it('marks points of series left out, and single points left out, as without weight', () => {
    const weightless = Object.fromEntries(content.figures.series.map(({ key, leftOut }) => [key, leftOut]));
    expect(weightless).toMatchObject({ a: [], b: [2], f: [0, 1, 2, 3, 4], g: [0, 1, 2] });
  });

  it('gives the reason for each series and each point left out', () => {
    expect(content.seriesUsed.map(({ key }) => key)).toEqual(['a', 'b', 'c', 'd', 'e', 'h']);
    expect(content.seriesLeftOut.map(({ key, reason }) => [key, reason?.split(':')[0]])).toEqual([
      ['f', 'Apparatus'],
      ['g', 'Conditions'],
    ]);
    expect(content.pointsLeftOut).toMatchObject([
      { seriesKey: 'b', reason: expect.stringContaining('Disturbed') as string },
    ]);
  });

  it('shows estimates beside the fit, with their usual error', () => {
    const [fuller] = content.estimates.methods;
    expect(fuller).toMatchObject({ method: 'Fuller–Schettler–Giddings', usualMeanError: 4 });
    expect(fuller?.deviations[0]).toBeCloseTo(100 * (1.26e-5 / 1.24553e-5 - 1), 9);
  });

  it('says so where no estimate can be given', () => {
    const without = buildSheetContent({ ...facts, estimates: () => [] });
    expect(without.estimates.methods).toEqual([]);
    expect(plainText(without.estimates.note)).toContain('No estimate');
  });

  it('says what U is, and what it does not include', () => {
    const statement = texts(content.uncertainty.statement);
    expect(statement).toContain('expanded uncertainty of the recommended value');
    expect(statement).toContain('k\u00a0=\u00a02.57');
    expect(statement).toContain('level of confidence approximately 95\u00a0%');
    expect(statement).toContain('series h');
    const missing = texts(content.uncertainty.notIncluded);
    expect(missing).toContain('a bias common to all methods used');
    expect(missing).toContain('From 362.95\u00a0K to 448.1\u00a0K one method only, peak broadening');
    expect(missing).toContain('Stated mole fractions of ethanol run from 0.05 to 0.05');
  });

  it('cautions against extrapolation, dense gas, the substances, and sole reliance, and defers to codes and practice', () => {
    const cautions = texts(content.cautions);
    for (const words of [
      'Below 283.15\u00a0K and above 448.15\u00a0K',
      'dilute gas, 1\u00a0kPa',
      'Ethanol: The vapour burns',
    ]) {
      expect(cautions).toContain(words);
    }
    expect(cautions).toContain('sole basis of a safety-critical design');
    expect(cautions).toContain('Local codes and licensed practice');
  });

  it('is cited with people, year and DOI once released, and says not to cite it before', () => {
    expect(content.citation.plain).toBe(
      'Diffolio (2026). Ethanol + nitrogen: mutual diffusivity, data sheet DS-0042, version 2.1. ' +
        'Prepared by M. K., reviewed by L. A. doi:10.0000/invented.ds-0042.2.1',
    );
    const draft = buildSheetContent({ ...facts, releasedAt: null, standing: { ...facts.standing, status: 'DRAFT' } });
    expect(draft.citation.plain).toContain('do not cite');
    expect(draft.citation.doi).toBeNull();
  });

  it('names itself for the metadata of a document', () => {
    expect(documentTitle(content)).toBe('Ethanol + nitrogen: mutual diffusivity, data sheet DS-0042, version 2.1');
    expect(documentSubject(content)).toContain('1\u00a0kPa to 400\u00a0kPa, stated');
  });
});

describe('standing of a version', () => {
  it('carries a watermark unless it is released or superseded', () => {
    const watermarkOf = (status: 'DRAFT' | 'APPROVED' | 'RELEASED' | 'SUPERSEDED' | 'WITHDRAWN') =>
      buildSheetContent({ ...facts, standing: { ...facts.standing, status } }).standing.watermark;
    expect(watermarkOf('DRAFT')).toBe('draft');
    expect(watermarkOf('APPROVED')).toBe('approved');
    expect(watermarkOf('RELEASED')).toBeNull();
    expect(watermarkOf('SUPERSEDED')).toBeNull();
    expect(watermarkOf('WITHDRAWN')).toBe('withdrawn');
  });

  it('changes nothing of what was released when the version is withdrawn', () => {
    const withdrawn = withStanding(
      content,
      {
        ...facts.standing,
        status: 'WITHDRAWN',
        withdrawnAt: '2026-12-01T00:00:00.000Z',
        withdrawalReason: 'Series d was read in the wrong unit',
      },
      facts.versions,
    );
    expect(withdrawn.standing.banner).toBe(
      'Withdrawn on 1 December 2026: Series d was read in the wrong unit. Do not use its numbers.',
    );
    expect({ ...withdrawn, standing: content.standing }).toEqual(content);
  });
});

describe('stretches that one method alone covers', () => {
  it('are joined across the points of that method, and none where two methods overlap', () => {
    expect(singleMethodStretches(sampleCorrelation, facts.series)).toEqual([
      { method: 'evaporation tube', minimum: 283.15, maximum: 298.15 },
      { method: 'peak broadening', minimum: 362.95, maximum: 448.1 },
    ]);
  });
});
