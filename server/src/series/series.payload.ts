import { Field, ObjectType } from '@nestjs/graphql';
import { type Outcome, Problem } from '../common/problem.js';
import { Series } from './series.entity.js';

@ObjectType()
export class SeriesPayload {
  @Field(() => Series, { nullable: true })
  series: Series | null;
  @Field(() => [Problem])
  problems: Problem[];
}

export function toSeriesPayload(outcome: Outcome<Series>): SeriesPayload {
  return outcome.ok ? { series: outcome.value, problems: [] } : { series: null, problems: outcome.problems };
}
