import { Field, ObjectType } from '@nestjs/graphql';
import { Problem } from '../common/problem.js';
import { ApiKey } from './api-key.js';

@ObjectType()
export class ApiKeyPayload {
  @Field(() => ApiKey, { nullable: true })
  readonly apiKey: ApiKey | null;
  @Field(() => String, { nullable: true, description: 'The key itself, when it is made; shown this once.' })
  readonly secret: string | null;
  @Field(() => [Problem])
  readonly problems: Problem[];
}
