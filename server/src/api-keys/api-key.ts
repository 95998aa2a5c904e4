import { Field, ID, ObjectType } from '@nestjs/graphql';

@ObjectType({
  description: 'Lets a program read what its owner may read. The secret is shown once and only its hash is kept.',
})
export class ApiKey {
  @Field(() => ID)
  readonly id: string;
  @Field()
  readonly name: string;
  @Field({ description: 'How the secret begins, to tell keys apart.' })
  readonly prefix: string;
  @Field()
  readonly createdAt: Date;
  @Field(() => Date, { nullable: true, description: 'To the minute; null when the key was never used.' })
  readonly lastUsedAt: Date | null;
  @Field(() => Date, { nullable: true, description: 'When it ends by itself; null when it does not.' })
  readonly expiresAt: Date | null;
  @Field(() => Date, { nullable: true })
  readonly revokedAt: Date | null;
}
