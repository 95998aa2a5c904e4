import { Field, Float, Int, ObjectType, registerEnumType } from '@nestjs/graphql';
import { type EvaluableCorrelation } from '../numerics/fitting/fit.types.js';

export enum CorrelationForm {
  POWER_LAW = 'POWER_LAW',
  POWER_LAW_FREE_PRESSURE = 'POWER_LAW_FREE_PRESSURE',
  SUTHERLAND = 'SUTHERLAND',
  LOG_QUADRATIC = 'LOG_QUADRATIC',
  THREE_TERM = 'THREE_TERM',
  KINETIC_THEORY = 'KINETIC_THEORY',
}
registerEnumType(CorrelationForm, { name: 'CorrelationForm' });

export enum RangeBasis {
  MEASURED = 'MEASURED',
  STATED = 'STATED',
}
registerEnumType(RangeBasis, { name: 'RangeBasis' });

export enum OutsideRange {
  FLAG = 'FLAG',
  REFUSE = 'REFUSE',
}
registerEnumType(OutsideRange, { name: 'OutsideRange' });

export enum UncertaintyKind {
  MEAN = 'MEAN',
  NEW_SERIES = 'NEW_SERIES',
}
registerEnumType(UncertaintyKind, {
  name: 'UncertaintyKind',
  valuesMap: {
    MEAN: { description: 'of the recommended value' },
    NEW_SERIES: {
      description:
        "of one new laboratory's series (a prediction); without a between-series deviation: error NOT_AVAILABLE",
    },
  },
});

@ObjectType()
export class CorrelationParameter {
  @Field({ description: 'As in METHODS: D0, n, m, S, b, c, s, sigma, epsilon' })
  symbol: string;
  @Field(() => Float)
  value: number;
  @Field(() => Float, { nullable: true, description: 'Null for a parameter fixed by hand.' })
  standardUncertainty: number | null;
  @Field({ description: 'UCUM code; `1` for a pure number. sigma in nm, epsilon (ε/k) in K.' })
  unit: string;
}

@ObjectType()
export class ValidityRange {
  @Field(() => Float, { description: 'K' })
  temperatureMinimum: number;
  @Field(() => Float, { description: 'K' })
  temperatureMaximum: number;
  @Field(() => Float, { description: 'Pa' })
  pressureMinimum: number;
  @Field(() => Float, { description: 'Pa' })
  pressureMaximum: number;
  @Field(() => RangeBasis)
  pressureBasis: RangeBasis | `${RangeBasis}`;
}

@ObjectType()
export class Correlation {
  @Field(() => CorrelationForm)
  form: CorrelationForm | `${CorrelationForm}`;
  @Field({ description: 'Plain-text expression in T (K) and P (Pa), giving D in m²/s, with the numbers in place.' })
  expression: string;
  @Field(() => [CorrelationParameter])
  parameters: CorrelationParameter[];
  @Field(() => [[Float]], { description: 'In the order of the parameters that are not fixed.' })
  covariance: number[][];
  @Field(() => Float, {
    nullable: true,
    description: "ν of Student's t for expanded uncertainties; null when they are known and normal.",
  })
  degreesOfFreedom: number | null;
  @Field(() => Float, { description: 'K' })
  referenceTemperature: number;
  @Field(() => Float, { description: 'Pa' })
  referencePressure: number;
  @Field(() => ValidityRange)
  validity: ValidityRange;
  /** What `evaluate` works on. */
  evaluable: EvaluableCorrelation;
}

@ObjectType()
export class Evaluation {
  @Field(() => Float64Array, { description: 'm²/s' })
  diffusivities: Float64Array;
  @Field(() => Float64Array, { description: 'm²/s' })
  standardUncertainties: Float64Array;
  @Field(() => Float64Array, { description: 'm²/s, at the asked coverage' })
  expandedUncertainties: Float64Array;
  @Field(() => Float, { description: 'k' })
  coverageFactor: number;
  @Field(() => [Int], { description: 'Indices, from 0, of the states outside the validity range.' })
  outside: number[];
}
