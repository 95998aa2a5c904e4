/** What a substance's constants may be, in which unit each is kept, and the equations of those that depend on temperature. */

/** A kind of constant: its name in words, its usual symbol and its UCUM unit. */
interface ConstantKindInfo {
  readonly label: string;
  readonly symbol: string;
  readonly unit: string;
}

/** The closed list of constants. Each kind has one unit, so that two constants of a kind can always be compared. */
export const CONSTANT_KINDS = {
  DIFFUSION_VOLUME: { label: 'Diffusion volume', symbol: 'Σv', unit: '1' },
  LENNARD_JONES_DIAMETER: { label: 'Collision diameter', symbol: 'σ', unit: 'nm' },
  LENNARD_JONES_DEPTH: { label: 'Well depth', symbol: 'ε/k', unit: 'K' },
  WILKE_LEE_DIAMETER: { label: 'Collision diameter of Wilke–Lee', symbol: 'σ', unit: 'nm' },
  WILKE_LEE_DEPTH: { label: 'Well depth of Wilke–Lee', symbol: 'ε/k', unit: 'K' },
  NORMAL_BOILING_POINT: { label: 'Normal boiling point', symbol: 'T_b', unit: 'K' },
  LIQUID_MOLAR_VOLUME_AT_BOILING_POINT: { label: 'Volume at boiling point', symbol: 'V_b', unit: 'cm3/mol' },
  VAPOUR_PRESSURE: { label: 'Vapour pressure', symbol: 'p_sat', unit: 'Pa' },
  LIQUID_DENSITY: { label: 'Liquid density', symbol: 'ρ_L', unit: 'kg/m3' },
  LIQUID_MOLAR_DENSITY: { label: 'Molar density of the liquid', symbol: 'c_L', unit: 'mol/m3' },
  ENTHALPY_OF_VAPORISATION: { label: 'Enthalpy of vaporisation', symbol: 'ΔH_vap', unit: 'J/mol' },
  FLASH_POINT: { label: 'Flash point', symbol: 'T_flash', unit: 'K' },
  LOWER_FLAMMABLE_LIMIT: { label: 'Lower flammable limit, volume fraction in air', symbol: 'LFL', unit: '1' },
  UPPER_FLAMMABLE_LIMIT: { label: 'Upper flammable limit, volume fraction in air', symbol: 'UFL', unit: '1' },
  EXPOSURE_LIMIT_TIME_WEIGHTED: { label: 'Exposure limit, working day', symbol: 'TWA', unit: '[ppm]' },
  EXPOSURE_LIMIT_SHORT_TERM: { label: 'Exposure limit, short term', symbol: 'STEL', unit: '[ppm]' },
} as const satisfies Record<string, ConstantKindInfo>;

export type ConstantKind = keyof typeof CONSTANT_KINDS;

/** Equations in T, and the names of their coefficients. The expressions stand in constant-equations.ts. */
export const EQUATION_COEFFICIENTS = {
  ANTOINE: ['A', 'B', 'C'],
  WAGNER: ['A', 'B', 'C', 'D', 'criticalPressure', 'criticalTemperature'],
  FIVE_TERM: ['C1', 'C2', 'C3', 'C4', 'C5'],
  RACKETT: ['C1', 'C2', 'C3', 'C4'],
  TAU_POWERS: ['A', 'B', 'C', 'D', 'criticalDensity', 'criticalTemperature'],
} as const satisfies Record<string, readonly string[]>;

export type EquationForm = keyof typeof EQUATION_COEFFICIENTS;

interface ConstantOrigin {
  readonly kind: ConstantKind;
  /** UCUM, the unit of the kind */
  readonly unit: string;
  /** K; absent where the constant does not depend on temperature */
  readonly temperatureMinimumK?: number | undefined;
  readonly temperatureMaximumK?: number | undefined;
  /** Standard, of the value; absent where the source gives none and none was found by comparison */
  readonly relativeUncertainty?: number | undefined;
  /** Full citation */
  readonly source: string;
  readonly note?: string | undefined;
}

/** A constant that is one number. */
export interface ConstantValue extends ConstantOrigin {
  readonly value: number;
}

/** A constant that is an equation in T; of several of one kind the first is the one in use. */
export interface ConstantEquation extends ConstantOrigin {
  readonly form: EquationForm;
  readonly coefficients: Readonly<Record<string, number>>;
}

export type SubstanceConstant = ConstantValue | ConstantEquation;

/** The first value of `kind`, in the kind's unit; undefined where there is none. */
export function valueOf(constants: readonly SubstanceConstant[], kind: ConstantKind): number | undefined {
  for (const constant of constants) {
    if (constant.kind === kind && 'value' in constant) return constant.value;
  }
  return undefined;
}

/** The equations of `kind` in their order; the first is the one in use. */
export function equationsOf(constants: readonly SubstanceConstant[], kind: ConstantKind): readonly ConstantEquation[] {
  return constants.filter((constant): constant is ConstantEquation => constant.kind === kind && 'form' in constant);
}
