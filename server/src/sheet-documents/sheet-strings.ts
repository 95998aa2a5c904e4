/**
 * Every word of the data sheet, for page, PDF and CSV. Mark-up as in typeset.ts. Numbers and names come in as values.
 */
export const sheetStrings = {
  publisher: 'Diffolio',
  pairTitle: '{first} + {second}',
  documentTitle: '{title}: mutual diffusivity, data sheet {code}, version {number}',
  subject: 'Mutual diffusivity of {title} in the dilute gas, {temperature}, {pressure}',
  running: '{title}, version {number}, {state}',
  masthead: 'Data sheet {code}, version {number}, {state}',
  pageOf: 'page {page} of {pages}',

  lead: 'Mutual diffusivity of the dilute gas pair, *D*(*T*, *P*), from {temperature} and {pressure}, fitted to {points} in {series} by {methods}.',
  definition:
    '*D* is the mutual (binary) diffusion coefficient of the two gases at low density, where *D*_{AB}\u00a0=\u00a0*D*_{BA}: the order of the two does not matter.',
  points: ['point', 'points'],
  series: ['series', 'series'],
  methods: ['method of measurement', 'methods of measurement'],
  numbers: ['no', 'one', 'two', 'three', 'four', 'five', 'six', 'seven', 'eight', 'nine', 'ten', 'eleven', 'twelve'],

  sections: {
    correlation: 'Correlation',
    figures: 'Measurements and fit',
    recommended: 'Recommended values',
    series: 'Series used and left out',
    estimates: 'Comparison with estimates',
    uncertainty: 'Uncertainty',
    cautions: 'Cautions',
    citation: 'How to cite',
    versions: 'Versions',
  },

  forms: {
    POWER_LAW: 'Power law of temperature',
    POWER_LAW_FREE_PRESSURE: 'Power law of temperature and pressure',
    SUTHERLAND: 'Sutherland’s form',
    LOG_QUADRATIC: 'Quadratic in ln T',
    THREE_TERM: 'Three terms',
    KINETIC_THEORY: 'Chapman–Enskog with fitted constants',
  },
  spokenPowerLaw: 'D equals D zero times T over T zero to the power n times P zero over P{pressurePower}',
  spokenPressurePower: ' to the power m',
  exact: 'exact',
  fixed: 'fixed by hand',
  betweenSeries: 'between series',
  betweenSeriesAssigned: 'between series, assigned',
  ofTheExponent: 'of the exponent',

  pressureBasis: { MEASURED: 'measured', STATED: 'stated' },
  range: 'The correlation holds from {temperature}, the extent of the points that carried weight, and from {pressure}.',
  rangeStated:
    ' The range in *P* is stated, not measured: all points lie from {points}, and *D P* is taken as constant.',
  rangeMeasured: ' The range in *P* is the extent of the points.',

  recommendedNote:
    'At *P*\u00a0=\u00a0{pressure}. From {range} multiply by ({pressure}/*P*){exponent}; the uncertainty of the factor is that of *P*.',

  figure1:
    'Diffusivity reduced to {pressure} against temperature, both axes logarithmic. Bars are ±*u*, left away where the point hides them; open points carried no weight. Coloured axis: validity range.',
  figure2:
    'Deviation of each point from the fit, in percent, with the estimates behind the points. Bars are ±*u*; an arrow gives the value of a point beyond the scale.',
  figureTitle: 'Figure {number}.',
  figureThinned: ' Of longer series every {nth} point is drawn.',
  figureKeys: {
    fit: 'fit {number}',
    band: '*U* of the recommended value',
    newLaboratory: 'interval for one new laboratory',
    leftOut: '{key}, left out',
    validity: 'validity range',
  },
  axes: {
    diffusivity: '*D* / (cm²/s) at *P*\u00a0=\u00a0{pressure}',
    temperature: '*T* / K',
    deviation: '100 (*D*/*D*(fit) − 1)',
  },

  columns: {
    temperature: '*T*',
    celsius: '*t*',
    diffusivity: '*D*',
    standardUncertainty: '*u*(*D*)',
    expandedUncertainty: '*U*(*D*)',
    relative: '*U*/*D*',
    newLaboratory: 'one new laboratory',
    source: 'Source',
    method: 'Method',
    count: '*n*',
    statedUncertainty: '*u*(*D*)',
    offset: 'offset ± *u*',
    estimate: 'Estimate',
    diffusivityAt: '*D*({temperature})',
    againstFit: 'against fit',
    usualError: 'usual mean error',
    version: 'Version',
    state: 'State',
    date: 'Date',
    change: 'What changed',
    point: 'Series',
    deviation: 'deviation',
    reason: 'Reason',
  },
  leftOut: 'Left out',
  pointsLeftOut: 'Points left out',
  assignedMark: '* the usual value of the method, since the source states none',

  origins: {
    TABLE: 'table',
    GRAPH: 'graph',
    SMOOTHED: 'smoothed table',
    EQUATION: 'equation',
    TUBE_RUN: 'tube runs',
  },

  estimatesNote:
    'Shown for comparison; no estimate took part in the fit. Usual mean error: from the source of each method.',
  noEstimates:
    'No estimate is shown: a constant that the methods need is missing, or they do not reach these temperatures.',

  expanded:
    '*u* is standard uncertainty. *U* is the expanded uncertainty of the recommended value, *U*\u00a0=\u00a0*k\u00a0u* with *k*\u00a0=\u00a0{k}, level of confidence approximately 95\u00a0%{basis}.',
  studentBasis: ' (Student’s *t* with ν\u00a0=\u00a0{degrees})',
  normalBasis: ' (normal distribution)',
  newLaboratory:
    'The interval for one new laboratory adds the scatter between series. It is a prediction of what another laboratory would find, not the uncertainty of *D*.',
  assignedScatter: 'Too few series to estimate the scatter between laboratories: τ\u00a0=\u00a0{tau} was assigned.',
  assignedUncertainty:
    'Where a source states no uncertainty, the usual value of its method was assigned: series {keys}.',
  biasNotIncluded: 'Not included: a bias common to all methods used.',
  singleMethod: 'From {extent} one method only, {method}: its own bias is not included.',
  composition: 'Dependence on composition, a few percent for very unequal molar masses, is neglected. {extent}',
  compositionStated: 'Stated mole fractions of {substance} run from {minimum} to {maximum}.',
  compositionUnknown: 'No mole fraction is stated with the points.',

  cautions: {
    extrapolation:
      'Below {minimum} and above {maximum} the correlation extrapolates; the stated uncertainty no longer holds. Do not extrapolate a fitted exponent.',
    density:
      'It holds for the dilute gas, {pressure}. At higher pressure, and near saturation of a vapour, *D P* is not constant.',
    ventilation:
      'Gases and vapours can burn, poison or displace air: ventilate, vent sweep gas to a hood or absorber, and read the supplier’s safety data sheet.',
    design:
      'Do not use this sheet as the sole basis of a safety-critical design. Local codes and licensed practice come first.',
  },

  citation: '{publisher} ({year}). {title}, data sheet {code}, version {number}.{people}{doi}',
  citedTitle: '{title}: mutual diffusivity',
  citationPrepared: ' Prepared by {preparedBy}',
  citationReviewed: ', reviewed by {reviewedBy}',
  citationUnreleased: ' Not released; do not cite.',
  and: ' and ',

  states: {
    DRAFT: 'draft',
    IN_REVIEW: 'in review',
    RETURNED: 'returned',
    APPROVED: 'approved',
    RELEASED: 'released',
    SUPERSEDED: 'superseded',
    WITHDRAWN: 'withdrawn',
  },
  banners: {
    unreleased: 'This version is {state}. It is not released: its numbers may change.',
    superseded: 'Version {number} has taken the place of this version.',
    withdrawn: 'Withdrawn on {date}: {reason} Do not use its numbers.',
  },

  margin: {
    state: 'State',
    version: 'Version',
    replaces: '{number}, replaces {earlier}',
    temperature: 'Range in *T*',
    pressure: 'Range in *P*',
    released: 'Released',
    prepared: 'Prepared',
    reviewed: 'Reviewed',
    releasedBy: 'Released by',
    fit: 'Fit {number}, {date}. {objective}, {weighting}; {effect}.',
    engine: 'Engine {engine}.',
    residual: 'Reduced χ²\u00a0=\u00a0{value}, ν\u00a0=\u00a0{degrees}.',
    allPoints: 'All {count} points are drawn. Filled points carried weight, open points did not.',
    offsets: 'Offset: mean deviation of ln *D* from the correlation, in percent, and its standard uncertainty.',
  },
  objectives: {
    LN_DIFFUSIVITY: {
      LEAST_SQUARES: 'Least squares on ln *D*',
      HUBER: 'Huber’s loss on ln *D*',
      BISQUARE: 'Tukey’s bisquare on ln *D*',
    },
    DIFFUSIVITY: {
      LEAST_SQUARES: 'Least squares on *D*',
      HUBER: 'Huber’s loss on *D*',
      BISQUARE: 'Tukey’s bisquare on *D*',
    },
  },
  weightings: {
    STATED: 'weighted by *u*(*D*)',
    EFFECTIVE_VARIANCE: 'effective variance',
    EQUAL: 'equal weights',
  },
  effects: {
    POOLED: 'all points pooled',
    RANDOM_INTERCEPT: 'random intercept of each series, REML',
    RANDOM_INTERCEPT_AND_SLOPE: 'random intercept and slope of each series, REML',
  },

  csv: {
    sheet: 'Data sheet',
    version: 'Version',
    state: 'State',
    pair: 'Gas pair',
    casNumber: 'CAS RN',
    correlation: 'Correlation, T in K, P in Pa, D in m²/s',
    temperature: 'Range in T',
    pressure: 'Range in P',
    statement: 'Uncertainty',
    notIncluded: 'Not included',
    caution: 'Caution',
    doi: 'DOI',
    hash: 'SHA-256',
    columns: {
      temperature: 'temperature_k',
      pressure: 'pressure_pa',
      diffusivity: 'diffusivity_m2_s',
      standardUncertainty: 'standard_uncertainty_m2_s',
      expandedUncertainty: 'expanded_uncertainty_m2_s',
      newLaboratory: 'new_laboratory_half_width_m2_s',
    },
  },
} as const;
