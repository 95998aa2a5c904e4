import { type DemoPair, type DemoSeries } from './demo.types.js';
import { type DiffusivityLaw, type LaboratoryHabits, measure } from './invented-laboratory.js';

type Told = Pick<DemoSeries, 'title' | 'source' | 'method' | 'apparatus' | 'commonRelativeUncertainty' | 'owner'>;
type Usual = Pick<DemoSeries, 'dataOrigin' | 'sameDataAs' | 'fate' | 'remark'>;
type Habits = Omit<LaboratoryHabits, 'law' | 'pressures' | 'biasOfExponent'>;

/** A series to be invented: what is told of it, and how its laboratory measures. */
export interface SeriesPlan extends Told, Partial<Usual>, Habits {
  readonly letter: string;
  /** Pa; 101.3 kPa when absent */
  readonly pressures?: readonly number[];
  readonly biasOfExponent?: number;
}

/** Name of a series in the scenario: the pair and the letter. */
export function seriesKey({ a, b }: DemoPair, letter: string): string {
  return `${a} ${b} ${letter}`.replaceAll(' ', '-');
}

/** The series of one pair, measured under its law; accepted tables unless the plan says otherwise. */
export function seriesOf(pair: DemoPair, law: DiffusivityLaw, plans: readonly SeriesPlan[]): DemoSeries[] {
  return plans.map((plan) => ({
    ...pair,
    key: seriesKey(pair, plan.letter),
    title: plan.title,
    source: plan.source,
    method: plan.method,
    apparatus: plan.apparatus,
    dataOrigin: plan.dataOrigin ?? 'TABLE',
    commonRelativeUncertainty: plan.commonRelativeUncertainty,
    sameDataAs: plan.sameDataAs ?? null,
    owner: plan.owner,
    points: measure({ pressures: [101_300], biasOfExponent: 0, ...plan, law }),
    fate: plan.fate ?? 'accepted',
    remark: plan.remark ?? null,
  }));
}
