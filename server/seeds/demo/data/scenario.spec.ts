import { describe, expect, it } from '@jest/globals';
import { fitCorrelation } from '../../../src/numerics/fitting/fit-correlation.js';
import { methodNamed } from '../../../src/series/measurement-methods.js';
import { starterLibrary } from '../../library/library.js';
import { DEMO_PERSON_KEYS, type DemoSeries, type DemoVersion } from './demo.types.js';
import { ETHANOL_NITROGEN_LAW } from './ethanol-nitrogen.js';
import { demoScenario } from './scenario.js';

const scenario = demoScenario();
const seriesByKey = new Map(scenario.series.map((series) => [series.key, series]));
const named = new Set(starterLibrary().map(({ name }) => name));
const versions = scenario.sheets.flatMap((sheet) => sheet.versions);

function fitOf(version: DemoVersion) {
  const used = version.seriesKeys.map((key) => {
    const series = seriesByKey.get(key);
    if (!series) throw new Error(`no series ${key}`);
    const excluded = version.excludedPoints.filter(({ seriesKey }) => seriesKey === key).map(({ index }) => index);
    return { ...series, points: series.points.filter((_, index) => !excluded.includes(index)) };
  });
  return fitCorrelation(used, version.recipe);
}

describe('demoScenario', () => {
  it('is the same at every call', () => {
    expect(demoScenario()).toEqual(scenario);
  });

  it('has one person for every role the story needs, all at demo.example', () => {
    expect(scenario.people.map(({ key }) => key)).toEqual(DEMO_PERSON_KEYS);
    expect(scenario.people.every(({ key, email }) => email === `${key}@demo.example`)).toBe(true);
  });

  it('says of every source that it is invented', () => {
    expect(scenario.statement).toMatch(/invented/);
    expect(scenario.series.filter(({ source }) => !source.endsWith('(invented)'))).toEqual([]);
  });

  it('has at least six pairs of substances that the library has', () => {
    expect(scenario.pairs.length).toBeGreaterThanOrEqual(6);
    expect(scenario.pairs.flatMap(({ a, b }) => [a, b]).filter((name) => !named.has(name))).toEqual([]);
  });

  it('gives each series a key of its own, a method the trade knows, and points that are positive', () => {
    expect(seriesByKey.size).toBe(scenario.series.length);
    expect(scenario.series.filter(({ method }) => methodNamed(method) === null)).toEqual([]);
    const positive = (series: DemoSeries) =>
      series.points.every(
        ({ temperature, pressure, diffusivity }) => temperature > 0 && pressure > 0 && diffusivity > 0,
      );
    expect(scenario.series.every((series) => series.points.length > 0 && positive(series))).toBe(true);
  });

  it('tells of every fate: accepted, submitted, returned with a remark, draft', () => {
    expect(new Set(scenario.series.map(({ fate }) => fate)).size).toBe(4);
    const returned = scenario.series.filter(({ fate }) => fate === 'returned');
    expect(returned.length).toBeGreaterThan(0);
    expect(returned.every(({ remark }) => remark !== null)).toBe(true);
  });

  it('keeps one accepted pair without a fit', () => {
    const accepted = new Set(scenario.series.filter(({ fate }) => fate === 'accepted').map(({ a, b }) => `${a}|${b}`));
    const sheets = new Set(scenario.sheets.map(({ pair }) => `${pair.a}|${pair.b}`));
    expect([...accepted].filter((pair) => !sheets.has(pair))).toEqual(['hydrogen|nitrogen']);
  });

  it('releases one sheet three times, has one version in review and one withdrawn with a reason', () => {
    expect(scenario.sheets.filter((sheet) => sheet.versions.length === 3)).toHaveLength(1);
    expect(versions.filter(({ fate }) => fate === 'inReview')).toHaveLength(1);
    const withdrawn = versions.filter(({ fate }) => fate === 'withdrawn');
    expect(withdrawn.map(({ withdrawalReason }) => withdrawalReason !== null)).toEqual([true]);
    expect(versions.filter(({ fate, withdrawalReason }) => fate !== 'withdrawn' && withdrawalReason !== null)).toEqual(
      [],
    );
  });

  it('asks for a change note from the second version on, and from no first one', () => {
    const notes = scenario.sheets.map((sheet) => sheet.versions.map(({ changeNote }) => changeNote !== null));
    expect(notes.every(([first, ...later]) => first === false && later.every(Boolean))).toBe(true);
  });

  it('builds sheets from accepted series of the pair alone, and leaves none out without a reason', () => {
    for (const { pair, versions: own } of scenario.sheets) {
      for (const version of own) {
        const leftOut = version.leftOutSeries.map(({ seriesKey }) => seriesKey);
        const members = [...version.seriesKeys, ...leftOut].map((key) => seriesByKey.get(key));
        expect(members.every((series) => series?.fate === 'accepted')).toBe(true);
        expect(members.every((series) => series?.a === pair.a && series.b === pair.b)).toBe(true);
        expect(leftOut.filter((key) => version.seriesKeys.includes(key))).toEqual([]);
        const reasons = [...version.leftOutSeries, ...version.excludedPoints].map(({ reason }) => reason);
        expect(reasons.every((reason) => reason.length > 10)).toBe(true);
      }
    }
  });

  it('excludes points that are there', () => {
    const excluded = versions.flatMap(({ excludedPoints }) => excludedPoints);
    expect(excluded.length).toBeGreaterThan(0);
    expect(excluded.filter(({ seriesKey, index }) => !seriesByKey.get(seriesKey)?.points[index])).toEqual([]);
  });

  it('never lets a series and its copy carry weight together', () => {
    const copies = scenario.series.filter(({ sameDataAs }) => sameDataAs !== null);
    expect(copies.every(({ sameDataAs }) => seriesByKey.has(sameDataAs ?? ''))).toBe(true);
    for (const { key, sameDataAs } of copies) {
      expect(versions.filter(({ seriesKeys: used }) => used.includes(key) && used.includes(sameDataAs ?? ''))).toEqual(
        [],
      );
    }
  });

  it('can be fitted, every version of it', () => {
    const refused = versions.map(fitOf).filter((outcome) => !outcome.ok);
    expect(refused).toEqual([]);
  });
});

