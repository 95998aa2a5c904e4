import { Field, ObjectType, registerEnumType } from '@nestjs/graphql';
import { DataSheetVersion } from '../data-sheets/data-sheet-version.entity.js';
import { Series } from '../series/series.entity.js';

/** What somebody may be waited for. */
export enum TaskKind {
  FINISH_SERIES = 'FINISH_SERIES',
  MEND_SERIES = 'MEND_SERIES',
  ACCEPT_SERIES = 'ACCEPT_SERIES',
  SUBMIT_VERSION = 'SUBMIT_VERSION',
  MEND_VERSION = 'MEND_VERSION',
  REVIEW_VERSION = 'REVIEW_VERSION',
  RELEASE_VERSION = 'RELEASE_VERSION',
}
registerEnumType(TaskKind, { name: 'TaskKind' });

@ObjectType({ description: 'A series or version that waits for somebody.' })
export class Task {
  @Field(() => TaskKind)
  kind: TaskKind;
  @Field()
  since: Date;
  @Field(() => Series, { nullable: true })
  series: Series | null;
  @Field(() => DataSheetVersion, { nullable: true })
  version: DataSheetVersion | null;
  @Field(() => String, { nullable: true, description: 'What was said at the last change of state.' })
  remark: string | null;
}

@ObjectType({ description: 'What waits for the person signed in, and what that person waits for.' })
export class Home {
  @Field(() => [Task], { description: 'Waits for the person; oldest first.' })
  tasks: Task[];
  @Field(() => [Task], { description: "The person's own, waiting for others; oldest first." })
  waiting: Task[];
}
