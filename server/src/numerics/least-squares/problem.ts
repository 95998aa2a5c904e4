/** A nonlinear least-squares problem: minimise Σ ((observed − model)/σ)². */
export interface LeastSquaresProblem {
  /** Length m */
  readonly observed: Float64Array;
  /** Standard deviations σ, length m, > 0; null for equal weights */
  readonly deviations: Float64Array | null;
  readonly parameterCount: number;
  /** Indices of the parameters the model is linear in while the others are held; may be empty */
  readonly linear: readonly number[];
  /** Writes the m values of the model into `into`. */
  model(parameters: Float64Array, into: Float64Array): void;
  /** Writes ∂ model/∂ parameters, column-major m×n, into `into`. */
  jacobian(parameters: Float64Array, into: Float64Array): void;
}

export interface LeastSquaresSolution {
  readonly parameters: Float64Array;
  /** Σ ((observed − model)/σ)² */
  readonly sumOfSquares: number;
  /** m − n */
  readonly degreesOfFreedom: number;
  /** (JᵀWJ)⁻¹, to be multiplied by the residual variance where σ is not taken as known */
  readonly unscaledCovariance: number[][];
  /** Bates & Watts' relative offset at the solution */
  readonly relativeOffset: number;
  /** Condition number of the column-scaled Jacobian, in the Frobenius norm: at least the ratio of its singular values */
  readonly condition: number;
}

/** Whitens a problem: model and Jacobian are divided by σ, so that the solvers see unit variances only. */
export class WhitenedProblem {
  readonly observed: Float64Array;
  readonly count: number;
  readonly parameterCount: number;
  /** Length of `observed` */
  readonly norm: number;
  private readonly reciprocals: Float64Array | null;

  constructor(private readonly problem: LeastSquaresProblem) {
    this.count = problem.observed.length;
    this.parameterCount = problem.parameterCount;
    this.reciprocals = problem.deviations?.map((deviation) => 1 / deviation) ?? null;
    this.observed = problem.observed.map((value, i) => value * (this.reciprocals?.[i] ?? 1));
    this.norm = Math.sqrt(this.observed.reduce((sum, value) => sum + value * value, 0));
  }

  /** Writes observed − model, whitened, into `into` and returns the sum of squares; NaN or Infinity where undefined. */
  residuals(parameters: Float64Array, into: Float64Array): number {
    this.problem.model(parameters, into);
    let sum = 0;
    for (let i = 0; i < this.count; i++) {
      const residual = this.observed[i]! - (this.reciprocals ? into[i]! * this.reciprocals[i]! : into[i]!);
      into[i] = residual;
      sum += residual * residual;
    }
    return sum;
  }

  /** Writes the whitened Jacobian of the model, column-major. */
  jacobian(parameters: Float64Array, into: Float64Array): void {
    this.problem.jacobian(parameters, into);
    if (!this.reciprocals) return;
    for (let start = 0; start < into.length; start += this.count) {
      for (let i = 0; i < this.count; i++) into[start + i]! *= this.reciprocals[i]!;
    }
  }
}
