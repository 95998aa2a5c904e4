import { Field, Float, ID, InputType, Int } from '@nestjs/graphql';

@InputType()
export class DraftDataSheetInput {
  @Field(() => ID)
  fitId: string;
  @Field()
  summary: string;
  @Field(() => String, { nullable: true })
  changeNote?: string | null;
}

@InputType({ description: 'Words of the editor for one section of the sheet.' })
export class SectionRemarkInput {
  @Field({
    description: 'correlation, figures, recommended, series, estimates, uncertainty, cautions, citation or versions',
  })
  section: string;
  @Field()
  text: string;
}

@InputType({ description: 'A range in P that the editor states, with the reason.' })
export class StatedPressureRangeInput {
  @Field(() => Float, { description: 'Pa' })
  minimum: number;
  @Field(() => Float, { description: 'Pa' })
  maximum: number;
  @Field()
  reason: string;
}

@InputType({ description: 'The words of a draft or returned version, whole. Numbers come from the fit.' })
export class UpdateDraftInput {
  @Field(() => ID)
  versionId: string;
  @Field(() => Int, { description: 'The count of changes the editor was looking at; CONFLICT when it has grown.' })
  lockVersion: number;
  @Field()
  summary: string;
  @Field(() => String, { nullable: true })
  changeNote?: string | null;
  @Field(() => [SectionRemarkInput], { nullable: true })
  remarks?: SectionRemarkInput[] | null;
  @Field(() => StatedPressureRangeInput, { nullable: true, description: "Absent: the fit's own." })
  pressureRange?: StatedPressureRangeInput | null;
}
