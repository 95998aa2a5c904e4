import { Field, Float, ID, InputType, Int } from '@nestjs/graphql';
import { type ConstantKind, type EquationForm } from '../numerics/estimates/constant-kinds.js';
import { SubstanceConstantKind, SubstanceEquationForm } from './substance.entity.js';

@InputType({
  isOneOf: true,
  description:
    'Names one substance: exactly one field is given. `name` matches a name, formula or synonym without regard to case.',
})
export class SubstanceRef {
  @Field(() => ID, { nullable: true })
  id?: string;
  @Field(() => String, { nullable: true })
  casNumber?: string;
  @Field(() => String, { nullable: true })
  name?: string;
}

@InputType()
export class CoefficientInput {
  @Field()
  symbol: string;
  @Field(() => Float)
  value: number;
}

@InputType({ description: 'Same fields and units as SubstanceConstant.' })
export class SubstanceConstantInput {
  @Field(() => SubstanceConstantKind)
  kind: ConstantKind;
  @Field(() => Float, { nullable: true })
  value?: number | null;
  @Field(() => SubstanceEquationForm, { nullable: true })
  form?: EquationForm | null;
  @Field(() => [CoefficientInput], { nullable: true })
  coefficients?: CoefficientInput[] | null;
  @Field()
  unit: string;
  @Field(() => Float, { nullable: true })
  temperatureMinimum?: number | null;
  @Field(() => Float, { nullable: true })
  temperatureMaximum?: number | null;
  @Field(() => Float, { nullable: true })
  relativeUncertainty?: number | null;
  @Field()
  source: string;
  @Field(() => String, { nullable: true })
  note?: string | null;
}

@InputType()
export class SubstanceInput {
  @Field()
  name: string;
  @Field()
  formula: string;
  @Field(() => [String], { nullable: true })
  synonyms?: string[] | null;
  @Field(() => String, { nullable: true })
  casNumber?: string | null;
  @Field(() => String, { nullable: true })
  inchi?: string | null;
  @Field(() => Float, { description: 'kg/mol' })
  molarMass: number;
  @Field(() => [SubstanceConstantInput], { nullable: true })
  constants?: SubstanceConstantInput[] | null;
}

@InputType()
export class UpdateSubstanceInput extends SubstanceInput {
  @Field(() => ID)
  id: string;
  @Field(() => Int, { description: 'The count of changes the editor was looking at; CONFLICT when it has grown.' })
  lockVersion: number;
}
