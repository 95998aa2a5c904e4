import type { EvaluableCorrelation } from '../numerics/fitting/fit.types.js';
import type { SheetContent } from '../sheet-documents/sheet-content.types.js';
import type { StandingFacts, VersionFacts } from '../sheet-documents/sheet-facts.js';

/** A version of a sheet as it is given out. */
export interface ReadableVersion {
  readonly code: string;
  readonly number: string;
  /** With the way it stands today */
  readonly content: SheetContent;
  readonly correlation: EvaluableCorrelation;
  readonly standing: StandingFacts;
  readonly versions: readonly VersionFacts[];
  readonly isReleased: boolean;
  readonly versionId: string;
  /** Counts the changes of the version, of its standing too */
  readonly changes: number;
}
