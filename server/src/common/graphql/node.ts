import { Field, ID, InterfaceType } from '@nestjs/graphql';

/** Entities are instances of the class that bears the type's name. */
@InterfaceType('Node', { resolveType: (value: object) => value.constructor.name })
export abstract class Node {
  @Field(() => ID)
  id: string;
}

const UUID = /^[0-9a-f]{8}-[0-9a-f]{4}-[0-9a-f]{4}-[0-9a-f]{4}-[0-9a-f]{12}$/i;

/** Ids are opaque to callers; one that is not of our form names nothing. */
export function isId(text: string): boolean {
  return UUID.test(text);
}
