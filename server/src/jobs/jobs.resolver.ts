import { Args, Field, ID, Int, ObjectType, Query, Resolver } from '@nestjs/graphql';
import { RolesMay } from '../common/access.decorators.js';
import { LARGEST_PAGE, pageOf } from '../common/graphql/connection.js';
import { type FailedJob, JobsService, type QueueCount } from './jobs.service.js';

@ObjectType('JobQueue', { description: 'How many jobs of one kind there are.' })
class JobQueueType implements QueueCount {
  @Field()
  readonly queue: string;
  @Field(() => Int)
  readonly waiting: number;
  @Field(() => Int)
  readonly active: number;
  @Field(() => Int)
  readonly completed: number;
  @Field(() => Int)
  readonly failed: number;
}

@ObjectType('FailedJob', { description: 'A job that failed for good, after all its retries.' })
class FailedJobType implements FailedJob {
  @Field(() => ID)
  readonly id: string;
  @Field()
  readonly queue: string;
  @Field()
  readonly failedAt: Date;
  @Field(() => Int)
  readonly attempts: number;
  @Field()
  readonly reason: string;
}

@ObjectType()
class Jobs {
  @Field(() => [JobQueueType])
  readonly queues: QueueCount[];
  @Field(() => [FailedJobType], { description: 'The newest first.' })
  readonly failures: FailedJob[];
}

@Resolver()
export class JobsResolver {
  constructor(private readonly jobsService: JobsService) {}

  @Query(() => Jobs, { description: 'Administrators.' })
  @RolesMay('ADMINISTRATOR')
  async jobs(
    @Args('failures', { type: () => Int, nullable: true, defaultValue: 20, description: `At most ${LARGEST_PAGE}.` })
    failures: number | null,
  ): Promise<Jobs> {
    const { limit } = pageOf(failures, null, 20);
    const [queues, newest] = await Promise.all([this.jobsService.counts(), this.jobsService.failures(limit)]);
    return { queues, failures: newest };
  }
}
