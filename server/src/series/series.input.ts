import { Field, Float, ID, InputType, Int } from '@nestjs/graphql';
import { SubstanceRef } from '../substances/substance.input.js';
import { DataOrigin, PressureOrigin } from './series.entity.js';

@InputType({ description: 'Same fields and units as SeriesPoint.' })
export class SeriesPointInput {
  @Field(() => Float)
  temperature: number;
  @Field(() => Float)
  pressure: number;
  @Field(() => PressureOrigin, { nullable: true, defaultValue: PressureOrigin.STATED })
  pressureOrigin?: PressureOrigin | null;
  @Field(() => Float)
  diffusivity: number;
  @Field(() => Float, { nullable: true })
  diffusivityUncertainty?: number | null;
  @Field(() => Float, { nullable: true })
  temperatureUncertainty?: number | null;
  @Field(() => Float, { nullable: true })
  pressureUncertainty?: number | null;
  @Field(() => Float, { nullable: true })
  moleFraction?: number | null;
  @Field(() => Int, { nullable: true })
  replicates?: number | null;
}

@InputType()
export class CreateSeriesInput {
  @Field(() => SubstanceRef)
  a: SubstanceRef;
  @Field(() => SubstanceRef)
  b: SubstanceRef;
  @Field()
  title: string;
  @Field({ description: 'Free text or DOI' })
  source: string;
  @Field()
  method: string;
  @Field(() => String, { nullable: true })
  apparatus?: string | null;
  @Field(() => DataOrigin, { nullable: true, defaultValue: DataOrigin.TABLE })
  dataOrigin?: DataOrigin | null;
  @Field(() => Float, { nullable: true })
  commonRelativeUncertainty?: number | null;
  @Field(() => ID, { nullable: true })
  sameDataAsId?: string | null;
  @Field(() => [SeriesPointInput])
  points: SeriesPointInput[];
}

@InputType({
  description: 'A draft or returned series in its new form, whole. An edited returned one is a draft again.',
})
export class UpdateSeriesInput {
  @Field(() => ID)
  id: string;
  @Field(() => Int, { description: 'The count of changes the person was looking at; CONFLICT when it has grown.' })
  lockVersion: number;
  @Field()
  title: string;
  @Field({ description: 'Free text or DOI' })
  source: string;
  @Field()
  method: string;
  @Field(() => String, { nullable: true })
  apparatus?: string | null;
  @Field(() => DataOrigin, { nullable: true, defaultValue: DataOrigin.TABLE })
  dataOrigin?: DataOrigin | null;
  @Field(() => Float, { nullable: true })
  commonRelativeUncertainty?: number | null;
  @Field(() => ID, { nullable: true })
  sameDataAsId?: string | null;
  @Field(() => [SeriesPointInput], { description: 'All points; absent leaves them as they are.', nullable: true })
  points?: SeriesPointInput[] | null;
}
