import { Field, ObjectType, registerEnumType } from '@nestjs/graphql';

/** How a run of text is set. Quantities are italic; units, numbers and labels are upright. */
export const TextStyle = {
  PLAIN: 'PLAIN',
  STRONG: 'STRONG',
  QUANTITY: 'QUANTITY',
  SUBSCRIPT: 'SUBSCRIPT',
  SUPERSCRIPT: 'SUPERSCRIPT',
} as const;
export type TextStyle = keyof typeof TextStyle;
registerEnumType(TextStyle, {
  name: 'TextStyle',
  description: 'How a run of text is set: quantities are italic, units, numbers and labels upright.',
});

@ObjectType({ description: 'A piece of text in one style. The runs of a text, joined, are its plain reading.' })
export class TextRun {
  @Field()
  readonly text: string;
  @Field(() => TextStyle)
  readonly style: TextStyle;
}

@ObjectType({
  description:
    'One piece of a displayed equation, read from left to right: either `runs`, or a fraction with `numerator` and `denominator`.',
})
export class EquationPiece {
  @Field(() => [TextRun], { description: 'Empty for a fraction.' })
  readonly runs: TextRun[];
  @Field(() => [TextRun], { nullable: true, description: 'Null where the piece is no fraction.' })
  readonly numerator: TextRun[] | null;
  @Field(() => [TextRun], { nullable: true, description: 'Null where the piece is no fraction.' })
  readonly denominator: TextRun[] | null;
  @Field({ description: 'The piece stands in round brackets.' })
  readonly bracketed: boolean;
  @Field(() => [TextRun], { nullable: true, description: 'Exponent of the whole piece, null where there is none.' })
  readonly exponent: TextRun[] | null;
}
