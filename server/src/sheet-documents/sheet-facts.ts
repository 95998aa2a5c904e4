import type { Estimate } from '../numerics/estimates/estimates.js';
import type { EvaluableCorrelation, FitRecipe, FitStatistics } from '../numerics/fitting/fit.types.js';

export type VersionStatusName =
  'DRAFT' | 'IN_REVIEW' | 'RETURNED' | 'APPROVED' | 'RELEASED' | 'SUPERSEDED' | 'WITHDRAWN';

export interface SubstanceFacts {
  readonly name: string;
  readonly formula: string;
  readonly casNumber: string | null;
  /** kg/mol */
  readonly molarMass: number;
  /** Whole sentences */
  readonly cautions: readonly string[];
}

/** Points of a series as columns of equal length, SI; null where the source states nothing. */
export interface PointColumns {
  readonly temperatures: readonly number[];
  readonly pressures: readonly number[];
  readonly pressureOrigins: readonly ('STATED' | 'ASSIGNED' | 'REDUCED_BY_SOURCE')[];
  readonly diffusivities: readonly number[];
  /** Standard uncertainties independent from point to point */
  readonly diffusivityUncertainties: readonly (number | null)[];
  readonly uncertaintyOrigins: readonly ('STATED' | 'ASSIGNED' | null)[];
  readonly temperatureUncertainties: readonly (number | null)[];
  readonly pressureUncertainties: readonly (number | null)[];
  /** Of the first substance */
  readonly moleFractions: readonly (number | null)[];
  readonly replicates: readonly (number | null)[];
}

export interface ExclusionFacts {
  /** Index of the point in the columns */
  readonly index: number;
  readonly reason: string;
}

export interface SeriesFacts {
  /** Place of the series among all series of the pair, from 0; gives its letter, colour and shape. */
  readonly ordinal: number;
  readonly title: string;
  readonly source: string;
  readonly method: string;
  readonly apparatus: string | null;
  readonly dataOrigin: 'TABLE' | 'GRAPH' | 'SMOOTHED' | 'EQUATION' | 'TUBE_RUN';
  readonly commonRelativeUncertainty: number | null;
  readonly points: PointColumns;
  readonly excluded: readonly ExclusionFacts[];
  /** Mean deviation of ln D from the correlation, and its standard uncertainty; null where the fit gives none. */
  readonly offset: { readonly value: number; readonly standardUncertainty: number } | null;
  /** Why the whole series was left out; null where it carried weight. */
  readonly leftOutBecause: string | null;
}

export interface FitFacts {
  /** Number of the fit among those of the pair */
  readonly number: number;
  /** ISO 8601 */
  readonly createdAt: string;
  readonly engineVersion: string;
  readonly recipe: FitRecipe;
  readonly statistics: FitStatistics;
}

/** The estimates of the pair at one state; fewer where a method does not reach it. */
export type EstimatesAt = (state: { readonly temperature: number; readonly pressure: number }) => readonly Estimate[];

/** How the version stands today. */
export interface StandingFacts {
  readonly status: VersionStatusName;
  readonly contentHash: string | null;
  readonly previousHash: string | null;
  readonly supersededBy: string | null;
  /** ISO 8601 */
  readonly withdrawnAt: string | null;
  readonly withdrawalReason: string | null;
}

/** A version of the sheet, for the list of versions. */
export interface VersionFacts {
  readonly number: string;
  readonly status: VersionStatusName;
  /** ISO 8601 */
  readonly releasedAt: string | null;
  /** ISO 8601 */
  readonly withdrawnAt: string | null;
  readonly summary: string;
  readonly changeNote: string | null;
}

/** All that a version's content is made from. Times are ISO 8601, quantities SI. */
export interface SheetFacts {
  /** DS-0042 */
  readonly code: string;
  /** edition.revision */
  readonly number: string;
  readonly substances: readonly [SubstanceFacts, SubstanceFacts];
  readonly correlation: EvaluableCorrelation;
  readonly fit: FitFacts;
  /** Those used and those left out, in the order of their ordinals */
  readonly series: readonly SeriesFacts[];
  readonly estimates: EstimatesAt;
  readonly words: {
    readonly summary: string;
    readonly changeNote: string | null;
    /** By section: correlation, figures, recommended, series, estimates, uncertainty, cautions, citation, versions */
    readonly remarks: Readonly<Record<string, string>>;
  };
  readonly people: {
    readonly preparedBy: string;
    readonly reviewedBy: readonly string[];
    readonly releasedBy: string | null;
  };
  readonly releasedAt: string | null;
  readonly doi: string | null;
  /** Number of the version that this one replaces or will replace */
  readonly replaces: string | null;
  readonly standing: StandingFacts;
  /** Newest first, this one included */
  readonly versions: readonly VersionFacts[];
}
