import { Field, ID, ObjectType } from '@nestjs/graphql';

@ObjectType({
  description: 'Somebody asked to be told when a version of this sheet is released, superseded or withdrawn.',
})
export class SheetSubscription {
  @Field(() => ID)
  readonly sheetId: string;
  @Field()
  readonly since: Date;
}