describe('ethanol + nitrogen', () => {
  const sheet = scenario.sheets.find(({ pair }) => pair.a === 'ethanol');
  const eight = scenario.series.filter(({ a, b }) => a === 'ethanol' && b === 'nitrogen');
  const current = sheet?.versions[2];

  it('has eight series, of which the current version leaves out two', () => {
    expect(eight).toHaveLength(8);
    expect(current?.seriesKeys).toHaveLength(6);
    expect(current?.leftOutSeries).toHaveLength(2);
  });

  it('comes back to its invented nature when fitted, within 1 %', () => {
    const outcome = current && fitOf(current);
    if (!outcome?.ok) throw new Error('the fit was refused');
    const [D0, n] = outcome.fit.parameters;
    expect(Math.abs((D0?.value ?? NaN) / ETHANOL_NITROGEN_LAW(298.15, 101_325) - 1)).toBeLessThan(0.01);
    expect(Math.abs((n?.value ?? NaN) - 1.79)).toBeLessThan(0.1);
  });

  it('keeps the second release on the fit of the first, and changes the fit in the third', () => {
    const [first, second, third] = sheet?.versions ?? [];
    expect([second?.seriesKeys, second?.excludedPoints, second?.recipe]).toEqual([
      first?.seriesKeys,
      first?.excludedPoints,
      first?.recipe,
    ]);
    expect(third?.seriesKeys).not.toEqual(first?.seriesKeys);
  });
});

describe('tube runs', () => {
  it('are three, by level and by mass, each of a series of the scenario', () => {
    expect(scenario.tubeRuns).toHaveLength(3);
    expect(scenario.tubeRuns.filter(({ masses }) => masses !== null)).toHaveLength(1);
    expect(scenario.tubeRuns.filter(({ seriesKey }) => !seriesByKey.has(seriesKey))).toEqual([]);
  });

  it('have a reading for every time, and a level that falls', () => {
    for (const { times, depths, masses } of scenario.tubeRuns) {
      const readings = depths ?? masses ?? [];
      expect(readings).toHaveLength(times.length);
      expect([...readings].sort((a, b) => a - b)).toEqual(readings);
      expect([...times].sort((a, b) => a - b)).toEqual(times);
    }
  });

  it('give back the invented diffusivity of ethanol in nitrogen from the long run within 3 %', () => {
    const run = scenario.tubeRuns.find(({ key }) => key === 'tube-run-27');
    if (!run?.depths) throw new Error('the long run is read by level');
    const [start = NaN, end = NaN] = [run.depths[0], run.depths.at(-1)];
    const elapsed = run.times.at(-1) ?? NaN;
    // Square law with the mean end effect put in by hand: D = (z_f + δ)² − (z₀ + δ)² over 2 t (c/c_L) ln[1/(1 − y₁)], with
    // 17.90 kPa and 772.3 kg/m³ for ethanol at 313.15 K (Poling et al. 2001, Appendix A; Perry, 8th ed., Table 2-32).
    const delta = 0.74e-3;
    const molarRatio = run.pressure / (8.314462618 * run.temperature) / (772.3 / 0.046069);
    const drivingForce = -Math.log(1 - 17_900 / run.pressure);
    const diffusivity = ((end + delta) ** 2 - (start + delta) ** 2) / (2 * elapsed * molarRatio * drivingForce);
    expect(Math.abs(diffusivity / ETHANOL_NITROGEN_LAW(run.temperature, run.pressure) - 1)).toBeLessThan(0.03);
  });
});
