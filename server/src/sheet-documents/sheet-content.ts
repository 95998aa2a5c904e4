import type { EvaluableCorrelation } from '../numerics/fitting/fit.types.js';
import { formatExtent } from './format-quantity.js';
import { recommendedAt } from './correlation-values.js';
import { estimatesAlong } from './estimates-along.js';
import { recommendedValues } from './recommended-values.js';
import type { SheetContent, SheetEstimates, SheetRange, SheetSubstance } from './sheet-content.types.js';
import { sheetCorrelation } from './sheet-correlation.js';
import type { SeriesFacts, SheetFacts, SubstanceFacts } from './sheet-facts.js';
import { sheetFigures } from './sheet-figures.js';
import { sheetCitation, sheetMargin, sheetStanding, versionRows } from './sheet-provenance.js';
import type { SheetRemark, SheetSection } from './sheet-provenance.types.js';
import { excludedPoints, extremes, sheetSeries, weightedTemperaturesByMethod } from './sheet-series.js';
import { sheetStrings } from './sheet-strings.js';
import { capitalised, sheetCautions, sheetUncertainty } from './sheet-uncertainty.js';
import { plain, typeset, typesetFormula } from './typeset.js';
import type { TextRun } from './typeset.types.js';

/**
 * The one description of what a version of a data sheet says. Pure: the same facts give the same content, bit for bit, and it
 * survives JSON.
 */
export function buildSheetContent(facts: SheetFacts): SheetContent {
  const { correlation, fit, series, substances } = facts;
  const title = pairTitle(substances);
  const coverageFactor = coverageFactorOf(correlation);
  const rows = series.map(sheetSeries);
  const figures = sheetFigures(correlation, series, facts.estimates);
  const drawnPoints = figures.series.reduce((sum, one) => sum + one.temperatures.length, 0);
  return {
    code: facts.code,
    number: facts.number,
    title,
    lead: leadOf(facts),
    summary: facts.words.summary,
    sections: sectionsOf(),
    standing: sheetStanding(facts.standing),
    substances: substances.map(sheetSubstance),
    definition: typeset(sheetStrings.definition),
    correlation: sheetCorrelation(correlation, fit, coverageFactor),
    range: rangeOf(correlation, series),
    figures,
    recommended: recommendedValues(correlation),
    seriesUsed: rows.filter((row) => row.reason === null),
    seriesLeftOut: rows.filter((row) => row.reason !== null),
    pointsLeftOut: excludedPoints(correlation, series),
    estimates: estimatesOf(facts),
    uncertainty: sheetUncertainty(facts, coverageFactor),
    cautions: sheetCautions(facts),
    citation: sheetCitation(facts, title),
    versions: versionRows(facts.versions, facts.number),
    remarks: remarksOf(facts.words.remarks),
    margin: sheetMargin(facts, drawnPoints),
  };
}

export const pairTitle = (substances: readonly [SubstanceFacts, SubstanceFacts]): string =>
  sheetStrings.pairTitle
    .replace('{first}', () => capitalised(substances[0].name))
    .replace('{second}', () => substances[1].name);

const coverageFactorOf = (correlation: EvaluableCorrelation): number =>
  recommendedAt(correlation, [correlation.referenceTemperature], [correlation.referencePressure]).coverageFactor;

const sheetSubstance = (substance: SubstanceFacts): SheetSubstance => ({
  name: capitalised(substance.name),
  // A mixture such as air has no formula but its name.
  formula: substance.formula.toLowerCase() === substance.name.toLowerCase() ? [] : typesetFormula(substance.formula),
  casNumber: substance.casNumber,
  molarMass: substance.molarMass,
});

/** A small count as a word, as a sentence wants it. */
function counted(count: number, [one, many]: readonly [string, string]): string {
  return `${sheetStrings.numbers[count] ?? String(count)} ${count === 1 ? one : many}`;
}

function leadOf(facts: SheetFacts): TextRun[] {
  const { validity } = facts.correlation;
  const { pointCount, seriesCount } = facts.fit.statistics;
  const methods = weightedTemperaturesByMethod(facts.series).size;
  return typeset(sheetStrings.lead, {
    temperature: formatExtent('temperature', validity.temperatureMinimum, validity.temperatureMaximum),
    pressure: formatExtent('pressure', validity.pressureMinimum, validity.pressureMaximum),
    points: `${pointCount} ${sheetStrings.points[pointCount === 1 ? 0 : 1]}`,
    series: counted(seriesCount, sheetStrings.series),
    methods: counted(methods, sheetStrings.methods),
  });
}

const sectionsOf = (): SheetSection[] =>
  Object.entries(sheetStrings.sections).map(([id, title], i) => ({ id, number: i + 1, title }));

/** Remarks in the order of the sections; an empty one is none. */
const remarksOf = (remarks: SheetFacts['words']['remarks']): SheetRemark[] =>
  Object.keys(sheetStrings.sections).flatMap((section) => {
    const text = remarks[section]?.trim() ?? '';
    return text === '' ? [] : [{ section, text }];
  });

function rangeOf(correlation: EvaluableCorrelation, series: readonly SeriesFacts[]): SheetRange {
  const { validity } = correlation;
  const temperature = formatExtent('temperature', validity.temperatureMinimum, validity.temperatureMaximum);
  const pressure = formatExtent('pressure', validity.pressureMinimum, validity.pressureMaximum);
  const used = series.filter((one) => one.leftOutBecause === null).flatMap((one) => one.points.pressures);
  const basis =
    validity.pressureBasis === 'STATED'
      ? typeset(sheetStrings.rangeStated, { points: formatExtent('pressure', ...extremes(used)) })
      : typeset(sheetStrings.rangeMeasured);
  return {
    ...validity,
    temperaturePrinted: temperature,
    pressurePrinted: `${pressure}, ${sheetStrings.pressureBasis[validity.pressureBasis]}`,
    sentence: [...typeset(sheetStrings.range, { temperature, pressure }), ...basis],
  };
}

/** A part given to a few digits, in percent, without the dirt of the last binary digit. */
const inPercent = (part: number): number => Number((100 * part).toPrecision(12));

/** Estimates at T0, where it lies in the range, else at its lower end, and at the upper end. */
function estimatesOf({ correlation, estimates }: SheetFacts): SheetEstimates {
  const { temperatureMinimum, temperatureMaximum } = correlation.validity;
  const reference = correlation.referenceTemperature;
  const isInside = reference >= temperatureMinimum && reference <= temperatureMaximum;
  const temperatures = [...new Set([isInside ? reference : temperatureMinimum, temperatureMaximum])];
  const pressure = correlation.referencePressure;
  const fitted = recommendedAt(correlation, temperatures, [pressure]).diffusivities;
  const methods = estimatesAlong(estimates, temperatures, pressure)
    .filter((column) => column.temperatures.length === temperatures.length)
    .map(({ method, usualRelativeError, source, diffusivities }) => {
      const deviations = diffusivities.map((D, i) => 100 * (D / (fitted[i] ?? Number.NaN) - 1));
      return { method, usualMeanError: inPercent(usualRelativeError), source, diffusivities, deviations };
    });
  const note = methods.length === 0 ? sheetStrings.noEstimates : sheetStrings.estimatesNote;
  return { temperatures, pressure, methods, note: plain(note) };
}
