import { Field, Float, Int, ObjectType } from '@nestjs/graphql';
import { TextRun } from './typeset.types.js';

@ObjectType({ description: 'Limits of an axis and where it carries figures, in the unit of the quantity' })
export class FigureAxis {
  @Field(() => Float)
  readonly minimum: number;
  @Field(() => Float)
  readonly maximum: number;
  @Field(() => Float64Array)
  readonly ticks: number[];
}

@ObjectType({
  description:
    'The correlation along the temperature axis at the reference pressure. Columns of equal length; the curve runs beyond the validity range, where it is drawn broken and without band.',
})
export class FigureCurve {
  @Field(() => Float64Array, { description: 'K' })
  readonly temperatures: number[];
  @Field(() => Float64Array, { description: 'm²/s' })
  readonly diffusivities: number[];
  @Field(() => Float64Array, { description: 'U of the recommended value as a part of D: the band is D·exp(±value)' })
  readonly relativeExpandedUncertainties: number[];
  @Field(() => Float64Array, {
    nullable: true,
    description: 'The interval for one new laboratory in the same way; null without a between-series deviation.',
  })
  readonly relativeNewLaboratory: number[] | null;
  @Field(() => Int, { description: 'Index of the first temperature in the validity range' })
  readonly firstInside: number;
  @Field(() => Int, { description: 'Index of the last temperature in the validity range' })
  readonly lastInside: number;
}

@ObjectType({ description: 'Points of one series. Columns of equal length.' })
export class FigureSeries {
  @Field({ description: 'Letter of the series' })
  readonly key: string;
  @Field(() => Int, { description: 'Number of colour and shape, from 0' })
  readonly mark: number;
  @Field()
  readonly title: string;
  @Field({ description: 'The series as a whole carried weight' })
  readonly used: boolean;
  @Field(() => Float64Array, { description: 'K' })
  readonly temperatures: number[];
  @Field(() => Float64Array, { description: 'D P/P0, m²/s' })
  readonly reducedDiffusivities: number[];
  @Field(() => Float64Array, { description: 'u(D)/D, point to point; 0 where none is known' })
  readonly relativeUncertainties: number[];
  @Field(() => Float64Array, { description: '100 (D/D(fit) − 1) at the T and P of the point' })
  readonly deviations: number[];
  @Field(() => [Int], { description: 'Indices of the points that carried no weight' })
  readonly leftOut: number[];
}

@ObjectType({ description: 'An estimate along the temperature axis. Columns of equal length.' })
export class FigureEstimate {
  @Field()
  readonly method: string;
  @Field(() => Float64Array, { description: 'K' })
  readonly temperatures: number[];
  @Field(() => Float64Array, { description: '100 (D/D(fit) − 1)' })
  readonly deviations: number[];
}

@ObjectType({
  description:
    'Figure 1, diffusivity against temperature, and figure 2, deviation from the fit, as data; both on one temperature axis.',
})
export class SheetFigures {
  @Field(() => Float, { description: 'Pa, the pressure all points are reduced to' })
  readonly pressure: number;
  @Field(() => FigureAxis, { description: 'K, logarithmic' })
  readonly temperatureAxis: FigureAxis;
  @Field(() => FigureAxis, { description: 'm²/s, logarithmic' })
  readonly diffusivityAxis: FigureAxis;
  @Field(() => FigureAxis, { description: 'Percent; points may lie beyond it' })
  readonly deviationAxis: FigureAxis;
  @Field(() => FigureCurve)
  readonly curve: FigureCurve;
  @Field(() => [FigureSeries], { description: 'Used first, then left out' })
  readonly series: FigureSeries[];
  @Field(() => [FigureEstimate])
  readonly estimates: FigureEstimate[];
  @Field(() => [TextRun])
  readonly diffusivityCaption: TextRun[];
  @Field(() => [TextRun])
  readonly deviationCaption: TextRun[];
}
