import { Field, Int, ObjectType } from '@nestjs/graphql';
import { TextRun } from './typeset.types.js';

@ObjectType({ description: 'A numbered section of the sheet' })
export class SheetSection {
  @Field({ description: 'correlation, figures, recommended, series, estimates, cautions, citation, versions' })
  readonly id: string;
  @Field(() => Int)
  readonly number: number;
  @Field()
  readonly title: string;
}

@ObjectType({ description: 'The editor’s remark on one section, in plain words' })
export class SheetRemark {
  @Field({ description: 'SheetSection.id' })
  readonly section: string;
  @Field()
  readonly text: string;
}

@ObjectType({
  description:
    'How the version stands today. The only part of a released sheet that may change, because it is no part of what was released.',
})
export class SheetStanding {
  @Field({ description: 'VersionStatus' })
  readonly status: string;
  @Field({ description: 'draft, in review, returned, approved, released, superseded, withdrawn' })
  readonly word: string;
  @Field(() => String, { nullable: true, description: 'What stands above the title where the version is not current' })
  readonly banner: string | null;
  @Field(() => String, {
    nullable: true,
    description: 'Word behind the text where the version was never released, or is withdrawn',
  })
  readonly watermark: string | null;
  @Field(() => String, { nullable: true, description: 'Number of the version that took its place' })
  readonly supersededBy: string | null;
  @Field(() => String, { nullable: true, description: 'ISO 8601' })
  readonly withdrawnAt: string | null;
  @Field(() => String, { nullable: true })
  readonly withdrawalReason: string | null;
  @Field(() => String, { nullable: true, description: 'Lower-case hex SHA-256 of the snapshot; null until released' })
  readonly contentHash: string | null;
  @Field(() => String, { nullable: true, description: 'Hash of the release before this one in the whole service' })
  readonly previousHash: string | null;
}

@ObjectType({ description: 'How to cite the version' })
export class SheetCitation {
  @Field(() => [TextRun], { description: 'Title in the quantity (italic) style' })
  readonly runs: TextRun[];
  @Field({ description: 'The same in plain text' })
  readonly plain: string;
  @Field(() => String, { nullable: true })
  readonly doi: string | null;
}

@ObjectType({ description: 'A version of the sheet in the list of versions' })
export class SheetVersionRow {
  @Field()
  readonly number: string;
  @Field({ description: 'VersionStatus' })
  readonly status: string;
  @Field({ description: 'Its state in words' })
  readonly word: string;
  @Field(() => String, { nullable: true, description: 'ISO 8601; of the release or the withdrawal, null before' })
  readonly date: string | null;
  @Field({ description: '4 November 2026; empty before release' })
  readonly datePrinted: string;
  @Field({ description: 'What changed; the summary for the first version' })
  readonly change: string;
  @Field({ description: 'The version this content describes' })
  readonly isThis: boolean;
}

@ObjectType({ description: 'A line of the margin: what, and who or when or where' })
export class MarginEntry {
  @Field(() => [TextRun])
  readonly label: TextRun[];
  @Field()
  readonly value: string;
}

@ObjectType({ description: 'What stands in the margin: state and people, and where the numbers came from' })
export class SheetMargin {
  @Field({ description: 'Number of the fit among those of the pair, for its label' })
  readonly fitNumber: string;
  @Field(() => [MarginEntry], { description: 'State, version, range, dates, people' })
  readonly entries: MarginEntry[];
  @Field(() => [[TextRun]], { description: 'Beside the correlation: the fit and how it was made' })
  readonly fit: TextRun[][];
  @Field(() => [[TextRun]], { description: 'Beside the figures' })
  readonly figures: TextRun[][];
  @Field(() => [[TextRun]], { description: 'Beside the series' })
  readonly series: TextRun[][];
}
