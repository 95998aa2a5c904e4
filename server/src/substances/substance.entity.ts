import { Field, Float, ID, Int, ObjectType, registerEnumType } from '@nestjs/graphql';
import { Column, CreateDateColumn, Entity, PrimaryGeneratedColumn, VersionColumn } from 'typeorm';
import { Node } from '../common/graphql/node.js';
import {
  CONSTANT_KINDS,
  type ConstantKind,
  EQUATION_COEFFICIENTS,
  type EquationForm,
} from '../numerics/estimates/constant-kinds.js';

const enumOf = <Name extends string>(table: Record<Name, unknown>) =>
  Object.fromEntries(Object.keys(table).map((name) => [name, name])) as { [N in Name]: N };

export const SubstanceConstantKind = enumOf(CONSTANT_KINDS);
registerEnumType(SubstanceConstantKind, { name: 'SubstanceConstantKind' });

export const SubstanceEquationForm = enumOf(EQUATION_COEFFICIENTS);
registerEnumType(SubstanceEquationForm, {
  name: 'SubstanceEquationForm',
  description: 'Equations in T, by their usual names.',
});

@ObjectType({ description: 'One coefficient of an equation, SI.' })
export class Coefficient {
  @Field()
  symbol: string;
  @Field(() => Float)
  value: number;
}

@ObjectType({ description: 'One constant or equation of a substance, with its range and source.' })
export class SubstanceConstant {
  @Field(() => SubstanceConstantKind)
  kind: ConstantKind;
  @Field(() => Float, { nullable: true, description: 'In `unit`; null for an equation.' })
  value: number | null;
  @Field(() => SubstanceEquationForm, { nullable: true, description: 'Of an equation in T; null for a plain value.' })
  form: EquationForm | null;
  @Field(() => [Coefficient], { description: 'Of the equation; none for a plain value.' })
  coefficients: Coefficient[];
  @Field({ description: 'UCUM code of the value, or of what the equation gives.' })
  unit: string;
  @Field(() => Float, { nullable: true, description: 'K' })
  temperatureMinimum: number | null;
  @Field(() => Float, { nullable: true, description: 'K' })
  temperatureMaximum: number | null;
  @Field(() => Float, { nullable: true, description: 'Relative standard uncertainty, where the source states one.' })
  relativeUncertainty: number | null;
  @Field()
  source: string;
  @Field(() => String, { nullable: true })
  note: string | null;
}

@ObjectType({ description: 'One component of a mixture bath.' })
export class BathComponent {
  @Field()
  casNumber: string;
  @Field(() => Float)
  moleFraction: number;
}

@ObjectType({ description: 'A usual caution, deferring to local codes and licensed practice.' })
export class Caution {
  @Field()
  text: string;
  @Field()
  source: string;
}

@Entity({ name: 'substances' })
@ObjectType({ implements: () => [Node] })
export class Substance implements Node {
  @PrimaryGeneratedColumn('uuid', { primaryKeyConstraintName: 'pk_substances' })
  @Field(() => ID)
  id: string;

  @Column('text')
  @Field({ description: 'English name: helium, argon, water' })
  name: string;

  @Column('text')
  @Field()
  formula: string;

  @Column('text', { array: true, default: [] })
  @Field(() => [String])
  synonyms: string[];

  @Column('text', { name: 'cas_number', nullable: true })
  @Field(() => String, {
    nullable: true,
    description: 'CAS Registry Number with a valid check digit; null where none is assigned.',
  })
  casNumber: string | null;

  @Column('text', { nullable: true })
  @Field(() => String, { nullable: true })
  inchi: string | null;

  @Column('double precision', { name: 'molar_mass_kg_mol' })
  @Field(() => Float, { description: 'kg/mol' })
  molarMass: number;

  @Column('jsonb', { default: [] })
  @Field(() => [SubstanceConstant])
  constants: SubstanceConstant[];

  @Column('jsonb', { nullable: true })
  @Field(() => [BathComponent], {
    nullable: true,
    description: 'Of a mixture bath such as air; null for a pure substance.',
  })
  composition: BathComponent[] | null;

  @Column('jsonb', { default: [] })
  @Field(() => [Caution])
  cautions: Caution[];

  @Column('uuid', { name: 'created_by_id', nullable: true })
  createdById: string | null;

  @VersionColumn({ name: 'lock_version', default: 1 })
  @Field(() => Int, { description: 'Counts changes; an update names the one it was made from.' })
  lockVersion: number;

  @CreateDateColumn({ name: 'created_at', type: 'timestamptz' })
  createdAt: Date;
}
