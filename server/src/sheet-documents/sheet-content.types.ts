import { Field, Float, Int, ObjectType } from '@nestjs/graphql';
import {
  SheetCitation,
  SheetMargin,
  SheetRemark,
  SheetSection,
  SheetStanding,
  SheetVersionRow,
} from './sheet-provenance.types.js';
import { SheetFigures } from './sheet-figures.types.js';
import { EquationPiece, TextRun } from './typeset.types.js';

@ObjectType({ description: 'One of the two substances, as the sheet names it.' })
export class SheetSubstance {
  @Field({ description: 'With a capital: Ethanol' })
  readonly name: string;
  @Field(() => [TextRun], { description: 'Formula with its subscripts' })
  readonly formula: TextRun[];
  @Field(() => String, { nullable: true, description: 'CAS Registry Number; null where none is assigned.' })
  readonly casNumber: string | null;
  @Field(() => Float, { description: 'kg/mol' })
  readonly molarMass: number;
}

@ObjectType({ description: 'A parameter of the correlation, or one of the constants it is stated at.' })
export class SheetParameter {
  @Field({ description: 'As in CorrelationParameter.symbol, or T0, P0, tau, tau_n' })
  readonly symbol: string;
  @Field(() => [TextRun], { description: 'The symbol as it is set' })
  readonly label: TextRun[];
  @Field(() => Float, { description: 'In `unit`' })
  readonly value: number;
  @Field(() => Float, { nullable: true, description: 'In `unit`; null where the value is exact, fixed or assigned.' })
  readonly standardUncertainty: number | null;
  @Field({ description: 'UCUM code; `1` for a pure number' })
  readonly unit: string;
  @Field({ description: 'Value as printed, in K, kPa, cm²/s, concise where it has an uncertainty: 0.12455(50) cm²/s' })
  readonly printed: string;
  @Field(() => String, { nullable: true, description: 'exact, fixed by hand, between series, …' })
  readonly note: string | null;
}

@ObjectType({ description: 'Correlation coefficient between two fitted parameters' })
export class SheetCoefficient {
  @Field(() => [TextRun], { description: 'r(D0, n) as it is set' })
  readonly label: TextRun[];
  @Field(() => Float)
  readonly value: number;
  @Field({ description: 'Value as printed, with a true minus' })
  readonly printed: string;
}

@ObjectType({ description: 'The correlation the version recommends, set for reading' })
export class SheetCorrelation {
  @Field({ description: 'CorrelationForm' })
  readonly form: string;
  @Field({ description: 'Power law, …' })
  readonly formName: string;
  @Field(() => [EquationPiece])
  readonly equation: EquationPiece[];
  @Field({ description: 'The equation in words, for a screen reader' })
  readonly spoken: string;
  @Field({ description: 'Plain-text expression in T (K) and P (Pa), giving D in m²/s, with the numbers in place' })
  readonly expression: string;
  @Field(() => [SheetParameter], { description: 'Fitted and fixed parameters, then reference state, then τ' })
  readonly parameters: SheetParameter[];
  @Field(() => [SheetCoefficient])
  readonly coefficients: SheetCoefficient[];
  @Field(() => Float, { nullable: true, description: 'ν of Student’s t; null when U is taken from the normal law' })
  readonly degreesOfFreedom: number | null;
  @Field(() => Float, { description: 'k for a level of confidence of 95 %' })
  readonly coverageFactor: number;
}

@ObjectType({ description: 'Where the correlation holds' })
export class SheetRange {
  @Field(() => Float, { description: 'K' })
  readonly temperatureMinimum: number;
  @Field(() => Float, { description: 'K' })
  readonly temperatureMaximum: number;
  @Field(() => Float, { description: 'Pa' })
  readonly pressureMinimum: number;
  @Field(() => Float, { description: 'Pa' })
  readonly pressureMaximum: number;
  @Field({ description: 'RangeBasis: MEASURED or STATED' })
  readonly pressureBasis: string;
  @Field({ description: '283.15 K to 448.15 K' })
  readonly temperaturePrinted: string;
  @Field({ description: '1 kPa to 400 kPa, stated' })
  readonly pressurePrinted: string;
  @Field(() => [TextRun], { description: 'What the range rests on, in a sentence or two' })
  readonly sentence: TextRun[];
}

