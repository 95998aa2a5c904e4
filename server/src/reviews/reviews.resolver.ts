import {
  Args,
  Context,
  Field,
  Float,
  ID,
  InputType,
  Mutation,
  ObjectType,
  Parent,
  Query,
  ResolveField,
  Resolver,
} from '@nestjs/graphql';
import { AnyoneMay, RolesMay } from '../common/access.decorators.js';
import { loaderFor } from '../common/graphql/loader-for.js';
import { CurrentViewer, isOfTheGroup, type Viewer } from '../common/viewer.js';
import { DataSheetVersion } from '../data-sheets/data-sheet-version.entity.js';
import { DataSheetVersionPayload, toVersionPayload } from '../data-sheets/data-sheets.resolver.js';
import { PeopleService } from '../people/people.service.js';
import { Person } from '../people/person.entity.js';
import { REVIEW_QUESTIONS } from './review-checklist.js';
import { approvalsInForce } from './review-rules.js';
import { Review, ReviewVerdict } from './review.entity.js';
import { ReviewsService } from './reviews.service.js';

@InputType({ description: 'An answer to one question of the checklist.' })
export class ChecklistAnswerInput {
  @Field()
  question: string;
  @Field(() => String, { nullable: true, description: 'yes, no or does not apply' })
  answer: string | null;
}

@InputType({
  description:
    'Unanswered checklist questions do not refuse APPROVE over the API; the record shows them as unanswered.',
})
export class RecordReviewInput {
  @Field(() => ID)
  versionId: string;
  @Field(() => ReviewVerdict)
  verdict: ReviewVerdict;
  @Field()
  remark: string;
  @Field(() => [ChecklistAnswerInput], { nullable: true })
  checklist?: ChecklistAnswerInput[] | null;
}

@ObjectType({ description: 'One number of a correlation, stored and recomputed.' })
export class ReproducedNumber {
  @Field({ description: 'The parameter, or the covariance of two.' })
  name: string;
  @Field(() => Float)
  stored: number;
  @Field(() => Float)
  recomputed: number;
  @Field({ description: 'To 12 digits.' })
  agrees: boolean;
}

@Resolver(() => Review)
export class ReviewsResolver {
  constructor(
    private readonly reviews: ReviewsService,
    private readonly people: PeopleService,
  ) {}

  @Query(() => [String], { description: 'The questions a reviewer goes through.' })
  @AnyoneMay()
  reviewQuestions(): readonly string[] {
    return REVIEW_QUESTIONS;
  }

  @Query(() => [ReproducedNumber], { description: 'Editors. Fits again from the stored points and compares.' })
  @RolesMay('EDITOR')
  reproduceVersion(@Args('versionId', { type: () => ID }) versionId: string): Promise<ReproducedNumber[]> {
    return this.reviews.reproduce(versionId);
  }

  @Mutation(() => DataSheetVersionPayload, {
    description: 'An editor who neither prepared the version nor submitted one of its series.',
  })
  @RolesMay('EDITOR')
  async recordReview(
    @Args('input', { type: () => RecordReviewInput }) input: RecordReviewInput,
    @CurrentViewer() viewer: Viewer,
  ): Promise<DataSheetVersionPayload> {
    return toVersionPayload(await this.reviews.record(input, viewer));
  }

  @ResolveField(() => Person)
  reviewer(@Parent() review: Review, @Context() context: object): Promise<Person> {
    return loaderFor(context, this.people.byIds).load(review.reviewerId);
  }
}

@Resolver(() => DataSheetVersion)
export class VersionReviewsResolver {
  constructor(
    private readonly reviewsService: ReviewsService,
    private readonly people: PeopleService,
  ) {}

  @ResolveField(() => [Person])
  async reviewedBy(@Parent() version: DataSheetVersion, @Context() context: object): Promise<Person[]> {
    const reviews = await loaderFor(context, this.reviewsService.byVersions).load(version.id);
    const ids = [...new Set(approvalsInForce(reviews).map((review) => review.reviewerId))];
    const loader = loaderFor(context, this.people.byIds);
    return Promise.all(ids.map((id) => loader.load(id)));
  }

  @ResolveField(() => [Review], { description: 'Verdicts, oldest first; for members of the group.' })
  async reviews(
    @Parent() version: DataSheetVersion,
    @Context() context: object,
    @CurrentViewer() viewer: Viewer | null,
  ): Promise<Review[]> {
    return isOfTheGroup(viewer) ? loaderFor(context, this.reviewsService.byVersions).load(version.id) : [];
  }
}
