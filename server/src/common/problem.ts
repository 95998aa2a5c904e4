import { Field, ObjectType } from '@nestjs/graphql';

/** The closed list of what a caller can mend. */
export type ProblemCode =
  | 'BAD_INPUT'
  | 'DUPLICATE'
  | 'NOT_DETERMINABLE'
  | 'NOT_AVAILABLE'
  | 'WRONG_STATE'
  | 'NOT_INDEPENDENT'
  | 'WRONG_PASSWORD';

@ObjectType({ description: 'Something the caller can mend. `path` points into the input (`points.3.temperature`).' })
export class Problem {
  @Field(() => String)
  readonly code: ProblemCode;
  @Field()
  readonly message: string;
  @Field(() => String, { nullable: true })
  readonly path: string | null;
}

@ObjectType({ description: 'A doubt that stops nothing.' })
export class Warning {
  @Field(() => String)
  readonly code: string;
  @Field()
  readonly message: string;
  @Field(() => String, { nullable: true })
  readonly path: string | null;
}

/** What a service method answers: the object, or the problems that refused it. */
export type Outcome<T> = { ok: true; value: T } | { ok: false; problems: Problem[] };

export function accepted<T>(value: T): Outcome<T> {
  return { ok: true, value };
}

export function refused(...problems: Problem[]): { ok: false; problems: Problem[] } {
  return { ok: false, problems };
}

export function problem(code: ProblemCode, message: string, path: string | null = null): Problem {
  return { code, message, path };
}
