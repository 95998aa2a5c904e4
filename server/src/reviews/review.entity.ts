import { Field, ObjectType, registerEnumType } from '@nestjs/graphql';
import { Column, CreateDateColumn, Entity, PrimaryGeneratedColumn } from 'typeorm';

export enum ReviewVerdict {
  APPROVE = 'APPROVE',
  RETURN = 'RETURN',
}
registerEnumType(ReviewVerdict, { name: 'ReviewVerdict' });

@ObjectType({ description: 'One question of the checklist and the answer given.' })
export class ChecklistAnswer {
  @Field()
  question: string;
  @Field(() => String, { nullable: true, description: 'yes, no or does not apply; null where unanswered.' })
  answer: string | null;
}

/** A reviewer's verdict on a version; part of the record for ever. */
@Entity({ name: 'reviews' })
@ObjectType({ description: "A reviewer's verdict on a version; part of the record for ever." })
export class Review {
  @PrimaryGeneratedColumn('uuid', { primaryKeyConstraintName: 'pk_reviews' })
  id: string;

  @Column('uuid', { name: 'version_id' })
  versionId: string;

  @Column('uuid', { name: 'reviewer_id' })
  reviewerId: string;

  @Column('text')
  @Field(() => ReviewVerdict)
  verdict: `${ReviewVerdict}`;

  @Column('text')
  @Field()
  remark: string;

  @Column('jsonb', { default: [] })
  @Field(() => [ChecklistAnswer])
  checklist: ChecklistAnswer[];

  @CreateDateColumn({ name: 'created_at', type: 'timestamptz' })
  @Field()
  createdAt: Date;
}