@ObjectType({ description: 'Recommended values over the validity range: columns of equal length' })
export class RecommendedValues {
  @Field(() => Float, { description: 'Pa, the same for all rows' })
  readonly pressure: number;
  @Field(() => Float64Array, { description: 'K' })
  readonly temperatures: number[];
  @Field(() => Float64Array, { description: 'm²/s' })
  readonly diffusivities: number[];
  @Field(() => Float64Array, { description: 'm²/s' })
  readonly standardUncertainties: number[];
  @Field(() => Float64Array, { description: 'm²/s, of the recommended value, level of confidence approximately 95 %' })
  readonly expandedUncertainties: number[];
  @Field(() => Float64Array, {
    nullable: true,
    description: 'm²/s, half-width of the interval for one new laboratory; null without a between-series deviation.',
  })
  readonly newLaboratoryHalfWidths: number[] | null;
  @Field(() => Int, {
    nullable: true,
    description: 'Index of the row at the reference temperature; null outside the range',
  })
  readonly referenceRow: number | null;
  @Field(() => [TextRun], { description: 'How to go to other pressures' })
  readonly note: TextRun[];
}

@ObjectType({ description: 'A series of the sheet, whether its points carried weight or not' })
export class SheetSeries {
  @Field({ description: 'Letter of the series in figures and tables: a, b, …' })
  readonly key: string;
  @Field(() => Int, { description: 'Number of its colour and shape, from 0; the same on every page' })
  readonly mark: number;
  @Field()
  readonly title: string;
  @Field()
  readonly source: string;
  @Field()
  readonly method: string;
  @Field(() => String, { nullable: true })
  readonly apparatus: string | null;
  @Field({ description: 'DataOrigin in words: table, graph, smoothed table, equation, tube runs' })
  readonly origin: string;
  @Field(() => Int, { description: 'Points of the series, and how many of them carried weight' })
  readonly pointCount: number;
  @Field(() => Int)
  readonly weightedPointCount: number;
  @Field(() => Float, { description: 'K' })
  readonly temperatureMinimum: number;
  @Field(() => Float, { description: 'K' })
  readonly temperatureMaximum: number;
  @Field(() => Float, { description: 'Pa' })
  readonly pressureMinimum: number;
  @Field(() => Float, { description: 'Pa' })
  readonly pressureMaximum: number;
  @Field(() => Float, {
    nullable: true,
    description: 'Root mean square of u(D)/D, point to point; null where none is known',
  })
  readonly relativeUncertainty: number | null;
  @Field({ description: 'Some u(D) is the usual value of the method, assigned because the source states none' })
  readonly uncertaintyAssigned: boolean;
  @Field(() => Float, {
    nullable: true,
    description: 'Relative standard uncertainty common to all points of the series',
  })
  readonly commonRelativeUncertainty: number | null;
  @Field(() => Float, { nullable: true, description: 'Mean deviation of ln D from the correlation' })
  readonly offset: number | null;
  @Field(() => Float, { nullable: true, description: 'Standard uncertainty of the offset' })
  readonly offsetStandardUncertainty: number | null;
  @Field(() => String, { nullable: true, description: 'Why it was left out; null where it carried weight.' })
  readonly reason: string | null;
}

@ObjectType({ description: 'A point left out of the fit, with the reason' })
export class SheetExcludedPoint {
  @Field({ description: 'Letter of its series' })
  readonly seriesKey: string;
  @Field(() => Float, { description: 'K' })
  readonly temperature: number;
  @Field(() => Float, { description: 'Pa' })
  readonly pressure: number;
  @Field(() => Float, { description: 'm²/s' })
  readonly diffusivity: number;
  @Field(() => Float, { description: 'Deviation from the correlation, percent' })
  readonly deviation: number;
  @Field()
  readonly reason: string;
}

