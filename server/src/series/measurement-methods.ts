/** The methods by which gas diffusivities are measured, and how well each usually does: the one place that knows. */

/** A method of measurement. */
export interface MeasurementMethod {
  readonly code: string;
  /** As the trade says */
  readonly name: string;
  /** Usual relative standard uncertainty of D, for points whose source states none */
  readonly relativeUncertainty: number;
  /** Of the uncertainty */
  readonly source: string;
  /** Phrases by which free text names the method: lower case, blanks for hyphens */
  readonly phrases: readonly string[];
}

/** What a point of unstated uncertainty is given; always flagged as assigned. */
export interface UsualUncertainty {
  /** u(D)/D */
  readonly value: number;
  readonly source: string;
}

const COMMON_PRACTICE = 'common practice, no source';
const RICHARDSON =
  'Richardson, J. F. Chem. Eng. Sci. 1959, 10, 234–242: acetone, carbon tetrachloride and water vapours in air by the evaporation tube to within ±2 %';
const FULLER =
  'Fuller, E. N.; Schettler, P. D.; Giddings, J. C. Ind. Eng. Chem. 1966, 58 (5), 18–27: typical experimental error of the compiled data of the order of 5 %';

/** In the order in which free text is searched: what names a method more closely stands before what names it loosely. */
export const MEASUREMENT_METHODS: readonly MeasurementMethod[] = [
  {
    code: 'UNSTEADY_EVAPORATION',
    name: 'unsteady evaporation',
    relativeUncertainty: 0.03,
    source: COMMON_PRACTICE,
    phrases: ['unsteady evaporation', 'unsteady state evaporation', 'transient evaporation'],
  },
  {
    code: 'EVAPORATION_TUBE',
    name: 'evaporation tube (Arnold cell)',
    relativeUncertainty: 0.02,
    source: RICHARDSON,
    phrases: ['evaporation tube', 'evaporating liquid', 'arnold', 'stefan', 'winkelmann', 'evaporation'],
  },
  {
    code: 'SUBLIMATION_TUBE',
    name: 'sublimation tube',
    relativeUncertainty: 0.03,
    source: COMMON_PRACTICE,
    phrases: ['sublimation', 'subliming'],
  },
  {
    code: 'INTERFEROMETRY',
    name: 'optical interferometry',
    relativeUncertainty: 0.01,
    source: COMMON_PRACTICE,
    phrases: ['interferomet', 'holograph'],
  },
  {
    code: 'LOSCHMIDT_TUBE',
    name: 'Loschmidt tube',
    relativeUncertainty: 0.01,
    source: COMMON_PRACTICE,
    phrases: ['loschmidt'],
  },
  {
    code: 'CLOSED_TUBE',
    name: 'closed tube',
    relativeUncertainty: 0.01,
    source: COMMON_PRACTICE,
    phrases: ['closed tube'],
  },
  {
    code: 'TWO_BULB_CELL',
    name: 'two-bulb cell',
    relativeUncertainty: 0.015,
    source: COMMON_PRACTICE,
    phrases: ['two bulb', 'twin bulb', 'double bulb', '2 bulb'],
  },
  {
    code: 'POINT_SOURCE',
    name: 'point source',
    relativeUncertainty: 0.03,
    source: COMMON_PRACTICE,
    phrases: ['point source'],
  },
  {
    code: 'PEAK_BROADENING',
    name: 'gas chromatography, peak broadening',
    relativeUncertainty: 0.02,
    source: COMMON_PRACTICE,
    phrases: [
      'peak broadening',
      'chromatograph',
      'taylor dispersion',
      'arrested flow',
      'stopped flow',
      'reversed flow',
    ],
  },
  {
    code: 'DIFFUSION_BRIDGE',
    name: 'diffusion bridge',
    relativeUncertainty: 0.03,
    source: COMMON_PRACTICE,
    phrases: ['diffusion bridge', 'diaphragm', 'porous plug', 'porous plate'],
  },
  {
    code: 'OPEN_TUBE',
    name: 'open tube',
    relativeUncertainty: 0.03,
    source: COMMON_PRACTICE,
    phrases: ['open tube'],
  },
  {
    code: 'BACK_DIFFUSION',
    name: 'back diffusion',
    relativeUncertainty: 0.03,
    source: COMMON_PRACTICE,
    phrases: ['back diffusion'],
  },
  {
    code: 'CAPILLARY_LEAK',
    name: 'capillary leak',
    relativeUncertainty: 0.03,
    source: COMMON_PRACTICE,
    phrases: ['capillary leak'],
  },
  {
    code: 'DISSOCIATED_GAS',
    name: 'dissociated gas',
    relativeUncertainty: 0.1,
    source: COMMON_PRACTICE,
    phrases: ['dissociat', 'atom recombination'],
  },
];

/** For a method that no phrase names. */
export const UNKNOWN_METHOD: UsualUncertainty = { value: 0.05, source: FULLER };

/** The method that free text names; null where it names none of them. */
export function methodNamed(methodText: string): MeasurementMethod | null {
  const words = methodText.toLowerCase().replace(/[\s\-‐‑–_]+/g, ' ');
  return MEASUREMENT_METHODS.find(({ phrases }) => phrases.some((phrase) => words.includes(phrase))) ?? null;
}

/** Usual relative standard uncertainty of D for the method that free text names; 5 % where it names none. */
export function usualRelativeUncertainty(methodText: string): UsualUncertainty {
  const method = methodNamed(methodText);
  return method ? { value: method.relativeUncertainty, source: method.source } : UNKNOWN_METHOD;
}