@ObjectType({ description: 'An estimate beside the recommended values; it took no part in the fit.' })
export class SheetEstimate {
  @Field()
  readonly method: string;
  @Field(() => Float64Array, { description: 'm²/s, at `SheetEstimates.temperatures`' })
  readonly diffusivities: number[];
  @Field(() => Float64Array, { description: 'Against the correlation, percent' })
  readonly deviations: number[];
  @Field(() => Float, { description: 'Usual mean error of the method, percent, from its source' })
  readonly usualMeanError: number;
  @Field({ description: 'Where the method and its usual error come from' })
  readonly source: string;
}

@ObjectType({ description: 'Estimates by kinetic theory and its relatives beside the recommended values' })
export class SheetEstimates {
  @Field(() => Float64Array, { description: 'K' })
  readonly temperatures: number[];
  @Field(() => Float, { description: 'Pa' })
  readonly pressure: number;
  @Field(() => [SheetEstimate], {
    description: 'Empty where a constant of a substance is missing or no method reaches the temperatures',
  })
  readonly methods: SheetEstimate[];
  @Field(() => [TextRun])
  readonly note: TextRun[];
}

@ObjectType({ description: 'What the uncertainty is, and what is not in it; each entry is a paragraph.' })
export class SheetUncertainty {
  @Field(() => [[TextRun]])
  readonly statement: TextRun[][];
  @Field(() => [[TextRun]])
  readonly notIncluded: TextRun[][];
}

@ObjectType({
  description:
    'What a version of a data sheet says, from which the page, the PDF and the CSV are all made. Numbers are SI; texts are typeset in K, kPa, cm²/s.',
})
export class SheetContent {
  @Field({ description: 'DS-0042' })
  readonly code: string;
  @Field({ description: 'edition.revision' })
  readonly number: string;
  @Field({ description: 'Ethanol + nitrogen' })
  readonly title: string;
  @Field(() => [TextRun], { description: 'What the sheet is about, in one sentence' })
  readonly lead: TextRun[];
  @Field({ description: 'The editor’s words' })
  readonly summary: string;
  @Field(() => [SheetSection], { description: 'Sections in their order' })
  readonly sections: SheetSection[];
  @Field(() => SheetStanding)
  readonly standing: SheetStanding;
  @Field(() => [SheetSubstance], { description: 'Two, in the order of display' })
  readonly substances: SheetSubstance[];
  @Field(() => [TextRun], { description: 'What D is' })
  readonly definition: TextRun[];
  @Field(() => SheetCorrelation)
  readonly correlation: SheetCorrelation;
  @Field(() => SheetRange)
  readonly range: SheetRange;
  @Field(() => SheetFigures)
  readonly figures: SheetFigures;
  @Field(() => RecommendedValues)
  readonly recommended: RecommendedValues;
  @Field(() => [SheetSeries])
  readonly seriesUsed: SheetSeries[];
  @Field(() => [SheetSeries])
  readonly seriesLeftOut: SheetSeries[];
  @Field(() => [SheetExcludedPoint])
  readonly pointsLeftOut: SheetExcludedPoint[];
  @Field(() => SheetEstimates)
  readonly estimates: SheetEstimates;
  @Field(() => SheetUncertainty)
  readonly uncertainty: SheetUncertainty;
  @Field(() => [[TextRun]], { description: 'One caution each' })
  readonly cautions: TextRun[][];
  @Field(() => SheetCitation)
  readonly citation: SheetCitation;
  @Field(() => [SheetVersionRow], { description: 'Newest first, this one included' })
  readonly versions: SheetVersionRow[];
  @Field(() => [SheetRemark], { description: 'The editor’s remarks on single sections' })
  readonly remarks: SheetRemark[];
  @Field(() => SheetMargin)
  readonly margin: SheetMargin;
}
