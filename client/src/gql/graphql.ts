/* eslint-disable */
import type { TypedDocumentNode as DocumentNode } from '@graphql-typed-document-node/core';
export type Maybe<T> = T | null;
export type InputMaybe<T> = T | null | undefined;
export type Exact<T extends { [key: string]: unknown }> = { [K in keyof T]: T[K] };
export type MakeOptional<T, K extends keyof T> = Omit<T, K> & { [SubKey in K]?: Maybe<T[SubKey]> };
export type MakeMaybe<T, K extends keyof T> = Omit<T, K> & { [SubKey in K]: Maybe<T[SubKey]> };
export type MakeEmpty<T extends { [key: string]: unknown }, K extends keyof T> = { [_ in K]?: never };
export type Incremental<T> = T | { [P in keyof T]?: P extends ' $fragmentName' | '__typename' ? T[P] : never };
/** All built-in and custom scalars, mapped to their actual values */
export type Scalars = {
  ID: { input: string; output: string; }
  String: { input: string; output: string; }
  Boolean: { input: boolean; output: boolean; }
  Int: { input: number; output: number; }
  Float: { input: number; output: number; }
  /** A date-time string at UTC, such as 2019-12-03T09:54:33Z, compliant with the date-time format. */
  DateTime: { input: string; output: string; }
  /** A column of finite numbers: in JSON an array such as [1.5, 2e-5]; as a literal a list of numbers. One scalar, so that long columns cost what their JSON costs. */
  FloatColumn: { input: number[]; output: number[]; }
};

export type AccountStatus =
  | 'ACTIVE'
  | 'DISABLED'
  | 'INVITED';

/** Lets a program read what its owner may read. The secret is shown once and only its hash is kept. */
export type ApiKey = {
  __typename?: 'ApiKey';
  createdAt: Scalars['DateTime']['output'];
  /** When it ends by itself; null when it does not. */
  expiresAt?: Maybe<Scalars['DateTime']['output']>;
  id: Scalars['ID']['output'];
  /** To the minute; null when the key was never used. */
  lastUsedAt?: Maybe<Scalars['DateTime']['output']>;
  name: Scalars['String']['output'];
  /** How the secret begins, to tell keys apart. */
  prefix: Scalars['String']['output'];
  revokedAt?: Maybe<Scalars['DateTime']['output']>;
};

export type ApiKeyPayload = {
  __typename?: 'ApiKeyPayload';
  apiKey?: Maybe<ApiKey>;
  problems: Array<Problem>;
  /** The key itself, when it is made; shown this once. */
  secret?: Maybe<Scalars['String']['output']>;
};

/** One component of a mixture bath. */
export type BathComponent = {
  __typename?: 'BathComponent';
  casNumber: Scalars['String']['output'];
  moleFraction: Scalars['Float']['output'];
};

/** A usual caution, deferring to local codes and licensed practice. */
export type Caution = {
  __typename?: 'Caution';
  source: Scalars['String']['output'];
  text: Scalars['String']['output'];
};

/** One question of the checklist and the answer given. */
export type ChecklistAnswer = {
  __typename?: 'ChecklistAnswer';
  /** yes, no or does not apply; null where unanswered. */
  answer?: Maybe<Scalars['String']['output']>;
  question: Scalars['String']['output'];
};

/** An answer to one question of the checklist. */
export type ChecklistAnswerInput = {
  /** yes, no or does not apply */
  answer?: InputMaybe<Scalars['String']['input']>;
  question: Scalars['String']['input'];
};

/** One coefficient of an equation, SI. */
export type Coefficient = {
  __typename?: 'Coefficient';
  symbol: Scalars['String']['output'];
  value: Scalars['Float']['output'];
};

export type CoefficientInput = {
  symbol: Scalars['String']['input'];
  value: Scalars['Float']['input'];
};

export type Correlation = {
  __typename?: 'Correlation';
  /** In the order of the parameters that are not fixed. */
  covariance: Array<Array<Scalars['Float']['output']>>;
  /** ν of Student's t for expanded uncertainties; null when they are known and normal. */
  degreesOfFreedom?: Maybe<Scalars['Float']['output']>;
  /** Columns of equal length, at most 10,000; a single pressure may serve all temperatures. */
  evaluate: Evaluation;
  /** Plain-text expression in T (K) and P (Pa), giving D in m²/s, with the numbers in place. */
  expression: Scalars['String']['output'];
  form: CorrelationForm;
  parameters: Array<CorrelationParameter>;
  /** Pa */
  referencePressure: Scalars['Float']['output'];
  /** K */
  referenceTemperature: Scalars['Float']['output'];
  validity: ValidityRange;
};


export type CorrelationEvaluateArgs = {
  coverage?: InputMaybe<Scalars['Float']['input']>;
  kind?: InputMaybe<UncertaintyKind>;
  outsideRange?: InputMaybe<OutsideRange>;
  pressures: Scalars['FloatColumn']['input'];
  temperatures: Scalars['FloatColumn']['input'];
};

export type CorrelationForm =
  | 'KINETIC_THEORY'
  | 'LOG_QUADRATIC'
  | 'POWER_LAW'
  | 'POWER_LAW_FREE_PRESSURE'
  | 'SUTHERLAND'
  | 'THREE_TERM';

export type CorrelationParameter = {
  __typename?: 'CorrelationParameter';
  /** Null for a parameter fixed by hand. */
  standardUncertainty?: Maybe<Scalars['Float']['output']>;
  /** As in METHODS: D0, n, m, S, b, c, s, sigma, epsilon */
  symbol: Scalars['String']['output'];
  /** UCUM code; `1` for a pure number. sigma in nm, epsilon (ε/k) in K. */
  unit: Scalars['String']['output'];
  value: Scalars['Float']['output'];
};

export type CreateSeriesInput = {
  a: SubstanceRef;
  apparatus?: InputMaybe<Scalars['String']['input']>;
  b: SubstanceRef;
  commonRelativeUncertainty?: InputMaybe<Scalars['Float']['input']>;
  dataOrigin?: InputMaybe<DataOrigin>;
  method: Scalars['String']['input'];
  points: Array<SeriesPointInput>;
  sameDataAsId?: InputMaybe<Scalars['ID']['input']>;
  /** Free text or DOI */
  source: Scalars['String']['input'];
  title: Scalars['String']['input'];
};

export type DataOrigin =
  | 'EQUATION'
  | 'GRAPH'
  | 'SMOOTHED'
  | 'TABLE'
  | 'TUBE_RUN';

export type DataSheet = Node & {
  __typename?: 'DataSheet';
  /** Short, permanent, readable: DS-0042 */
  code: Scalars['String']['output'];
  /** The newest released version, if there is one and it is not withdrawn. */
  current?: Maybe<DataSheetVersion>;
  id: Scalars['ID']['output'];
  pair: GasPair;
  /** One version by its number; null when there is none the caller may see. */
  version?: Maybe<DataSheetVersion>;
  versions: Array<DataSheetVersion>;
};


export type DataSheetVersionArgs = {
  number: Scalars['String']['input'];
};

export type DataSheetConnection = {
  __typename?: 'DataSheetConnection';
  edges: Array<DataSheetEdge>;
  pageInfo: PageInfo;
  totalCount: Scalars['Int']['output'];
};

export type DataSheetEdge = {
  __typename?: 'DataSheetEdge';
  cursor: Scalars['String']['output'];
  node: DataSheet;
};

export type DataSheetVersion = Node & {
  __typename?: 'DataSheetVersion';
  /** Required from the second version on. */
  changeNote?: Maybe<Scalars['String']['output']>;
  /** All that the sheet says, as its page and its PDF show it. */
  content: SheetContent;
  /** Lower-case hex SHA-256 of the canonical JSON snapshot; null until released. */
  contentHash?: Maybe<Scalars['String']['output']>;
  correlation: Correlation;
  createdAt: Scalars['DateTime']['output'];
  doi?: Maybe<Scalars['String']['output']>;
  /** Null while the registrar has not confirmed the DOI. */
  doiRegisteredAt?: Maybe<Scalars['DateTime']['output']>;
  /** Changes of state, oldest first; for members of the group. */
  events: Array<VersionEvent>;
  fit: Fit;
  id: Scalars['ID']['output'];
  /** Counts changes; an update names the one it was made from. */
  lockVersion: Scalars['Int']['output'];
  /** edition.revision; the first is 1.0 */
  number: Scalars['String']['output'];
  preparedBy?: Maybe<Person>;
  /** Hash of the release before this one, in the whole service; null for the first. */
  previousHash?: Maybe<Scalars['String']['output']>;
  releasedAt?: Maybe<Scalars['DateTime']['output']>;
  releasedBy?: Maybe<Person>;
  /** Words of the editor by section. */
  remarks: Array<SectionRemark>;
  reviewedBy: Array<Person>;
  /** Verdicts, oldest first; for members of the group. */
  reviews: Array<Review>;
  sheet: DataSheet;
  status: VersionStatus;
  summary: Scalars['String']['output'];
  supersededBy?: Maybe<DataSheetVersion>;
  updatedAt: Scalars['DateTime']['output'];
  withdrawalReason?: Maybe<Scalars['String']['output']>;
  withdrawnAt?: Maybe<Scalars['DateTime']['output']>;
};

export type DataSheetVersionPayload = {
  __typename?: 'DataSheetVersionPayload';
  problems: Array<Problem>;
  version?: Maybe<DataSheetVersion>;
};

export type DraftDataSheetInput = {
  changeNote?: InputMaybe<Scalars['String']['input']>;
  fitId: Scalars['ID']['input'];
  summary: Scalars['String']['input'];
};

/** One piece of a displayed equation, read from left to right: either `runs`, or a fraction with `numerator` and `denominator`. */
export type EquationPiece = {
  __typename?: 'EquationPiece';
  /** The piece stands in round brackets. */
  bracketed: Scalars['Boolean']['output'];
  /** Null where the piece is no fraction. */
  denominator?: Maybe<Array<TextRun>>;
  /** Exponent of the whole piece, null where there is none. */
  exponent?: Maybe<Array<TextRun>>;
  /** Null where the piece is no fraction. */
  numerator?: Maybe<Array<TextRun>>;
  /** Empty for a fraction. */
  runs: Array<TextRun>;
};

export type Evaluation = {
  __typename?: 'Evaluation';
  /** k */
  coverageFactor: Scalars['Float']['output'];
  /** m²/s */
  diffusivities: Scalars['FloatColumn']['output'];
  /** m²/s, at the asked coverage */
  expandedUncertainties: Scalars['FloatColumn']['output'];
  /** Indices, from 0, of the states outside the validity range. */
  outside: Array<Scalars['Int']['output']>;
  /** m²/s */
  standardUncertainties: Scalars['FloatColumn']['output'];
};

export type ExcludedPoint = {
  __typename?: 'ExcludedPoint';
  point: SeriesPoint;
  reason: Scalars['String']['output'];
  series: Series;
};

export type ExcludedPointInput = {
  pointId: Scalars['ID']['input'];
  reason: Scalars['String']['input'];
};

/** A job that failed for good, after all its retries. */
export type FailedJob = {
  __typename?: 'FailedJob';
  attempts: Scalars['Int']['output'];
  failedAt: Scalars['DateTime']['output'];
  id: Scalars['ID']['output'];
  queue: Scalars['String']['output'];
  reason: Scalars['String']['output'];
};

/** Limits of an axis and where it carries figures, in the unit of the quantity */
export type FigureAxis = {
  __typename?: 'FigureAxis';
  maximum: Scalars['Float']['output'];
  minimum: Scalars['Float']['output'];
  ticks: Scalars['FloatColumn']['output'];
};

/** The correlation along the temperature axis at the reference pressure. Columns of equal length; the curve runs beyond the validity range, where it is drawn broken and without band. */
export type FigureCurve = {
  __typename?: 'FigureCurve';
  /** m²/s */
  diffusivities: Scalars['FloatColumn']['output'];
  /** Index of the first temperature in the validity range */
  firstInside: Scalars['Int']['output'];
  /** Index of the last temperature in the validity range */
  lastInside: Scalars['Int']['output'];
  /** U of the recommended value as a part of D: the band is D·exp(±value) */
  relativeExpandedUncertainties: Scalars['FloatColumn']['output'];
  /** The interval for one new laboratory in the same way; null without a between-series deviation. */
  relativeNewLaboratory?: Maybe<Scalars['FloatColumn']['output']>;
  /** K */
  temperatures: Scalars['FloatColumn']['output'];
};

/** An estimate along the temperature axis. Columns of equal length. */
export type FigureEstimate = {
  __typename?: 'FigureEstimate';
  /** 100 (D/D(fit) − 1) */
  deviations: Scalars['FloatColumn']['output'];
  method: Scalars['String']['output'];
  /** K */
  temperatures: Scalars['FloatColumn']['output'];
};

/** Points of one series. Columns of equal length. */
export type FigureSeries = {
  __typename?: 'FigureSeries';
  /** 100 (D/D(fit) − 1) at the T and P of the point */
  deviations: Scalars['FloatColumn']['output'];
  /** Letter of the series */
  key: Scalars['String']['output'];
  /** Indices of the points that carried no weight */
  leftOut: Array<Scalars['Int']['output']>;
  /** Number of colour and shape, from 0 */
  mark: Scalars['Int']['output'];
  /** D P/P0, m²/s */
  reducedDiffusivities: Scalars['FloatColumn']['output'];
  /** u(D)/D, point to point; 0 where none is known */
  relativeUncertainties: Scalars['FloatColumn']['output'];
  /** K */
  temperatures: Scalars['FloatColumn']['output'];
  title: Scalars['String']['output'];
  /** The series as a whole carried weight */
  used: Scalars['Boolean']['output'];
};

export type Fit = Node & {
  __typename?: 'Fit';
  /** All that the workspace shows of the fit; for members of the group. */
  analysis: FitAnalysis;
  correlation: Correlation;
  createdAt: Scalars['DateTime']['output'];
  createdBy?: Maybe<Person>;
  engineVersion: Scalars['String']['output'];
  excludedPoints: Array<ExcludedPoint>;
  id: Scalars['ID']['output'];
  /** Accepted series of the pair that carried no weight; for members of the group. */
  leftOutSeries: Array<LeftOutSeries>;
  loss: Loss;
  /** Consecutive within the pair, from 1. */
  number: Scalars['Int']['output'];
  objective: Objective;
  pair: GasPair;
  series: Array<Series>;
  seriesEffect: SeriesEffect;
  seriesOffsets: Array<SeriesOffset>;
  statistics: FitStatistics;
  warnings: Array<Warning>;
  weighting: Weighting;
};

/** All that the workspace shows of a fit, kept or not. */
export type FitAnalysis = {
  __typename?: 'FitAnalysis';
  /** τ_n: between-series standard deviation of the exponent of T. */
  betweenSeriesSlopeDeviation?: Maybe<Scalars['Float']['output']>;
  correlation: Correlation;
  /** Correlation coefficients of the parameters. */
  correlationMatrix: Array<Array<Scalars['Float']['output']>>;
  /** Series used, then those left out. */
  series: Array<SeriesAnalysis>;
  statistics: FitStatistics;
  warnings: Array<Warning>;
};

export type FitCorrelationInput = {
  /** Assigned between-series deviation of ln D; with one or two series the group's own value, else 0.03, is assigned when absent, and a warning says so. */
  betweenSeriesDeviation?: InputMaybe<Scalars['Float']['input']>;
  excludedPoints?: InputMaybe<Array<ExcludedPointInput>>;
  form: CorrelationForm;
  /** Reasons for accepted series that are not used. */
  leftOutSeries?: InputMaybe<Array<LeftOutSeriesInput>>;
  loss?: InputMaybe<Loss>;
  objective?: InputMaybe<Objective>;
  pairId: Scalars['ID']['input'];
  /** Pa */
  referencePressure?: InputMaybe<Scalars['Float']['input']>;
  /** K */
  referenceTemperature?: InputMaybe<Scalars['Float']['input']>;
  seriesEffect?: InputMaybe<SeriesEffect>;
  /** Accepted series to use; all accepted series of the pair when absent. */
  seriesIds?: InputMaybe<Array<Scalars['ID']['input']>>;
  weighting?: InputMaybe<Weighting>;
};

export type FitPayload = {
  __typename?: 'FitPayload';
  fit?: Maybe<Fit>;
  problems: Array<Problem>;
};

export type FitPreviewPayload = {
  __typename?: 'FitPreviewPayload';
  analysis?: Maybe<FitAnalysis>;
  problems: Array<Problem>;
};

export type FitStatistics = {
  __typename?: 'FitStatistics';
  /** Null for robust losses and where points ≤ parameters + 2. */
  aicc?: Maybe<Scalars['Float']['output']>;
  /** Between-series standard deviation of ln D, estimated or assigned; null when there is neither. */
  betweenSeriesDeviation?: Maybe<Scalars['Float']['output']>;
  betweenSeriesOrigin?: Maybe<UncertaintyOrigin>;
  /** Null where no uncertainties were stated. */
  chiSquare?: Maybe<Scalars['Float']['output']>;
  /** Probability that χ² exceeds `chiSquare` when the stated uncertainties hold. */
  chiSquareProbability?: Maybe<Scalars['Float']['output']>;
  /** Cochran's Q of the series' offsets; null for a single series. */
  cochranQ?: Maybe<Scalars['Float']['output']>;
  /** I²: share of the scatter of the offsets that is between series, 0 to 1. */
  iSquared?: Maybe<Scalars['Float']['output']>;
  pointCount: Scalars['Int']['output'];
  reducedChiSquare?: Maybe<Scalars['Float']['output']>;
  residualDegreesOfFreedom: Scalars['Int']['output'];
  /** Relative (objective LN_DIFFUSIVITY) or m²/s */
  residualStandardError?: Maybe<Scalars['Float']['output']>;
  seriesCount: Scalars['Int']['output'];
};

export type GasPair = Node & {
  __typename?: 'GasPair';
  dataSheet?: Maybe<DataSheet>;
  /** Estimates of kinetic theory beside the measurements; never part of a fit. */
  estimates: Array<PairEstimate>;
  /** Newest first; for members of the group. */
  fits: Array<Fit>;
  id: Scalars['ID']['output'];
  series: SeriesConnection;
  /** Two. The pair is unordered (D_AB = D_BA at low density); this is the order of display. */
  substances: Array<Substance>;
};


export type GasPairEstimatesArgs = {
  pressure?: InputMaybe<Scalars['Float']['input']>;
  temperatures: Scalars['FloatColumn']['input'];
};


export type GasPairSeriesArgs = {
  after?: InputMaybe<Scalars['String']['input']>;
  first?: InputMaybe<Scalars['Int']['input']>;
  status?: InputMaybe<Array<SeriesStatus>>;
};

export type GasPairConnection = {
  __typename?: 'GasPairConnection';
  edges: Array<GasPairEdge>;
  pageInfo: PageInfo;
  totalCount: Scalars['Int']['output'];
};

export type GasPairEdge = {
  __typename?: 'GasPairEdge';
  cursor: Scalars['String']['output'];
  node: GasPair;
};

/** What waits for the person signed in, and what that person waits for. */
export type Home = {
  __typename?: 'Home';
  /** Waits for the person; oldest first. */
  tasks: Array<Task>;
  /** The person's own, waiting for others; oldest first. */
  waiting: Array<Task>;
};

export type InvitePersonInput = {
  email: Scalars['String']['input'];
  roles: Array<Role>;
};

/** How many jobs of one kind there are. */
export type JobQueue = {
  __typename?: 'JobQueue';
  active: Scalars['Int']['output'];
  completed: Scalars['Int']['output'];
  failed: Scalars['Int']['output'];
  queue: Scalars['String']['output'];
  waiting: Scalars['Int']['output'];
};

export type Jobs = {
  __typename?: 'Jobs';
  /** The newest first. */
  failures: Array<FailedJob>;
  queues: Array<JobQueue>;
};

/** A series of the pair that carried no weight. */
export type LeftOutSeries = {
  __typename?: 'LeftOutSeries';
  reason: Scalars['String']['output'];
  series: Series;
};

/** Why an accepted series of the pair carries no weight. */
export type LeftOutSeriesInput = {
  reason: Scalars['String']['input'];
  seriesId: Scalars['ID']['input'];
};

export type Loss =
  | 'BISQUARE'
  | 'HUBER'
  | 'LEAST_SQUARES';

/** A line of the margin: what, and who or when or where */
export type MarginEntry = {
  __typename?: 'MarginEntry';
  label: Array<TextRun>;
  value: Scalars['String']['output'];
};

export type Mutation = {
  __typename?: 'Mutation';
  /** Editors; not the submitter. */
  acceptSeries: SeriesPayload;
  /** Needs a session: no key is made with a key. */
  createApiKey: ApiKeyPayload;
  /** Researchers and editors. */
  createSeries: SeriesPayload;
  /** Researchers and editors. */
  createSubstance: SubstancePayload;
  /** Editors. */
  draftDataSheet: DataSheetVersionPayload;
  /** Researchers and editors; accepted series only. */
  fitCorrelation: FitPayload;
  /** Administrators. Mails a link that makes the account; asked again, mails a new one. */
  invitePerson: PersonPayload;
  /** An editor who neither prepared the version nor submitted one of its series. */
  recordReview: DataSheetVersionPayload;
  /** An editor who did not prepare the version (the reviewer may), with the password again. */
  releaseDataSheet: DataSheetVersionPayload;
  /** Editors; from ACCEPTED, with the reason. */
  retireSeries: SeriesPayload;
  returnSeries: SeriesPayload;
  /** Takes effect at once and cannot be undone. */
  revokeApiKey: ApiKeyPayload;
  /** From DRAFT or RETURNED. */
  submitForReview: DataSheetVersionPayload;
  /** From DRAFT or RETURNED. */
  submitSeries: SeriesPayload;
  /** Tells the caller by e-mail when a version is released or withdrawn. */
  subscribeToSheet: SubscriptionPayload;
  unsubscribeFromSheet: SubscriptionPayload;
  /** Editors. The words of a draft or returned version. */
  updateDraft: DataSheetVersionPayload;
  /** Administrators. The last administrator stays one. */
  updatePerson: PersonPayload;
  /** Its owner and editors; from DRAFT or RETURNED. */
  updateSeries: SeriesPayload;
  /** Researchers and editors. */
  updateSubstance: SubstancePayload;
  withdrawDataSheet: DataSheetVersionPayload;
};


export type MutationAcceptSeriesArgs = {
  id: Scalars['ID']['input'];
};


export type MutationCreateApiKeyArgs = {
  expiresInDays?: InputMaybe<Scalars['Int']['input']>;
  name: Scalars['String']['input'];
};


export type MutationCreateSeriesArgs = {
  input: CreateSeriesInput;
};


export type MutationCreateSubstanceArgs = {
  input: SubstanceInput;
};


export type MutationDraftDataSheetArgs = {
  input: DraftDataSheetInput;
};


export type MutationFitCorrelationArgs = {
  input: FitCorrelationInput;
};


export type MutationInvitePersonArgs = {
  input: InvitePersonInput;
};


export type MutationRecordReviewArgs = {
  input: RecordReviewInput;
};


export type MutationReleaseDataSheetArgs = {
  password: Scalars['String']['input'];
  versionId: Scalars['ID']['input'];
};


export type MutationRetireSeriesArgs = {
  id: Scalars['ID']['input'];
  remark: Scalars['String']['input'];
};


export type MutationReturnSeriesArgs = {
  id: Scalars['ID']['input'];
  remark: Scalars['String']['input'];
};


export type MutationRevokeApiKeyArgs = {
  id: Scalars['ID']['input'];
};


export type MutationSubmitForReviewArgs = {
  versionId: Scalars['ID']['input'];
};


export type MutationSubmitSeriesArgs = {
  id: Scalars['ID']['input'];
};


export type MutationSubscribeToSheetArgs = {
  sheetId: Scalars['ID']['input'];
};


export type MutationUnsubscribeFromSheetArgs = {
  sheetId: Scalars['ID']['input'];
};


export type MutationUpdateDraftArgs = {
  input: UpdateDraftInput;
};


export type MutationUpdatePersonArgs = {
  input: UpdatePersonInput;
};


export type MutationUpdateSeriesArgs = {
  input: UpdateSeriesInput;
};


export type MutationUpdateSubstanceArgs = {
  input: UpdateSubstanceInput;
};


export type MutationWithdrawDataSheetArgs = {
  password: Scalars['String']['input'];
  reason: Scalars['String']['input'];
  versionId: Scalars['ID']['input'];
};

export type Node = {
  id: Scalars['ID']['output'];
};

export type Objective =
  | 'DIFFUSIVITY'
  | 'LN_DIFFUSIVITY';

export type OutsideRange =
  | 'FLAG'
  | 'REFUSE';

export type PageInfo = {
  __typename?: 'PageInfo';
  endCursor?: Maybe<Scalars['String']['output']>;
  hasNextPage: Scalars['Boolean']['output'];
  hasPreviousPage: Scalars['Boolean']['output'];
  startCursor?: Maybe<Scalars['String']['output']>;
};

/** An estimate of kinetic theory or an empirical method along a column of states. */
export type PairEstimate = {
  __typename?: 'PairEstimate';
  /** m²/s */
  diffusivities: Scalars['FloatColumn']['output'];
  label: Scalars['String']['output'];
  method: Scalars['String']['output'];
  source: Scalars['String']['output'];
  /** Mean error as usually quoted for the method. */
  usualRelativeError: Scalars['Float']['output'];
};

export type Person = Node & {
  __typename?: 'Person';
  /** To administrators; null to others. */
  accountStatus?: Maybe<AccountStatus>;
  /** To administrators and to the person; null to others. */
  email?: Maybe<Scalars['String']['output']>;
  id: Scalars['ID']['output'];
  /** When a session of the person was last begun or continued. To administrators; null to others. */
  lastSeenAt?: Maybe<Scalars['DateTime']['output']>;
  name: Scalars['String']['output'];
  orcid?: Maybe<Scalars['String']['output']>;
  roles: Array<Role>;
};

export type PersonPayload = {
  __typename?: 'PersonPayload';
  person?: Maybe<Person>;
  problems: Array<Problem>;
};

export type PressureOrigin =
  | 'ASSIGNED'
  | 'REDUCED_BY_SOURCE'
  | 'STATED';

/** Something the caller can mend. `path` points into the input (`points.3.temperature`). */
export type Problem = {
  __typename?: 'Problem';
  code: Scalars['String']['output'];
  message: Scalars['String']['output'];
  path?: Maybe<Scalars['String']['output']>;
};

export type Query = {
  __typename?: 'Query';
  /** The series the caller may see, of all pairs. */
  allSeries: SeriesConnection;
  /** The caller's own, the newest first. */
  apiKeys: Array<ApiKey>;
  /** The current released correlation of a pair; null when there is none. */
  correlation?: Maybe<Correlation>;
  dataSheet?: Maybe<DataSheet>;
  dataSheets: DataSheetConnection;
  /** One fit; null when there is none the caller may see. */
  fit?: Maybe<Fit>;
  /** Gas pairs by words of their names, formulas, synonyms or CAS RN. */
  gasPairs: GasPairConnection;
  /** What waits for the person signed in. */
  home: Home;
  /** Administrators. */
  jobs: Jobs;
  /** Current versions over all sheets, newest release first. */
  latestReleases: Array<DataSheetVersion>;
  /** Withdrawn versions over all sheets, newest first. */
  latestWithdrawals: Array<DataSheetVersion>;
  /** Who asks; null for a visitor. */
  me?: Maybe<Person>;
  node?: Maybe<Node>;
  /** One series; null when there is none the caller may see. */
  oneSeries?: Maybe<Series>;
  pair?: Maybe<GasPair>;
  /** One pair by its id; null when there is none. */
  pairById?: Maybe<GasPair>;
  /** Administrators. By name. */
  people: Array<Person>;
  /** Researchers and editors. Computes a fit without keeping it. */
  previewFit: FitPreviewPayload;
  /** Editors. Fits again from the stored points and compares. */
  reproduceVersion: Array<ReproducedNumber>;
  /** The questions a reviewer goes through. */
  reviewQuestions: Array<Scalars['String']['output']>;
  /** The caller's own. */
  subscriptions: Array<SheetSubscription>;
  /** One substance; null when there is none. */
  substance?: Maybe<Substance>;
  substances: SubstanceConnection;
};


export type QueryAllSeriesArgs = {
  after?: InputMaybe<Scalars['String']['input']>;
  first?: InputMaybe<Scalars['Int']['input']>;
  mine?: InputMaybe<Scalars['Boolean']['input']>;
  status?: InputMaybe<Array<SeriesStatus>>;
};


export type QueryCorrelationArgs = {
  a: SubstanceRef;
  b: SubstanceRef;
};


export type QueryDataSheetArgs = {
  code: Scalars['String']['input'];
};


export type QueryDataSheetsArgs = {
  after?: InputMaybe<Scalars['String']['input']>;
  first?: InputMaybe<Scalars['Int']['input']>;
  search?: InputMaybe<Scalars['String']['input']>;
};


export type QueryFitArgs = {
  id: Scalars['ID']['input'];
};


export type QueryGasPairsArgs = {
  after?: InputMaybe<Scalars['String']['input']>;
  first?: InputMaybe<Scalars['Int']['input']>;
  search?: InputMaybe<Scalars['String']['input']>;
};


export type QueryJobsArgs = {
  failures?: InputMaybe<Scalars['Int']['input']>;
};


export type QueryLatestReleasesArgs = {
  first?: InputMaybe<Scalars['Int']['input']>;
};


export type QueryLatestWithdrawalsArgs = {
  first?: InputMaybe<Scalars['Int']['input']>;
};


export type QueryNodeArgs = {
  id: Scalars['ID']['input'];
};


export type QueryOneSeriesArgs = {
  id: Scalars['ID']['input'];
};


export type QueryPairArgs = {
  a: SubstanceRef;
  b: SubstanceRef;
};


export type QueryPairByIdArgs = {
  id: Scalars['ID']['input'];
};


export type QueryPreviewFitArgs = {
  input: FitCorrelationInput;
};


export type QueryReproduceVersionArgs = {
  versionId: Scalars['ID']['input'];
};


export type QuerySubstanceArgs = {
  ref: SubstanceRef;
};


export type QuerySubstancesArgs = {
  after?: InputMaybe<Scalars['String']['input']>;
  first?: InputMaybe<Scalars['Int']['input']>;
  search?: InputMaybe<Scalars['String']['input']>;
};

export type RangeBasis =
  | 'MEASURED'
  | 'STATED';

/** Recommended values over the validity range: columns of equal length */
export type RecommendedValues = {
  __typename?: 'RecommendedValues';
  /** m²/s */
  diffusivities: Scalars['FloatColumn']['output'];
  /** m²/s, of the recommended value, level of confidence approximately 95 % */
  expandedUncertainties: Scalars['FloatColumn']['output'];
  /** m²/s, half-width of the interval for one new laboratory; null without a between-series deviation. */
  newLaboratoryHalfWidths?: Maybe<Scalars['FloatColumn']['output']>;
  /** How to go to other pressures */
  note: Array<TextRun>;
  /** Pa, the same for all rows */
  pressure: Scalars['Float']['output'];
  /** Index of the row at the reference temperature; null outside the range */
  referenceRow?: Maybe<Scalars['Int']['output']>;
  /** m²/s */
  standardUncertainties: Scalars['FloatColumn']['output'];
  /** K */
  temperatures: Scalars['FloatColumn']['output'];
};

/** Unanswered checklist questions do not refuse APPROVE over the API; the record shows them as unanswered. */
export type RecordReviewInput = {
  checklist?: InputMaybe<Array<ChecklistAnswerInput>>;
  remark: Scalars['String']['input'];
  verdict: ReviewVerdict;
  versionId: Scalars['ID']['input'];
};

/** One number of a correlation, stored and recomputed. */
export type ReproducedNumber = {
  __typename?: 'ReproducedNumber';
  /** To 12 digits. */
  agrees: Scalars['Boolean']['output'];
  /** The parameter, or the covariance of two. */
  name: Scalars['String']['output'];
  recomputed: Scalars['Float']['output'];
  stored: Scalars['Float']['output'];
};

/** A reviewer's verdict on a version; part of the record for ever. */
export type Review = {
  __typename?: 'Review';
  checklist: Array<ChecklistAnswer>;
  createdAt: Scalars['DateTime']['output'];
  remark: Scalars['String']['output'];
  reviewer: Person;
  verdict: ReviewVerdict;
};

export type ReviewVerdict =
  | 'APPROVE'
  | 'RETURN';

export type Role =
  | 'ADMINISTRATOR'
  | 'EDITOR'
  | 'MODELLER'
  | 'RESEARCHER';

/** Words of the editor for one section of the sheet. */
export type SectionRemark = {
  __typename?: 'SectionRemark';
  section: Scalars['String']['output'];
  text: Scalars['String']['output'];
};

/** Words of the editor for one section of the sheet. */
export type SectionRemarkInput = {
  /** correlation, figures, recommended, series, estimates, uncertainty, cautions, citation or versions */
  section: Scalars['String']['input'];
  text: Scalars['String']['input'];
};

export type Series = Node & {
  __typename?: 'Series';
  apparatus?: Maybe<Scalars['String']['output']>;
  /** Relative standard uncertainty common to all points of the series (vapour pressure, thermometer, tube, calibration). */
  commonRelativeUncertainty?: Maybe<Scalars['Float']['output']>;
  createdAt: Scalars['DateTime']['output'];
  /** Who brought it in; for members of the group. */
  createdBy?: Maybe<Person>;
  dataOrigin: DataOrigin;
  /** Changes of state, oldest first; for members of the group. */
  events: Array<SeriesEvent>;
  id: Scalars['ID']['output'];
  /** Counts changes; an update names the one it was made from. */
  lockVersion: Scalars['Int']['output'];
  method: Scalars['String']['output'];
  /** Place among all series of its pair, from 0; gives its letter, colour and shape for ever. */
  ordinal: Scalars['Int']['output'];
  pair: GasPair;
  points: Array<SeriesPoint>;
  /** The series whose data this one repeats; both never carry weight together. */
  sameDataAs?: Maybe<Series>;
  source: Scalars['String']['output'];
  status: SeriesStatus;
  submittedBy?: Maybe<Person>;
  title: Scalars['String']['output'];
  warnings: Array<Warning>;
};

/** How the points of one series lie to the correlation; columns in the order of its points. */
export type SeriesAnalysis = {
  __typename?: 'SeriesAnalysis';
  /** False for a series left out. */
  carriesWeight: Scalars['Boolean']['output'];
  /** m²/s, the correlation at each point */
  fitted: Scalars['FloatColumn']['output'];
  /** ln D − ln of the correlation */
  lnDeviations: Scalars['FloatColumn']['output'];
  /** Mean deviation of ln D from the correlation. */
  offset: Scalars['Float']['output'];
  offsetStandardUncertainty: Scalars['Float']['output'];
  series: Series;
  seriesId: Scalars['ID']['output'];
  /** Residual over its standard uncertainty */
  standardizedResiduals: Scalars['FloatColumn']['output'];
  /** 0 for a point left out; else the robust weight, 1 for least squares */
  weights: Scalars['FloatColumn']['output'];
};

export type SeriesConnection = {
  __typename?: 'SeriesConnection';
  edges: Array<SeriesEdge>;
  pageInfo: PageInfo;
  totalCount: Scalars['Int']['output'];
};

export type SeriesEdge = {
  __typename?: 'SeriesEdge';
  cursor: Scalars['String']['output'];
  node: Series;
};

export type SeriesEffect =
  | 'POOLED'
  | 'RANDOM_INTERCEPT'
  | 'RANDOM_INTERCEPT_AND_SLOPE';

/** A change of state: who, when and why. */
export type SeriesEvent = {
  __typename?: 'SeriesEvent';
  /** create, change, submit, accept, return, retire */
  action: Scalars['String']['output'];
  at: Scalars['DateTime']['output'];
  person: Person;
  remark?: Maybe<Scalars['String']['output']>;
  /** The state it led to. */
  status: SeriesStatus;
};

export type SeriesOffset = {
  __typename?: 'SeriesOffset';
  /** Mean deviation of ln D from the correlation, and its standard uncertainty */
  offset: Scalars['Float']['output'];
  series: Series;
  standardUncertainty: Scalars['Float']['output'];
};

export type SeriesPayload = {
  __typename?: 'SeriesPayload';
  problems: Array<Problem>;
  series?: Maybe<Series>;
};

export type SeriesPoint = {
  __typename?: 'SeriesPoint';
  /** m²/s */
  diffusivity: Scalars['Float']['output'];
  /** m²/s, standard uncertainty independent from point to point */
  diffusivityUncertainty?: Maybe<Scalars['Float']['output']>;
  id: Scalars['ID']['output'];
  /** of the first substance as displayed */
  moleFraction?: Maybe<Scalars['Float']['output']>;
  /** Pa */
  pressure: Scalars['Float']['output'];
  pressureOrigin: PressureOrigin;
  /** Pa, standard uncertainty */
  pressureUncertainty?: Maybe<Scalars['Float']['output']>;
  replicates?: Maybe<Scalars['Int']['output']>;
  /** K */
  temperature: Scalars['Float']['output'];
  /** K, standard uncertainty */
  temperatureUncertainty?: Maybe<Scalars['Float']['output']>;
  uncertaintyOrigin?: Maybe<UncertaintyOrigin>;
};

/** Same fields and units as SeriesPoint. */
export type SeriesPointInput = {
  diffusivity: Scalars['Float']['input'];
  diffusivityUncertainty?: InputMaybe<Scalars['Float']['input']>;
  moleFraction?: InputMaybe<Scalars['Float']['input']>;
  pressure: Scalars['Float']['input'];
  pressureOrigin?: InputMaybe<PressureOrigin>;
  pressureUncertainty?: InputMaybe<Scalars['Float']['input']>;
  replicates?: InputMaybe<Scalars['Int']['input']>;
  temperature: Scalars['Float']['input'];
  temperatureUncertainty?: InputMaybe<Scalars['Float']['input']>;
};

export type SeriesStatus =
  | 'ACCEPTED'
  | 'DRAFT'
  | 'RETIRED'
  | 'RETURNED'
  | 'SUBMITTED';

/** How to cite the version */
export type SheetCitation = {
  __typename?: 'SheetCitation';
  doi?: Maybe<Scalars['String']['output']>;
  /** The same in plain text */
  plain: Scalars['String']['output'];
  /** Title in the quantity (italic) style */
  runs: Array<TextRun>;
};

/** Correlation coefficient between two fitted parameters */
export type SheetCoefficient = {
  __typename?: 'SheetCoefficient';
  /** r(D0, n) as it is set */
  label: Array<TextRun>;
  /** Value as printed, with a true minus */
  printed: Scalars['String']['output'];
  value: Scalars['Float']['output'];
};

/** What a version of a data sheet says, from which the page, the PDF and the CSV are all made. Numbers are SI; texts are typeset in K, kPa, cm²/s. */
export type SheetContent = {
  __typename?: 'SheetContent';
  /** One caution each */
  cautions: Array<Array<TextRun>>;
  citation: SheetCitation;
  /** DS-0042 */
  code: Scalars['String']['output'];
  correlation: SheetCorrelation;
  /** What D is */
  definition: Array<TextRun>;
  estimates: SheetEstimates;
  figures: SheetFigures;
  /** What the sheet is about, in one sentence */
  lead: Array<TextRun>;
  margin: SheetMargin;
  /** edition.revision */
  number: Scalars['String']['output'];
  pointsLeftOut: Array<SheetExcludedPoint>;
  range: SheetRange;
  recommended: RecommendedValues;
  /** The editor’s remarks on single sections */
  remarks: Array<SheetRemark>;
  /** Sections in their order */
  sections: Array<SheetSection>;
  seriesLeftOut: Array<SheetSeries>;
  seriesUsed: Array<SheetSeries>;
  standing: SheetStanding;
  /** Two, in the order of display */
  substances: Array<SheetSubstance>;
  /** The editor’s words */
  summary: Scalars['String']['output'];
  /** Ethanol + nitrogen */
  title: Scalars['String']['output'];
  uncertainty: SheetUncertainty;
  /** Newest first, this one included */
  versions: Array<SheetVersionRow>;
};

/** The correlation the version recommends, set for reading */
export type SheetCorrelation = {
  __typename?: 'SheetCorrelation';
  coefficients: Array<SheetCoefficient>;
  /** k for a level of confidence of 95 % */
  coverageFactor: Scalars['Float']['output'];
  /** ν of Student’s t; null when U is taken from the normal law */
  degreesOfFreedom?: Maybe<Scalars['Float']['output']>;
  equation: Array<EquationPiece>;
  /** Plain-text expression in T (K) and P (Pa), giving D in m²/s, with the numbers in place */
  expression: Scalars['String']['output'];
  /** CorrelationForm */
  form: Scalars['String']['output'];
  /** Power law, … */
  formName: Scalars['String']['output'];
  /** Fitted and fixed parameters, then reference state, then τ */
  parameters: Array<SheetParameter>;
  /** The equation in words, for a screen reader */
  spoken: Scalars['String']['output'];
};

/** An estimate beside the recommended values; it took no part in the fit. */
export type SheetEstimate = {
  __typename?: 'SheetEstimate';
  /** Against the correlation, percent */
  deviations: Scalars['FloatColumn']['output'];
  /** m²/s, at `SheetEstimates.temperatures` */
  diffusivities: Scalars['FloatColumn']['output'];
  method: Scalars['String']['output'];
  /** Where the method and its usual error come from */
  source: Scalars['String']['output'];
  /** Usual mean error of the method, percent, from its source */
  usualMeanError: Scalars['Float']['output'];
};

/** Estimates by kinetic theory and its relatives beside the recommended values */
export type SheetEstimates = {
  __typename?: 'SheetEstimates';
  /** Empty where a constant of a substance is missing or no method reaches the temperatures */
  methods: Array<SheetEstimate>;
  note: Array<TextRun>;
  /** Pa */
  pressure: Scalars['Float']['output'];
  /** K */
  temperatures: Scalars['FloatColumn']['output'];
};

/** A point left out of the fit, with the reason */
export type SheetExcludedPoint = {
  __typename?: 'SheetExcludedPoint';
  /** Deviation from the correlation, percent */
  deviation: Scalars['Float']['output'];
  /** m²/s */
  diffusivity: Scalars['Float']['output'];
  /** Pa */
  pressure: Scalars['Float']['output'];
  reason: Scalars['String']['output'];
  /** Letter of its series */
  seriesKey: Scalars['String']['output'];
  /** K */
  temperature: Scalars['Float']['output'];
};

/** Figure 1, diffusivity against temperature, and figure 2, deviation from the fit, as data; both on one temperature axis. */
export type SheetFigures = {
  __typename?: 'SheetFigures';
  curve: FigureCurve;
  /** Percent; points may lie beyond it */
  deviationAxis: FigureAxis;
  deviationCaption: Array<TextRun>;
  /** m²/s, logarithmic */
  diffusivityAxis: FigureAxis;
  diffusivityCaption: Array<TextRun>;
  estimates: Array<FigureEstimate>;
  /** Pa, the pressure all points are reduced to */
  pressure: Scalars['Float']['output'];
  /** Used first, then left out */
  series: Array<FigureSeries>;
  /** K, logarithmic */
  temperatureAxis: FigureAxis;
};

/** What stands in the margin: state and people, and where the numbers came from */
export type SheetMargin = {
  __typename?: 'SheetMargin';
  /** State, version, range, dates, people */
  entries: Array<MarginEntry>;
  /** Beside the figures */
  figures: Array<Array<TextRun>>;
  /** Beside the correlation: the fit and how it was made */
  fit: Array<Array<TextRun>>;
  /** Number of the fit among those of the pair, for its label */
  fitNumber: Scalars['String']['output'];
  /** Beside the series */
  series: Array<Array<TextRun>>;
};

/** A parameter of the correlation, or one of the constants it is stated at. */
export type SheetParameter = {
  __typename?: 'SheetParameter';
  /** The symbol as it is set */
  label: Array<TextRun>;
  /** exact, fixed by hand, between series, … */
  note?: Maybe<Scalars['String']['output']>;
  /** Value as printed, in K, kPa, cm²/s, concise where it has an uncertainty: 0.12455(50) cm²/s */
  printed: Scalars['String']['output'];
  /** In `unit`; null where the value is exact, fixed or assigned. */
  standardUncertainty?: Maybe<Scalars['Float']['output']>;
  /** As in CorrelationParameter.symbol, or T0, P0, tau, tau_n */
  symbol: Scalars['String']['output'];
  /** UCUM code; `1` for a pure number */
  unit: Scalars['String']['output'];
  /** In `unit` */
  value: Scalars['Float']['output'];
};

/** Where the correlation holds */
export type SheetRange = {
  __typename?: 'SheetRange';
  /** RangeBasis: MEASURED or STATED */
  pressureBasis: Scalars['String']['output'];
  /** Pa */
  pressureMaximum: Scalars['Float']['output'];
  /** Pa */
  pressureMinimum: Scalars['Float']['output'];
  /** 1 kPa to 400 kPa, stated */
  pressurePrinted: Scalars['String']['output'];
  /** What the range rests on, in a sentence or two */
  sentence: Array<TextRun>;
  /** K */
  temperatureMaximum: Scalars['Float']['output'];
  /** K */
  temperatureMinimum: Scalars['Float']['output'];
  /** 283.15 K to 448.15 K */
  temperaturePrinted: Scalars['String']['output'];
};

/** The editor’s remark on one section, in plain words */
export type SheetRemark = {
  __typename?: 'SheetRemark';
  /** SheetSection.id */
  section: Scalars['String']['output'];
  text: Scalars['String']['output'];
};

/** A numbered section of the sheet */
export type SheetSection = {
  __typename?: 'SheetSection';
  /** correlation, figures, recommended, series, estimates, cautions, citation, versions */
  id: Scalars['String']['output'];
  number: Scalars['Int']['output'];
  title: Scalars['String']['output'];
};

/** A series of the sheet, whether its points carried weight or not */
export type SheetSeries = {
  __typename?: 'SheetSeries';
  apparatus?: Maybe<Scalars['String']['output']>;
  /** Relative standard uncertainty common to all points of the series */
  commonRelativeUncertainty?: Maybe<Scalars['Float']['output']>;
  /** Letter of the series in figures and tables: a, b, … */
  key: Scalars['String']['output'];
  /** Number of its colour and shape, from 0; the same on every page */
  mark: Scalars['Int']['output'];
  method: Scalars['String']['output'];
  /** Mean deviation of ln D from the correlation */
  offset?: Maybe<Scalars['Float']['output']>;
  /** Standard uncertainty of the offset */
  offsetStandardUncertainty?: Maybe<Scalars['Float']['output']>;
  /** DataOrigin in words: table, graph, smoothed table, equation, tube runs */
  origin: Scalars['String']['output'];
  /** Points of the series, and how many of them carried weight */
  pointCount: Scalars['Int']['output'];
  /** Pa */
  pressureMaximum: Scalars['Float']['output'];
  /** Pa */
  pressureMinimum: Scalars['Float']['output'];
  /** Why it was left out; null where it carried weight. */
  reason?: Maybe<Scalars['String']['output']>;
  /** Root mean square of u(D)/D, point to point; null where none is known */
  relativeUncertainty?: Maybe<Scalars['Float']['output']>;
  source: Scalars['String']['output'];
  /** K */
  temperatureMaximum: Scalars['Float']['output'];
  /** K */
  temperatureMinimum: Scalars['Float']['output'];
  title: Scalars['String']['output'];
  /** Some u(D) is the usual value of the method, assigned because the source states none */
  uncertaintyAssigned: Scalars['Boolean']['output'];
  weightedPointCount: Scalars['Int']['output'];
};

/** How the version stands today. The only part of a released sheet that may change, because it is no part of what was released. */
export type SheetStanding = {
  __typename?: 'SheetStanding';
  /** What stands above the title where the version is not current */
  banner?: Maybe<Scalars['String']['output']>;
  /** Lower-case hex SHA-256 of the snapshot; null until released */
  contentHash?: Maybe<Scalars['String']['output']>;
  /** Hash of the release before this one in the whole service */
  previousHash?: Maybe<Scalars['String']['output']>;
  /** VersionStatus */
  status: Scalars['String']['output'];
  /** Number of the version that took its place */
  supersededBy?: Maybe<Scalars['String']['output']>;
  /** Word behind the text where the version was never released, or is withdrawn */
  watermark?: Maybe<Scalars['String']['output']>;
  withdrawalReason?: Maybe<Scalars['String']['output']>;
  /** ISO 8601 */
  withdrawnAt?: Maybe<Scalars['String']['output']>;
  /** draft, in review, returned, approved, released, superseded, withdrawn */
  word: Scalars['String']['output'];
};

/** Somebody asked to be told when a version of this sheet is released, superseded or withdrawn. */
export type SheetSubscription = {
  __typename?: 'SheetSubscription';
  sheetId: Scalars['ID']['output'];
  since: Scalars['DateTime']['output'];
};

/** One of the two substances, as the sheet names it. */
export type SheetSubstance = {
  __typename?: 'SheetSubstance';
  /** CAS Registry Number; null where none is assigned. */
  casNumber?: Maybe<Scalars['String']['output']>;
  /** Formula with its subscripts */
  formula: Array<TextRun>;
  /** kg/mol */
  molarMass: Scalars['Float']['output'];
  /** With a capital: Ethanol */
  name: Scalars['String']['output'];
};

/** What the uncertainty is, and what is not in it; each entry is a paragraph. */
export type SheetUncertainty = {
  __typename?: 'SheetUncertainty';
  notIncluded: Array<Array<TextRun>>;
  statement: Array<Array<TextRun>>;
};

/** A version of the sheet in the list of versions */
export type SheetVersionRow = {
  __typename?: 'SheetVersionRow';
  /** What changed; the summary for the first version */
  change: Scalars['String']['output'];
  /** ISO 8601; of the release or the withdrawal, null before */
  date?: Maybe<Scalars['String']['output']>;
  /** 4 November 2026; empty before release */
  datePrinted: Scalars['String']['output'];
  /** The version this content describes */
  isThis: Scalars['Boolean']['output'];
  number: Scalars['String']['output'];
  /** VersionStatus */
  status: Scalars['String']['output'];
  /** Its state in words */
  word: Scalars['String']['output'];
};

/** A range in P that the editor states, with the reason. */
export type StatedPressureRangeInput = {
  /** Pa */
  maximum: Scalars['Float']['input'];
  /** Pa */
  minimum: Scalars['Float']['input'];
  reason: Scalars['String']['input'];
};

export type SubscriptionPayload = {
  __typename?: 'SubscriptionPayload';
  problems: Array<Problem>;
  /** The subscription made or ended. */
  subscription?: Maybe<SheetSubscription>;
};

export type Substance = Node & {
  __typename?: 'Substance';
  /** CAS Registry Number with a valid check digit; null where none is assigned. */
  casNumber?: Maybe<Scalars['String']['output']>;
  cautions: Array<Caution>;
  /** Of a mixture bath such as air; null for a pure substance. */
  composition?: Maybe<Array<BathComponent>>;
  constants: Array<SubstanceConstant>;
  formula: Scalars['String']['output'];
  id: Scalars['ID']['output'];
  inchi?: Maybe<Scalars['String']['output']>;
  /** Counts changes; an update names the one it was made from. */
  lockVersion: Scalars['Int']['output'];
  /** kg/mol */
  molarMass: Scalars['Float']['output'];
  /** English name: helium, argon, water */
  name: Scalars['String']['output'];
  synonyms: Array<Scalars['String']['output']>;
};

export type SubstanceConnection = {
  __typename?: 'SubstanceConnection';
  edges: Array<SubstanceEdge>;
  pageInfo: PageInfo;
  totalCount: Scalars['Int']['output'];
};

/** One constant or equation of a substance, with its range and source. */
export type SubstanceConstant = {
  __typename?: 'SubstanceConstant';
  /** Of the equation; none for a plain value. */
  coefficients: Array<Coefficient>;
  /** Of an equation in T; null for a plain value. */
  form?: Maybe<SubstanceEquationForm>;
  kind: SubstanceConstantKind;
  /** What it is, in words. */
  label: Scalars['String']['output'];
  note?: Maybe<Scalars['String']['output']>;
  /** Relative standard uncertainty, where the source states one. */
  relativeUncertainty?: Maybe<Scalars['Float']['output']>;
  source: Scalars['String']['output'];
  /** Its usual symbol. */
  symbol: Scalars['String']['output'];
  /** K */
  temperatureMaximum?: Maybe<Scalars['Float']['output']>;
  /** K */
  temperatureMinimum?: Maybe<Scalars['Float']['output']>;
  /** UCUM code of the value, or of what the equation gives. */
  unit: Scalars['String']['output'];
  /** In `unit`; null for an equation. */
  value?: Maybe<Scalars['Float']['output']>;
};

/** Same fields and units as SubstanceConstant. */
export type SubstanceConstantInput = {
  coefficients?: InputMaybe<Array<CoefficientInput>>;
  form?: InputMaybe<SubstanceEquationForm>;
  kind: SubstanceConstantKind;
  note?: InputMaybe<Scalars['String']['input']>;
  relativeUncertainty?: InputMaybe<Scalars['Float']['input']>;
  source: Scalars['String']['input'];
  temperatureMaximum?: InputMaybe<Scalars['Float']['input']>;
  temperatureMinimum?: InputMaybe<Scalars['Float']['input']>;
  unit: Scalars['String']['input'];
  value?: InputMaybe<Scalars['Float']['input']>;
};

export type SubstanceConstantKind =
  | 'DIFFUSION_VOLUME'
  | 'ENTHALPY_OF_VAPORISATION'
  | 'EXPOSURE_LIMIT_SHORT_TERM'
  | 'EXPOSURE_LIMIT_TIME_WEIGHTED'
  | 'FLASH_POINT'
  | 'LENNARD_JONES_DEPTH'
  | 'LENNARD_JONES_DIAMETER'
  | 'LIQUID_DENSITY'
  | 'LIQUID_MOLAR_DENSITY'
  | 'LIQUID_MOLAR_VOLUME_AT_BOILING_POINT'
  | 'LOWER_FLAMMABLE_LIMIT'
  | 'NORMAL_BOILING_POINT'
  | 'UPPER_FLAMMABLE_LIMIT'
  | 'VAPOUR_PRESSURE'
  | 'WILKE_LEE_DEPTH'
  | 'WILKE_LEE_DIAMETER';

export type SubstanceEdge = {
  __typename?: 'SubstanceEdge';
  cursor: Scalars['String']['output'];
  node: Substance;
};

/** Equations in T, by their usual names. */
export type SubstanceEquationForm =
  | 'ANTOINE'
  | 'FIVE_TERM'
  | 'RACKETT'
  | 'TAU_POWERS'
  | 'WAGNER';

export type SubstanceInput = {
  casNumber?: InputMaybe<Scalars['String']['input']>;
  constants?: InputMaybe<Array<SubstanceConstantInput>>;
  formula: Scalars['String']['input'];
  inchi?: InputMaybe<Scalars['String']['input']>;
  /** kg/mol */
  molarMass: Scalars['Float']['input'];
  name: Scalars['String']['input'];
  synonyms?: InputMaybe<Array<Scalars['String']['input']>>;
};

export type SubstancePayload = {
  __typename?: 'SubstancePayload';
  problems: Array<Problem>;
  substance?: Maybe<Substance>;
};

/** Names one substance: exactly one field is given. `name` matches a name, formula or synonym without regard to case. */
export type SubstanceRef =
  { casNumber: Scalars['String']['input']; id?: never; name?: never; }
  |  { casNumber?: never; id: Scalars['ID']['input']; name?: never; }
  |  { casNumber?: never; id?: never; name: Scalars['String']['input']; };

/** A series or version that waits for somebody. */
export type Task = {
  __typename?: 'Task';
  kind: TaskKind;
  /** What was said at the last change of state. */
  remark?: Maybe<Scalars['String']['output']>;
  series?: Maybe<Series>;
  since: Scalars['DateTime']['output'];
  version?: Maybe<DataSheetVersion>;
};

export type TaskKind =
  | 'ACCEPT_SERIES'
  | 'FINISH_SERIES'
  | 'MEND_SERIES'
  | 'MEND_VERSION'
  | 'RELEASE_VERSION'
  | 'REVIEW_VERSION'
  | 'SUBMIT_VERSION';

/** A piece of text in one style. The runs of a text, joined, are its plain reading. */
export type TextRun = {
  __typename?: 'TextRun';
  style: TextStyle;
  text: Scalars['String']['output'];
};

/** How a run of text is set: quantities are italic, units, numbers and labels upright. */
export type TextStyle =
  | 'PLAIN'
  | 'QUANTITY'
  | 'STRONG'
  | 'SUBSCRIPT'
  | 'SUPERSCRIPT';

export type UncertaintyKind =
  /** of the recommended value */
  | 'MEAN'
  /** of one new laboratory's series (a prediction); without a between-series deviation: error NOT_AVAILABLE */
  | 'NEW_SERIES';

export type UncertaintyOrigin =
  | 'ASSIGNED'
  | 'STATED';

/** The words of a draft or returned version, whole. Numbers come from the fit. */
export type UpdateDraftInput = {
  changeNote?: InputMaybe<Scalars['String']['input']>;
  /** The count of changes the editor was looking at; CONFLICT when it has grown. */
  lockVersion: Scalars['Int']['input'];
  /** Absent: the fit's own. */
  pressureRange?: InputMaybe<StatedPressureRangeInput>;
  remarks?: InputMaybe<Array<SectionRemarkInput>>;
  summary: Scalars['String']['input'];
  versionId: Scalars['ID']['input'];
};

export type UpdatePersonInput = {
  /** Unchanged when absent. Disabling ends all sessions. */
  disabled?: InputMaybe<Scalars['Boolean']['input']>;
  id: Scalars['ID']['input'];
  /** Unchanged when absent. */
  roles?: InputMaybe<Array<Role>>;
};

/** A draft or returned series in its new form, whole. An edited returned one is a draft again. */
export type UpdateSeriesInput = {
  apparatus?: InputMaybe<Scalars['String']['input']>;
  commonRelativeUncertainty?: InputMaybe<Scalars['Float']['input']>;
  dataOrigin?: InputMaybe<DataOrigin>;
  id: Scalars['ID']['input'];
  /** The count of changes the person was looking at; CONFLICT when it has grown. */
  lockVersion: Scalars['Int']['input'];
  method: Scalars['String']['input'];
  /** All points; absent leaves them as they are. */
  points?: InputMaybe<Array<SeriesPointInput>>;
  sameDataAsId?: InputMaybe<Scalars['ID']['input']>;
  /** Free text or DOI */
  source: Scalars['String']['input'];
  title: Scalars['String']['input'];
};

export type UpdateSubstanceInput = {
  casNumber?: InputMaybe<Scalars['String']['input']>;
  constants?: InputMaybe<Array<SubstanceConstantInput>>;
  formula: Scalars['String']['input'];
  id: Scalars['ID']['input'];
  inchi?: InputMaybe<Scalars['String']['input']>;
  /** The count of changes the editor was looking at; CONFLICT when it has grown. */
  lockVersion: Scalars['Int']['input'];
  /** kg/mol */
  molarMass: Scalars['Float']['input'];
  name: Scalars['String']['input'];
  synonyms?: InputMaybe<Array<Scalars['String']['input']>>;
};

export type ValidityRange = {
  __typename?: 'ValidityRange';
  pressureBasis: RangeBasis;
  /** Pa */
  pressureMaximum: Scalars['Float']['output'];
  /** Pa */
  pressureMinimum: Scalars['Float']['output'];
  /** K */
  temperatureMaximum: Scalars['Float']['output'];
  /** K */
  temperatureMinimum: Scalars['Float']['output'];
};

/** A change of state: who, when and why. */
export type VersionEvent = {
  __typename?: 'VersionEvent';
  /** draft, change, submit, approve, return, release, supersede, withdraw */
  action: Scalars['String']['output'];
  at: Scalars['DateTime']['output'];
  person: Person;
  remark?: Maybe<Scalars['String']['output']>;
  /** The state it led to. */
  status: VersionStatus;
};

export type VersionStatus =
  | 'APPROVED'
  | 'DRAFT'
  | 'IN_REVIEW'
  | 'RELEASED'
  | 'RETURNED'
  | 'SUPERSEDED'
  | 'WITHDRAWN';

/** A doubt that stops nothing. */
export type Warning = {
  __typename?: 'Warning';
  code: Scalars['String']['output'];
  message: Scalars['String']['output'];
  path?: Maybe<Scalars['String']['output']>;
};

export type Weighting =
  /** u(D), u(T) and u(P) */
  | 'EFFECTIVE_VARIANCE'
  | 'EQUAL'
  /** u(D) alone */
  | 'STATED';

export type PeopleQueryVariables = Exact<{ [key: string]: never; }>;


export type PeopleQuery = { __typename?: 'Query', people: Array<{ __typename?: 'Person', id: string, name: string, email?: string | null, roles: Array<Role>, accountStatus?: AccountStatus | null, lastSeenAt?: string | null }> };

export type AccountRowFragment = { __typename?: 'Person', id: string, name: string, email?: string | null, roles: Array<Role>, accountStatus?: AccountStatus | null, lastSeenAt?: string | null };

export type InvitePersonMutationVariables = Exact<{
  input: InvitePersonInput;
}>;


export type InvitePersonMutation = { __typename?: 'Mutation', invitePerson: { __typename?: 'PersonPayload', person?: { __typename?: 'Person', id: string, name: string, email?: string | null, roles: Array<Role>, accountStatus?: AccountStatus | null, lastSeenAt?: string | null } | null, problems: Array<{ __typename?: 'Problem', message: string, path?: string | null }> } };

export type UpdatePersonMutationVariables = Exact<{
  input: UpdatePersonInput;
}>;


export type UpdatePersonMutation = { __typename?: 'Mutation', updatePerson: { __typename?: 'PersonPayload', person?: { __typename?: 'Person', id: string, name: string, email?: string | null, roles: Array<Role>, accountStatus?: AccountStatus | null, lastSeenAt?: string | null } | null, problems: Array<{ __typename?: 'Problem', message: string, path?: string | null }> } };

export type JobsQueryVariables = Exact<{ [key: string]: never; }>;


export type JobsQuery = { __typename?: 'Query', jobs: { __typename?: 'Jobs', queues: Array<{ __typename?: 'JobQueue', queue: string, waiting: number, active: number, completed: number, failed: number }>, failures: Array<{ __typename?: 'FailedJob', id: string, queue: string, failedAt: string, attempts: number, reason: string }> } };

export type ApiKeysQueryVariables = Exact<{ [key: string]: never; }>;


export type ApiKeysQuery = { __typename?: 'Query', apiKeys: Array<{ __typename?: 'ApiKey', id: string, name: string, prefix: string, createdAt: string, expiresAt?: string | null, lastUsedAt?: string | null, revokedAt?: string | null }> };

export type CreateApiKeyMutationVariables = Exact<{
  name: Scalars['String']['input'];
  expiresInDays?: InputMaybe<Scalars['Int']['input']>;
}>;


export type CreateApiKeyMutation = { __typename?: 'Mutation', createApiKey: { __typename?: 'ApiKeyPayload', secret?: string | null, apiKey?: { __typename?: 'ApiKey', id: string, name: string, prefix: string, createdAt: string, expiresAt?: string | null, lastUsedAt?: string | null, revokedAt?: string | null } | null, problems: Array<{ __typename?: 'Problem', code: string, message: string, path?: string | null }> } };

export type RevokeApiKeyMutationVariables = Exact<{
  id: Scalars['ID']['input'];
}>;


export type RevokeApiKeyMutation = { __typename?: 'Mutation', revokeApiKey: { __typename?: 'ApiKeyPayload', apiKey?: { __typename?: 'ApiKey', id: string, revokedAt?: string | null } | null, problems: Array<{ __typename?: 'Problem', code: string, message: string, path?: string | null }> } };

export type SheetsToChooseQueryVariables = Exact<{ [key: string]: never; }>;


export type SheetsToChooseQuery = { __typename?: 'Query', dataSheets: { __typename?: 'DataSheetConnection', edges: Array<{ __typename?: 'DataSheetEdge', node: { __typename?: 'DataSheet', code: string, pair: { __typename?: 'GasPair', substances: Array<{ __typename?: 'Substance', name: string }> }, current?: { __typename?: 'DataSheetVersion', number: string } | null } }> } };

export type VersionsToChooseQueryVariables = Exact<{
  code: Scalars['String']['input'];
}>;


export type VersionsToChooseQuery = { __typename?: 'Query', dataSheet?: { __typename?: 'DataSheet', id: string, code: string, versions: Array<{ __typename?: 'DataSheetVersion', id: string, number: string, status: VersionStatus, correlation: { __typename?: 'Correlation', validity: { __typename?: 'ValidityRange', temperatureMinimum: number, temperatureMaximum: number, pressureMinimum: number, pressureMaximum: number } } }> } | null };

export type ExampleAnswerQueryVariables = Exact<{
  code: Scalars['String']['input'];
  number: Scalars['String']['input'];
  T: Scalars['FloatColumn']['input'];
  P: Scalars['FloatColumn']['input'];
}>;


export type ExampleAnswerQuery = { __typename?: 'Query', dataSheet?: { __typename?: 'DataSheet', version?: { __typename?: 'DataSheetVersion', status: VersionStatus, contentHash?: string | null, correlation: { __typename?: 'Correlation', evaluate: { __typename?: 'Evaluation', diffusivities: number[], expandedUncertainties: number[], coverageFactor: number } } } | null } | null };

export type BringInSubstancesQueryVariables = Exact<{
  search: Scalars['String']['input'];
}>;


export type BringInSubstancesQuery = { __typename?: 'Query', substances: { __typename?: 'SubstanceConnection', edges: Array<{ __typename?: 'SubstanceEdge', node: { __typename?: 'Substance', id: string, name: string, formula: string, casNumber?: string | null, synonyms: Array<string> } }> } };

export type BringInPairQueryVariables = Exact<{
  id: Scalars['ID']['input'];
}>;


export type BringInPairQuery = { __typename?: 'Query', node?:
    | { __typename?: 'DataSheet', id: string }
    | { __typename?: 'DataSheetVersion', id: string }
    | { __typename?: 'Fit', id: string }
    | { __typename?: 'GasPair', id: string, substances: Array<{ __typename?: 'Substance', id: string, name: string }> }
    | { __typename?: 'Person', id: string }
    | { __typename?: 'Series', id: string }
    | { __typename?: 'Substance', id: string }
   | null };

export type BringInSeriesQueryVariables = Exact<{
  a: SubstanceRef;
  b: SubstanceRef;
}>;


export type BringInSeriesQuery = { __typename?: 'Query', pair?: { __typename?: 'GasPair', id: string, series: { __typename?: 'SeriesConnection', edges: Array<{ __typename?: 'SeriesEdge', node: { __typename?: 'Series', id: string, title: string, status: SeriesStatus } }> } } | null };

export type CatalogueQueryVariables = Exact<{
  search?: InputMaybe<Scalars['String']['input']>;
  after?: InputMaybe<Scalars['String']['input']>;
}>;


export type CatalogueQuery = { __typename?: 'Query', dataSheets: { __typename?: 'DataSheetConnection', pageInfo: { __typename?: 'PageInfo', hasNextPage: boolean, endCursor?: string | null }, edges: Array<{ __typename?: 'DataSheetEdge', node: { __typename?: 'DataSheet', id: string, code: string, pair: { __typename?: 'GasPair', substances: Array<{ __typename?: 'Substance', name: string, formula: string }> }, current?: { __typename?: 'DataSheetVersion', number: string, releasedAt?: string | null, correlation: { __typename?: 'Correlation', parameters: Array<{ __typename?: 'CorrelationParameter', symbol: string, value: number, standardUncertainty?: number | null }>, validity: { __typename?: 'ValidityRange', temperatureMinimum: number, temperatureMaximum: number, pressureMinimum: number, pressureMaximum: number }, evaluate: { __typename?: 'Evaluation', diffusivities: number[], expandedUncertainties: number[], outside: Array<number> } } } | null } }> } };

export type CatalogueNewsQueryVariables = Exact<{ [key: string]: never; }>;


export type CatalogueNewsQuery = { __typename?: 'Query', latestReleases: Array<{ __typename?: 'DataSheetVersion', releasedAt?: string | null, changeNote?: string | null, summary: string, id: string, number: string, status: VersionStatus, sheet: { __typename?: 'DataSheet', id: string, code: string, pair: { __typename?: 'GasPair', id: string, substances: Array<{ __typename?: 'Substance', id: string, name: string }> } } }>, latestWithdrawals: Array<{ __typename?: 'DataSheetVersion', withdrawnAt?: string | null, withdrawalReason?: string | null, id: string, number: string, status: VersionStatus, sheet: { __typename?: 'DataSheet', id: string, code: string, pair: { __typename?: 'GasPair', id: string, substances: Array<{ __typename?: 'Substance', id: string, name: string }> } } }> };

export type NewsVersionFragment = { __typename?: 'DataSheetVersion', id: string, number: string, status: VersionStatus, sheet: { __typename?: 'DataSheet', id: string, code: string, pair: { __typename?: 'GasPair', id: string, substances: Array<{ __typename?: 'Substance', id: string, name: string }> } } };

export type CompareFitsQueryVariables = Exact<{
  first: Scalars['ID']['input'];
  second: Scalars['ID']['input'];
  third: Scalars['ID']['input'];
  fourth: Scalars['ID']['input'];
  hasThird: Scalars['Boolean']['input'];
  hasFourth: Scalars['Boolean']['input'];
  temperatures: Scalars['FloatColumn']['input'];
  pressure: Scalars['FloatColumn']['input'];
}>;


export type CompareFitsQuery = { __typename?: 'Query', first?: { __typename?: 'Fit', id: string, number: number, correlation: { __typename?: 'Correlation', evaluate: { __typename?: 'Evaluation', diffusivities: number[], standardUncertainties: number[], expandedUncertainties: number[] } } } | null, second?: { __typename?: 'Fit', id: string, number: number, correlation: { __typename?: 'Correlation', evaluate: { __typename?: 'Evaluation', diffusivities: number[], standardUncertainties: number[], expandedUncertainties: number[] } } } | null, third?: { __typename?: 'Fit', id: string, number: number, correlation: { __typename?: 'Correlation', evaluate: { __typename?: 'Evaluation', diffusivities: number[], standardUncertainties: number[], expandedUncertainties: number[] } } } | null, fourth?: { __typename?: 'Fit', id: string, number: number, correlation: { __typename?: 'Correlation', evaluate: { __typename?: 'Evaluation', diffusivities: number[], standardUncertainties: number[], expandedUncertainties: number[] } } } | null };

export type ComparedFitFragment = { __typename?: 'Fit', id: string, number: number, correlation: { __typename?: 'Correlation', evaluate: { __typename?: 'Evaluation', diffusivities: number[], standardUncertainties: number[], expandedUncertainties: number[] } } };

export type FitsToCompareQueryVariables = Exact<{
  id: Scalars['ID']['input'];
}>;


export type FitsToCompareQuery = { __typename?: 'Query', fit?: { __typename?: 'Fit', id: string, pair: { __typename?: 'GasPair', id: string, substances: Array<{ __typename?: 'Substance', id: string, name: string }>, fits: Array<{ __typename?: 'Fit', id: string, number: number, createdAt: string, objective: Objective, weighting: Weighting, loss: Loss, seriesEffect: SeriesEffect, createdBy?: { __typename?: 'Person', id: string, name: string } | null, series: Array<{ __typename?: 'Series', id: string }>, leftOutSeries: Array<{ __typename?: 'LeftOutSeries', reason: string, series: { __typename?: 'Series', id: string } }>, excludedPoints: Array<{ __typename?: 'ExcludedPoint', reason: string, point: { __typename?: 'SeriesPoint', id: string } }>, statistics: { __typename?: 'FitStatistics', pointCount: number, seriesCount: number, residualDegreesOfFreedom: number, chiSquare?: number | null, reducedChiSquare?: number | null, chiSquareProbability?: number | null, residualStandardError?: number | null, aicc?: number | null, betweenSeriesDeviation?: number | null, betweenSeriesOrigin?: UncertaintyOrigin | null, cochranQ?: number | null, iSquared?: number | null }, correlation: { __typename?: 'Correlation', form: CorrelationForm, expression: string, referenceTemperature: number, referencePressure: number, degreesOfFreedom?: number | null, parameters: Array<{ __typename?: 'CorrelationParameter', symbol: string, value: number, standardUncertainty?: number | null, unit: string }>, validity: { __typename?: 'ValidityRange', temperatureMinimum: number, temperatureMaximum: number, pressureMinimum: number, pressureMaximum: number, pressureBasis: RangeBasis } } }> } } | null };

export type FitDetailQueryVariables = Exact<{
  id: Scalars['ID']['input'];
}>;


export type FitDetailQuery = { __typename?: 'Query', fit?: { __typename?: 'Fit', engineVersion: string, id: string, number: number, createdAt: string, objective: Objective, weighting: Weighting, loss: Loss, seriesEffect: SeriesEffect, pair: { __typename?: 'GasPair', id: string, substances: Array<{ __typename?: 'Substance', id: string, name: string }>, dataSheet?: { __typename?: 'DataSheet', id: string, code: string, versions: Array<{ __typename?: 'DataSheetVersion', id: string, number: string, status: VersionStatus, fit: { __typename?: 'Fit', id: string } }> } | null, series: { __typename?: 'SeriesConnection', edges: Array<{ __typename?: 'SeriesEdge', node: { __typename?: 'Series', id: string, title: string, status: SeriesStatus, source: string, method: string, apparatus?: string | null, commonRelativeUncertainty?: number | null, sameDataAs?: { __typename?: 'Series', id: string, title: string } | null, submittedBy?: { __typename?: 'Person', id: string, name: string } | null, points: Array<{ __typename?: 'SeriesPoint', id: string, temperature: number, pressure: number, diffusivity: number, diffusivityUncertainty?: number | null, uncertaintyOrigin?: UncertaintyOrigin | null }> } }> } }, analysis: { __typename?: 'FitAnalysis', correlationMatrix: Array<Array<number>>, betweenSeriesSlopeDeviation?: number | null, correlation: { __typename?: 'Correlation', form: CorrelationForm, expression: string, referenceTemperature: number, referencePressure: number, degreesOfFreedom?: number | null, coverage: { __typename?: 'Evaluation', coverageFactor: number }, parameters: Array<{ __typename?: 'CorrelationParameter', symbol: string, value: number, standardUncertainty?: number | null, unit: string }>, validity: { __typename?: 'ValidityRange', temperatureMinimum: number, temperatureMaximum: number, pressureMinimum: number, pressureMaximum: number, pressureBasis: RangeBasis } }, statistics: { __typename?: 'FitStatistics', pointCount: number, seriesCount: number, residualDegreesOfFreedom: number, chiSquare?: number | null, reducedChiSquare?: number | null, chiSquareProbability?: number | null, residualStandardError?: number | null, aicc?: number | null, betweenSeriesDeviation?: number | null, betweenSeriesOrigin?: UncertaintyOrigin | null, cochranQ?: number | null, iSquared?: number | null }, warnings: Array<{ __typename?: 'Warning', code: string, message: string }>, series: Array<{ __typename?: 'SeriesAnalysis', seriesId: string, carriesWeight: boolean, offset: number, offsetStandardUncertainty: number, fitted: number[], lnDeviations: number[], standardizedResiduals: number[], weights: number[] }> }, createdBy?: { __typename?: 'Person', id: string, name: string } | null, series: Array<{ __typename?: 'Series', id: string }>, leftOutSeries: Array<{ __typename?: 'LeftOutSeries', reason: string, series: { __typename?: 'Series', id: string } }>, excludedPoints: Array<{ __typename?: 'ExcludedPoint', reason: string, point: { __typename?: 'SeriesPoint', id: string } }>, statistics: { __typename?: 'FitStatistics', pointCount: number, seriesCount: number, residualDegreesOfFreedom: number, chiSquare?: number | null, reducedChiSquare?: number | null, chiSquareProbability?: number | null, residualStandardError?: number | null, aicc?: number | null, betweenSeriesDeviation?: number | null, betweenSeriesOrigin?: UncertaintyOrigin | null, cochranQ?: number | null, iSquared?: number | null }, correlation: { __typename?: 'Correlation', form: CorrelationForm, expression: string, referenceTemperature: number, referencePressure: number, degreesOfFreedom?: number | null, parameters: Array<{ __typename?: 'CorrelationParameter', symbol: string, value: number, standardUncertainty?: number | null, unit: string }>, validity: { __typename?: 'ValidityRange', temperatureMinimum: number, temperatureMaximum: number, pressureMinimum: number, pressureMaximum: number, pressureBasis: RangeBasis } } } | null };

export type ReproduceFitQueryVariables = Exact<{
  input: FitCorrelationInput;
}>;


export type ReproduceFitQuery = { __typename?: 'Query', previewFit: { __typename?: 'FitPreviewPayload', problems: Array<{ __typename?: 'Problem', code: string, message: string }>, analysis?: { __typename?: 'FitAnalysis', correlation: { __typename?: 'Correlation', parameters: Array<{ __typename?: 'CorrelationParameter', symbol: string, value: number, standardUncertainty?: number | null, unit: string }> } } | null } };

export type CorrelationNumbersFragment = { __typename?: 'Correlation', form: CorrelationForm, expression: string, referenceTemperature: number, referencePressure: number, degreesOfFreedom?: number | null, parameters: Array<{ __typename?: 'CorrelationParameter', symbol: string, value: number, standardUncertainty?: number | null, unit: string }>, validity: { __typename?: 'ValidityRange', temperatureMinimum: number, temperatureMaximum: number, pressureMinimum: number, pressureMaximum: number, pressureBasis: RangeBasis } };

export type StatisticsNumbersFragment = { __typename?: 'FitStatistics', pointCount: number, seriesCount: number, residualDegreesOfFreedom: number, chiSquare?: number | null, reducedChiSquare?: number | null, chiSquareProbability?: number | null, residualStandardError?: number | null, aicc?: number | null, betweenSeriesDeviation?: number | null, betweenSeriesOrigin?: UncertaintyOrigin | null, cochranQ?: number | null, iSquared?: number | null };

export type AnalysisNumbersFragment = { __typename?: 'FitAnalysis', correlationMatrix: Array<Array<number>>, betweenSeriesSlopeDeviation?: number | null, statistics: { __typename?: 'FitStatistics', pointCount: number, seriesCount: number, residualDegreesOfFreedom: number, chiSquare?: number | null, reducedChiSquare?: number | null, chiSquareProbability?: number | null, residualStandardError?: number | null, aicc?: number | null, betweenSeriesDeviation?: number | null, betweenSeriesOrigin?: UncertaintyOrigin | null, cochranQ?: number | null, iSquared?: number | null }, warnings: Array<{ __typename?: 'Warning', code: string, message: string }>, series: Array<{ __typename?: 'SeriesAnalysis', seriesId: string, carriesWeight: boolean, offset: number, offsetStandardUncertainty: number, fitted: number[], lnDeviations: number[], standardizedResiduals: number[], weights: number[] }> };

export type FitSeriesFragment = { __typename?: 'Series', id: string, title: string, status: SeriesStatus, source: string, method: string, apparatus?: string | null, commonRelativeUncertainty?: number | null, sameDataAs?: { __typename?: 'Series', id: string, title: string } | null, submittedBy?: { __typename?: 'Person', id: string, name: string } | null, points: Array<{ __typename?: 'SeriesPoint', id: string, temperature: number, pressure: number, diffusivity: number, diffusivityUncertainty?: number | null, uncertaintyOrigin?: UncertaintyOrigin | null }> };

export type KeptFitFragment = { __typename?: 'Fit', id: string, number: number, createdAt: string, objective: Objective, weighting: Weighting, loss: Loss, seriesEffect: SeriesEffect, createdBy?: { __typename?: 'Person', id: string, name: string } | null, series: Array<{ __typename?: 'Series', id: string }>, leftOutSeries: Array<{ __typename?: 'LeftOutSeries', reason: string, series: { __typename?: 'Series', id: string } }>, excludedPoints: Array<{ __typename?: 'ExcludedPoint', reason: string, point: { __typename?: 'SeriesPoint', id: string } }>, statistics: { __typename?: 'FitStatistics', pointCount: number, seriesCount: number, residualDegreesOfFreedom: number, chiSquare?: number | null, reducedChiSquare?: number | null, chiSquareProbability?: number | null, residualStandardError?: number | null, aicc?: number | null, betweenSeriesDeviation?: number | null, betweenSeriesOrigin?: UncertaintyOrigin | null, cochranQ?: number | null, iSquared?: number | null }, correlation: { __typename?: 'Correlation', form: CorrelationForm, expression: string, referenceTemperature: number, referencePressure: number, degreesOfFreedom?: number | null, parameters: Array<{ __typename?: 'CorrelationParameter', symbol: string, value: number, standardUncertainty?: number | null, unit: string }>, validity: { __typename?: 'ValidityRange', temperatureMinimum: number, temperatureMaximum: number, pressureMinimum: number, pressureMaximum: number, pressureBasis: RangeBasis } } };

export type WorkspaceQueryVariables = Exact<{
  id: Scalars['ID']['input'];
}>;


export type WorkspaceQuery = { __typename?: 'Query', pairById?: { __typename?: 'GasPair', id: string, substances: Array<{ __typename?: 'Substance', id: string, name: string, formula: string }>, dataSheet?: { __typename?: 'DataSheet', id: string, code: string, current?: { __typename?: 'DataSheetVersion', id: string, number: string } | null, versions: Array<{ __typename?: 'DataSheetVersion', id: string, number: string, status: VersionStatus, fit: { __typename?: 'Fit', id: string } }> } | null, series: { __typename?: 'SeriesConnection', totalCount: number, edges: Array<{ __typename?: 'SeriesEdge', node: { __typename?: 'Series', id: string, title: string, status: SeriesStatus, source: string, method: string, apparatus?: string | null, commonRelativeUncertainty?: number | null, sameDataAs?: { __typename?: 'Series', id: string, title: string } | null, submittedBy?: { __typename?: 'Person', id: string, name: string } | null, points: Array<{ __typename?: 'SeriesPoint', id: string, temperature: number, pressure: number, diffusivity: number, diffusivityUncertainty?: number | null, uncertaintyOrigin?: UncertaintyOrigin | null }> } }> }, fits: Array<{ __typename?: 'Fit', id: string, number: number, createdAt: string, objective: Objective, weighting: Weighting, loss: Loss, seriesEffect: SeriesEffect, createdBy?: { __typename?: 'Person', id: string, name: string } | null, series: Array<{ __typename?: 'Series', id: string }>, leftOutSeries: Array<{ __typename?: 'LeftOutSeries', reason: string, series: { __typename?: 'Series', id: string } }>, excludedPoints: Array<{ __typename?: 'ExcludedPoint', reason: string, point: { __typename?: 'SeriesPoint', id: string } }>, statistics: { __typename?: 'FitStatistics', pointCount: number, seriesCount: number, residualDegreesOfFreedom: number, chiSquare?: number | null, reducedChiSquare?: number | null, chiSquareProbability?: number | null, residualStandardError?: number | null, aicc?: number | null, betweenSeriesDeviation?: number | null, betweenSeriesOrigin?: UncertaintyOrigin | null, cochranQ?: number | null, iSquared?: number | null }, correlation: { __typename?: 'Correlation', form: CorrelationForm, expression: string, referenceTemperature: number, referencePressure: number, degreesOfFreedom?: number | null, parameters: Array<{ __typename?: 'CorrelationParameter', symbol: string, value: number, standardUncertainty?: number | null, unit: string }>, validity: { __typename?: 'ValidityRange', temperatureMinimum: number, temperatureMaximum: number, pressureMinimum: number, pressureMaximum: number, pressureBasis: RangeBasis } } }> } | null };

export type PreviewFitQueryVariables = Exact<{
  input: FitCorrelationInput;
  temperatures: Scalars['FloatColumn']['input'];
  pressure: Scalars['FloatColumn']['input'];
  withPrediction: Scalars['Boolean']['input'];
}>;


export type PreviewFitQuery = { __typename?: 'Query', previewFit: { __typename?: 'FitPreviewPayload', problems: Array<{ __typename?: 'Problem', code: string, message: string, path?: string | null }>, analysis?: { __typename?: 'FitAnalysis', correlationMatrix: Array<Array<number>>, betweenSeriesSlopeDeviation?: number | null, correlation: { __typename?: 'Correlation', form: CorrelationForm, expression: string, referenceTemperature: number, referencePressure: number, degreesOfFreedom?: number | null, curve: { __typename?: 'Evaluation', diffusivities: number[], expandedUncertainties: number[] }, newLaboratory?: { __typename?: 'Evaluation', expandedUncertainties: number[] }, parameters: Array<{ __typename?: 'CorrelationParameter', symbol: string, value: number, standardUncertainty?: number | null, unit: string }>, validity: { __typename?: 'ValidityRange', temperatureMinimum: number, temperatureMaximum: number, pressureMinimum: number, pressureMaximum: number, pressureBasis: RangeBasis } }, statistics: { __typename?: 'FitStatistics', pointCount: number, seriesCount: number, residualDegreesOfFreedom: number, chiSquare?: number | null, reducedChiSquare?: number | null, chiSquareProbability?: number | null, residualStandardError?: number | null, aicc?: number | null, betweenSeriesDeviation?: number | null, betweenSeriesOrigin?: UncertaintyOrigin | null, cochranQ?: number | null, iSquared?: number | null }, warnings: Array<{ __typename?: 'Warning', code: string, message: string }>, series: Array<{ __typename?: 'SeriesAnalysis', seriesId: string, carriesWeight: boolean, offset: number, offsetStandardUncertainty: number, fitted: number[], lnDeviations: number[], standardizedResiduals: number[], weights: number[] }> } | null } };

export type PairEstimatesQueryVariables = Exact<{
  id: Scalars['ID']['input'];
  temperatures: Scalars['FloatColumn']['input'];
  pressure: Scalars['Float']['input'];
}>;


export type PairEstimatesQuery = { __typename?: 'Query', pairById?: { __typename?: 'GasPair', id: string, estimates: Array<{ __typename?: 'PairEstimate', method: string, label: string, diffusivities: number[], usualRelativeError: number, source: string }> } | null };

export type KeepFitMutationVariables = Exact<{
  input: FitCorrelationInput;
}>;


export type KeepFitMutation = { __typename?: 'Mutation', fitCorrelation: { __typename?: 'FitPayload', problems: Array<{ __typename?: 'Problem', code: string, message: string, path?: string | null }>, fit?: { __typename?: 'Fit', id: string, number: number, createdAt: string, objective: Objective, weighting: Weighting, loss: Loss, seriesEffect: SeriesEffect, createdBy?: { __typename?: 'Person', id: string, name: string } | null, series: Array<{ __typename?: 'Series', id: string }>, leftOutSeries: Array<{ __typename?: 'LeftOutSeries', reason: string, series: { __typename?: 'Series', id: string } }>, excludedPoints: Array<{ __typename?: 'ExcludedPoint', reason: string, point: { __typename?: 'SeriesPoint', id: string } }>, statistics: { __typename?: 'FitStatistics', pointCount: number, seriesCount: number, residualDegreesOfFreedom: number, chiSquare?: number | null, reducedChiSquare?: number | null, chiSquareProbability?: number | null, residualStandardError?: number | null, aicc?: number | null, betweenSeriesDeviation?: number | null, betweenSeriesOrigin?: UncertaintyOrigin | null, cochranQ?: number | null, iSquared?: number | null }, correlation: { __typename?: 'Correlation', form: CorrelationForm, expression: string, referenceTemperature: number, referencePressure: number, degreesOfFreedom?: number | null, parameters: Array<{ __typename?: 'CorrelationParameter', symbol: string, value: number, standardUncertainty?: number | null, unit: string }>, validity: { __typename?: 'ValidityRange', temperatureMinimum: number, temperatureMaximum: number, pressureMinimum: number, pressureMaximum: number, pressureBasis: RangeBasis } } } | null } };

export type AcceptFromWorkspaceMutationVariables = Exact<{
  id: Scalars['ID']['input'];
}>;


export type AcceptFromWorkspaceMutation = { __typename?: 'Mutation', acceptSeries: { __typename?: 'SeriesPayload', problems: Array<{ __typename?: 'Problem', code: string, message: string, path?: string | null }>, series?: { __typename?: 'Series', id: string, status: SeriesStatus } | null } };

export type ReturnFromWorkspaceMutationVariables = Exact<{
  id: Scalars['ID']['input'];
  remark: Scalars['String']['input'];
}>;


export type ReturnFromWorkspaceMutation = { __typename?: 'Mutation', returnSeries: { __typename?: 'SeriesPayload', problems: Array<{ __typename?: 'Problem', code: string, message: string, path?: string | null }>, series?: { __typename?: 'Series', id: string, status: SeriesStatus } | null } };

export type HomeQueryVariables = Exact<{ [key: string]: never; }>;


export type HomeQuery = { __typename?: 'Query', home: { __typename?: 'Home', tasks: Array<{ __typename?: 'Task', kind: TaskKind, since: string, remark?: string | null, series?: { __typename?: 'Series', id: string, title: string, status: SeriesStatus, pair: { __typename?: 'GasPair', id: string, substances: Array<{ __typename?: 'Substance', id: string, name: string }> }, submittedBy?: { __typename?: 'Person', id: string, name: string } | null } | null, version?: { __typename?: 'DataSheetVersion', id: string, number: string, status: VersionStatus, sheet: { __typename?: 'DataSheet', id: string, code: string, pair: { __typename?: 'GasPair', id: string, substances: Array<{ __typename?: 'Substance', id: string, name: string }> } }, preparedBy?: { __typename?: 'Person', id: string, name: string } | null } | null }>, waiting: Array<{ __typename?: 'Task', kind: TaskKind, since: string, remark?: string | null, series?: { __typename?: 'Series', id: string, title: string, status: SeriesStatus, pair: { __typename?: 'GasPair', id: string, substances: Array<{ __typename?: 'Substance', id: string, name: string }> }, submittedBy?: { __typename?: 'Person', id: string, name: string } | null } | null, version?: { __typename?: 'DataSheetVersion', id: string, number: string, status: VersionStatus, sheet: { __typename?: 'DataSheet', id: string, code: string, pair: { __typename?: 'GasPair', id: string, substances: Array<{ __typename?: 'Substance', id: string, name: string }> } }, preparedBy?: { __typename?: 'Person', id: string, name: string } | null } | null }> } };

export type TaskFieldsFragment = { __typename?: 'Task', kind: TaskKind, since: string, remark?: string | null, series?: { __typename?: 'Series', id: string, title: string, status: SeriesStatus, pair: { __typename?: 'GasPair', id: string, substances: Array<{ __typename?: 'Substance', id: string, name: string }> }, submittedBy?: { __typename?: 'Person', id: string, name: string } | null } | null, version?: { __typename?: 'DataSheetVersion', id: string, number: string, status: VersionStatus, sheet: { __typename?: 'DataSheet', id: string, code: string, pair: { __typename?: 'GasPair', id: string, substances: Array<{ __typename?: 'Substance', id: string, name: string }> } }, preparedBy?: { __typename?: 'Person', id: string, name: string } | null } | null };

export type PairsQueryVariables = Exact<{
  search?: InputMaybe<Scalars['String']['input']>;
  after?: InputMaybe<Scalars['String']['input']>;
}>;


export type PairsQuery = { __typename?: 'Query', gasPairs: { __typename?: 'GasPairConnection', totalCount: number, pageInfo: { __typename?: 'PageInfo', hasNextPage: boolean, endCursor?: string | null }, edges: Array<{ __typename?: 'GasPairEdge', node: { __typename?: 'GasPair', id: string, substances: Array<{ __typename?: 'Substance', id: string, name: string, formula: string }>, accepted: { __typename?: 'SeriesConnection', totalCount: number }, waiting: { __typename?: 'SeriesConnection', totalCount: number }, fits: Array<{ __typename?: 'Fit', id: string, number: number }>, dataSheet?: { __typename?: 'DataSheet', id: string, code: string, current?: { __typename?: 'DataSheetVersion', id: string, number: string } | null, versions: Array<{ __typename?: 'DataSheetVersion', id: string, number: string, status: VersionStatus }> } | null } }> } };

export type PairRowFragment = { __typename?: 'GasPair', id: string, substances: Array<{ __typename?: 'Substance', id: string, name: string, formula: string }>, accepted: { __typename?: 'SeriesConnection', totalCount: number }, waiting: { __typename?: 'SeriesConnection', totalCount: number }, fits: Array<{ __typename?: 'Fit', id: string, number: number }>, dataSheet?: { __typename?: 'DataSheet', id: string, code: string, current?: { __typename?: 'DataSheetVersion', id: string, number: string } | null, versions: Array<{ __typename?: 'DataSheetVersion', id: string, number: string, status: VersionStatus }> } | null };

export type SeriesListQueryVariables = Exact<{
  status?: InputMaybe<Array<SeriesStatus> | SeriesStatus>;
  mine: Scalars['Boolean']['input'];
  after?: InputMaybe<Scalars['String']['input']>;
}>;


export type SeriesListQuery = { __typename?: 'Query', allSeries: { __typename?: 'SeriesConnection', totalCount: number, pageInfo: { __typename?: 'PageInfo', hasNextPage: boolean, endCursor?: string | null }, edges: Array<{ __typename?: 'SeriesEdge', node: { __typename?: 'Series', id: string, title: string, status: SeriesStatus, method: string, createdAt: string, createdBy?: { __typename?: 'Person', id: string, name: string } | null, pair: { __typename?: 'GasPair', id: string, substances: Array<{ __typename?: 'Substance', id: string, name: string }> }, points: Array<{ __typename?: 'SeriesPoint', id: string, temperature: number }> } }> } };

export type SeriesRowFragment = { __typename?: 'Series', id: string, title: string, status: SeriesStatus, method: string, createdAt: string, createdBy?: { __typename?: 'Person', id: string, name: string } | null, pair: { __typename?: 'GasPair', id: string, substances: Array<{ __typename?: 'Substance', id: string, name: string }> }, points: Array<{ __typename?: 'SeriesPoint', id: string, temperature: number }> };

export type OneSeriesQueryVariables = Exact<{
  id: Scalars['ID']['input'];
}>;


export type OneSeriesQuery = { __typename?: 'Query', oneSeries?: { __typename?: 'Series', id: string, title: string, status: SeriesStatus, source: string, method: string, apparatus?: string | null, dataOrigin: DataOrigin, commonRelativeUncertainty?: number | null, createdAt: string, lockVersion: number, createdBy?: { __typename?: 'Person', id: string, name: string } | null, submittedBy?: { __typename?: 'Person', id: string, name: string } | null, sameDataAs?: { __typename?: 'Series', id: string, title: string } | null, pair: { __typename?: 'GasPair', id: string, substances: Array<{ __typename?: 'Substance', id: string, name: string }> }, warnings: Array<{ __typename?: 'Warning', code: string, message: string, path?: string | null }>, events: Array<{ __typename?: 'SeriesEvent', action: string, status: SeriesStatus, remark?: string | null, at: string, person: { __typename?: 'Person', id: string, name: string } }>, points: Array<{ __typename?: 'SeriesPoint', id: string, temperature: number, pressure: number, pressureOrigin: PressureOrigin, diffusivity: number, diffusivityUncertainty?: number | null, uncertaintyOrigin?: UncertaintyOrigin | null, temperatureUncertainty?: number | null, pressureUncertainty?: number | null, moleFraction?: number | null, replicates?: number | null }> } | null };

export type SeriesDetailFragment = { __typename?: 'Series', id: string, title: string, status: SeriesStatus, source: string, method: string, apparatus?: string | null, dataOrigin: DataOrigin, commonRelativeUncertainty?: number | null, createdAt: string, lockVersion: number, createdBy?: { __typename?: 'Person', id: string, name: string } | null, submittedBy?: { __typename?: 'Person', id: string, name: string } | null, sameDataAs?: { __typename?: 'Series', id: string, title: string } | null, pair: { __typename?: 'GasPair', id: string, substances: Array<{ __typename?: 'Substance', id: string, name: string }> }, warnings: Array<{ __typename?: 'Warning', code: string, message: string, path?: string | null }>, events: Array<{ __typename?: 'SeriesEvent', action: string, status: SeriesStatus, remark?: string | null, at: string, person: { __typename?: 'Person', id: string, name: string } }>, points: Array<{ __typename?: 'SeriesPoint', id: string, temperature: number, pressure: number, pressureOrigin: PressureOrigin, diffusivity: number, diffusivityUncertainty?: number | null, uncertaintyOrigin?: UncertaintyOrigin | null, temperatureUncertainty?: number | null, pressureUncertainty?: number | null, moleFraction?: number | null, replicates?: number | null }> };

export type SeriesSurroundingsQueryVariables = Exact<{
  pairId: Scalars['ID']['input'];
  temperatures: Scalars['FloatColumn']['input'];
  pressure: Scalars['Float']['input'];
}>;


export type SeriesSurroundingsQuery = { __typename?: 'Query', pairById?: { __typename?: 'GasPair', id: string, series: { __typename?: 'SeriesConnection', edges: Array<{ __typename?: 'SeriesEdge', node: { __typename?: 'Series', id: string } }> }, estimates: Array<{ __typename?: 'PairEstimate', label: string, diffusivities: number[] }> } | null };

export type SeriesOutcomeFragment = { __typename?: 'SeriesPayload', problems: Array<{ __typename?: 'Problem', code: string, message: string, path?: string | null }>, series?: { __typename?: 'Series', id: string, title: string, status: SeriesStatus, source: string, method: string, apparatus?: string | null, dataOrigin: DataOrigin, commonRelativeUncertainty?: number | null, createdAt: string, lockVersion: number, createdBy?: { __typename?: 'Person', id: string, name: string } | null, submittedBy?: { __typename?: 'Person', id: string, name: string } | null, sameDataAs?: { __typename?: 'Series', id: string, title: string } | null, pair: { __typename?: 'GasPair', id: string, substances: Array<{ __typename?: 'Substance', id: string, name: string }> }, warnings: Array<{ __typename?: 'Warning', code: string, message: string, path?: string | null }>, events: Array<{ __typename?: 'SeriesEvent', action: string, status: SeriesStatus, remark?: string | null, at: string, person: { __typename?: 'Person', id: string, name: string } }>, points: Array<{ __typename?: 'SeriesPoint', id: string, temperature: number, pressure: number, pressureOrigin: PressureOrigin, diffusivity: number, diffusivityUncertainty?: number | null, uncertaintyOrigin?: UncertaintyOrigin | null, temperatureUncertainty?: number | null, pressureUncertainty?: number | null, moleFraction?: number | null, replicates?: number | null }> } | null };

export type SubmitSeriesMutationVariables = Exact<{
  id: Scalars['ID']['input'];
}>;


export type SubmitSeriesMutation = { __typename?: 'Mutation', submitSeries: { __typename?: 'SeriesPayload', problems: Array<{ __typename?: 'Problem', code: string, message: string, path?: string | null }>, series?: { __typename?: 'Series', id: string, title: string, status: SeriesStatus, source: string, method: string, apparatus?: string | null, dataOrigin: DataOrigin, commonRelativeUncertainty?: number | null, createdAt: string, lockVersion: number, createdBy?: { __typename?: 'Person', id: string, name: string } | null, submittedBy?: { __typename?: 'Person', id: string, name: string } | null, sameDataAs?: { __typename?: 'Series', id: string, title: string } | null, pair: { __typename?: 'GasPair', id: string, substances: Array<{ __typename?: 'Substance', id: string, name: string }> }, warnings: Array<{ __typename?: 'Warning', code: string, message: string, path?: string | null }>, events: Array<{ __typename?: 'SeriesEvent', action: string, status: SeriesStatus, remark?: string | null, at: string, person: { __typename?: 'Person', id: string, name: string } }>, points: Array<{ __typename?: 'SeriesPoint', id: string, temperature: number, pressure: number, pressureOrigin: PressureOrigin, diffusivity: number, diffusivityUncertainty?: number | null, uncertaintyOrigin?: UncertaintyOrigin | null, temperatureUncertainty?: number | null, pressureUncertainty?: number | null, moleFraction?: number | null, replicates?: number | null }> } | null } };

export type AcceptSeriesMutationVariables = Exact<{
  id: Scalars['ID']['input'];
}>;


export type AcceptSeriesMutation = { __typename?: 'Mutation', acceptSeries: { __typename?: 'SeriesPayload', problems: Array<{ __typename?: 'Problem', code: string, message: string, path?: string | null }>, series?: { __typename?: 'Series', id: string, title: string, status: SeriesStatus, source: string, method: string, apparatus?: string | null, dataOrigin: DataOrigin, commonRelativeUncertainty?: number | null, createdAt: string, lockVersion: number, createdBy?: { __typename?: 'Person', id: string, name: string } | null, submittedBy?: { __typename?: 'Person', id: string, name: string } | null, sameDataAs?: { __typename?: 'Series', id: string, title: string } | null, pair: { __typename?: 'GasPair', id: string, substances: Array<{ __typename?: 'Substance', id: string, name: string }> }, warnings: Array<{ __typename?: 'Warning', code: string, message: string, path?: string | null }>, events: Array<{ __typename?: 'SeriesEvent', action: string, status: SeriesStatus, remark?: string | null, at: string, person: { __typename?: 'Person', id: string, name: string } }>, points: Array<{ __typename?: 'SeriesPoint', id: string, temperature: number, pressure: number, pressureOrigin: PressureOrigin, diffusivity: number, diffusivityUncertainty?: number | null, uncertaintyOrigin?: UncertaintyOrigin | null, temperatureUncertainty?: number | null, pressureUncertainty?: number | null, moleFraction?: number | null, replicates?: number | null }> } | null } };

export type ReturnSeriesMutationVariables = Exact<{
  id: Scalars['ID']['input'];
  remark: Scalars['String']['input'];
}>;


export type ReturnSeriesMutation = { __typename?: 'Mutation', returnSeries: { __typename?: 'SeriesPayload', problems: Array<{ __typename?: 'Problem', code: string, message: string, path?: string | null }>, series?: { __typename?: 'Series', id: string, title: string, status: SeriesStatus, source: string, method: string, apparatus?: string | null, dataOrigin: DataOrigin, commonRelativeUncertainty?: number | null, createdAt: string, lockVersion: number, createdBy?: { __typename?: 'Person', id: string, name: string } | null, submittedBy?: { __typename?: 'Person', id: string, name: string } | null, sameDataAs?: { __typename?: 'Series', id: string, title: string } | null, pair: { __typename?: 'GasPair', id: string, substances: Array<{ __typename?: 'Substance', id: string, name: string }> }, warnings: Array<{ __typename?: 'Warning', code: string, message: string, path?: string | null }>, events: Array<{ __typename?: 'SeriesEvent', action: string, status: SeriesStatus, remark?: string | null, at: string, person: { __typename?: 'Person', id: string, name: string } }>, points: Array<{ __typename?: 'SeriesPoint', id: string, temperature: number, pressure: number, pressureOrigin: PressureOrigin, diffusivity: number, diffusivityUncertainty?: number | null, uncertaintyOrigin?: UncertaintyOrigin | null, temperatureUncertainty?: number | null, pressureUncertainty?: number | null, moleFraction?: number | null, replicates?: number | null }> } | null } };

export type RetireSeriesMutationVariables = Exact<{
  id: Scalars['ID']['input'];
  remark: Scalars['String']['input'];
}>;


export type RetireSeriesMutation = { __typename?: 'Mutation', retireSeries: { __typename?: 'SeriesPayload', problems: Array<{ __typename?: 'Problem', code: string, message: string, path?: string | null }>, series?: { __typename?: 'Series', id: string, title: string, status: SeriesStatus, source: string, method: string, apparatus?: string | null, dataOrigin: DataOrigin, commonRelativeUncertainty?: number | null, createdAt: string, lockVersion: number, createdBy?: { __typename?: 'Person', id: string, name: string } | null, submittedBy?: { __typename?: 'Person', id: string, name: string } | null, sameDataAs?: { __typename?: 'Series', id: string, title: string } | null, pair: { __typename?: 'GasPair', id: string, substances: Array<{ __typename?: 'Substance', id: string, name: string }> }, warnings: Array<{ __typename?: 'Warning', code: string, message: string, path?: string | null }>, events: Array<{ __typename?: 'SeriesEvent', action: string, status: SeriesStatus, remark?: string | null, at: string, person: { __typename?: 'Person', id: string, name: string } }>, points: Array<{ __typename?: 'SeriesPoint', id: string, temperature: number, pressure: number, pressureOrigin: PressureOrigin, diffusivity: number, diffusivityUncertainty?: number | null, uncertaintyOrigin?: UncertaintyOrigin | null, temperatureUncertainty?: number | null, pressureUncertainty?: number | null, moleFraction?: number | null, replicates?: number | null }> } | null } };

export type UpdateSeriesMutationVariables = Exact<{
  input: UpdateSeriesInput;
}>;


export type UpdateSeriesMutation = { __typename?: 'Mutation', updateSeries: { __typename?: 'SeriesPayload', problems: Array<{ __typename?: 'Problem', code: string, message: string, path?: string | null }>, series?: { __typename?: 'Series', id: string, title: string, status: SeriesStatus, source: string, method: string, apparatus?: string | null, dataOrigin: DataOrigin, commonRelativeUncertainty?: number | null, createdAt: string, lockVersion: number, createdBy?: { __typename?: 'Person', id: string, name: string } | null, submittedBy?: { __typename?: 'Person', id: string, name: string } | null, sameDataAs?: { __typename?: 'Series', id: string, title: string } | null, pair: { __typename?: 'GasPair', id: string, substances: Array<{ __typename?: 'Substance', id: string, name: string }> }, warnings: Array<{ __typename?: 'Warning', code: string, message: string, path?: string | null }>, events: Array<{ __typename?: 'SeriesEvent', action: string, status: SeriesStatus, remark?: string | null, at: string, person: { __typename?: 'Person', id: string, name: string } }>, points: Array<{ __typename?: 'SeriesPoint', id: string, temperature: number, pressure: number, pressureOrigin: PressureOrigin, diffusivity: number, diffusivityUncertainty?: number | null, uncertaintyOrigin?: UncertaintyOrigin | null, temperatureUncertainty?: number | null, pressureUncertainty?: number | null, moleFraction?: number | null, replicates?: number | null }> } | null } };

export type EvaluateSheetQueryVariables = Exact<{
  code: Scalars['String']['input'];
  number: Scalars['String']['input'];
  temperature: Scalars['FloatColumn']['input'];
  pressure: Scalars['FloatColumn']['input'];
  kind: UncertaintyKind;
}>;


export type EvaluateSheetQuery = { __typename?: 'Query', dataSheet?: { __typename?: 'DataSheet', id: string, version?: { __typename?: 'DataSheetVersion', id: string, correlation: { __typename?: 'Correlation', evaluate: { __typename?: 'Evaluation', diffusivities: number[], standardUncertainties: number[], expandedUncertainties: number[], coverageFactor: number, outside: Array<number> } } } | null } | null };

export type SheetVersionQueryVariables = Exact<{
  code: Scalars['String']['input'];
  number: Scalars['String']['input'];
}>;


export type SheetVersionQuery = { __typename?: 'Query', dataSheet?: { __typename?: 'DataSheet', id: string, code: string, pair: { __typename?: 'GasPair', id: string }, current?: { __typename?: 'DataSheetVersion', id: string, number: string } | null, version?: { __typename?: 'DataSheetVersion', id: string, number: string, status: VersionStatus, releasedAt?: string | null, withdrawnAt?: string | null, withdrawalReason?: string | null, contentHash?: string | null, doi?: string | null, supersededBy?: { __typename?: 'DataSheetVersion', id: string, number: string, releasedAt?: string | null, changeNote?: string | null } | null, fit: { __typename?: 'Fit', id: string, statistics: { __typename?: 'FitStatistics', betweenSeriesDeviation?: number | null } }, content: { __typename?: 'SheetContent', title: string, summary: string, lead: Array<{ __typename?: 'TextRun', text: string, style: TextStyle }>, substances: Array<{ __typename?: 'SheetSubstance', name: string, casNumber?: string | null, molarMass: number, formula: Array<{ __typename?: 'TextRun', text: string, style: TextStyle }> }>, definition: Array<{ __typename?: 'TextRun', text: string, style: TextStyle }>, uncertainty: { __typename?: 'SheetUncertainty', statement: Array<Array<{ __typename?: 'TextRun', text: string, style: TextStyle }>>, notIncluded: Array<Array<{ __typename?: 'TextRun', text: string, style: TextStyle }>> }, cautions: Array<Array<{ __typename?: 'TextRun', text: string, style: TextStyle }>>, citation: { __typename?: 'SheetCitation', plain: string, doi?: string | null, runs: Array<{ __typename?: 'TextRun', text: string, style: TextStyle }> }, versions: Array<{ __typename?: 'SheetVersionRow', number: string, status: string, word: string, date?: string | null, datePrinted: string, change: string, isThis: boolean }>, sections: Array<{ __typename?: 'SheetSection', id: string, number: number, title: string }>, remarks: Array<{ __typename?: 'SheetRemark', section: string, text: string }>, margin: { __typename?: 'SheetMargin', entries: Array<{ __typename?: 'MarginEntry', value: string, label: Array<{ __typename?: 'TextRun', text: string, style: TextStyle }> }>, fit: Array<Array<{ __typename?: 'TextRun', text: string, style: TextStyle }>>, figures: Array<Array<{ __typename?: 'TextRun', text: string, style: TextStyle }>>, series: Array<Array<{ __typename?: 'TextRun', text: string, style: TextStyle }>> }, correlation: { __typename?: 'SheetCorrelation', form: string, spoken: string, expression: string, coverageFactor: number, equation: Array<{ __typename?: 'EquationPiece', bracketed: boolean, runs: Array<{ __typename?: 'TextRun', text: string, style: TextStyle }>, numerator?: Array<{ __typename?: 'TextRun', text: string, style: TextStyle }> | null, denominator?: Array<{ __typename?: 'TextRun', text: string, style: TextStyle }> | null, exponent?: Array<{ __typename?: 'TextRun', text: string, style: TextStyle }> | null }>, parameters: Array<{ __typename?: 'SheetParameter', symbol: string, value: number, standardUncertainty?: number | null, unit: string, printed: string, note?: string | null, label: Array<{ __typename?: 'TextRun', text: string, style: TextStyle }> }>, coefficients: Array<{ __typename?: 'SheetCoefficient', printed: string, label: Array<{ __typename?: 'TextRun', text: string, style: TextStyle }> }> }, range: { __typename?: 'SheetRange', temperatureMinimum: number, temperatureMaximum: number, pressureMinimum: number, pressureMaximum: number, pressureBasis: string, sentence: Array<{ __typename?: 'TextRun', text: string, style: TextStyle }> }, figures: { __typename?: 'SheetFigures', pressure: number, temperatureAxis: { __typename?: 'FigureAxis', minimum: number, maximum: number }, diffusivityAxis: { __typename?: 'FigureAxis', minimum: number, maximum: number }, deviationAxis: { __typename?: 'FigureAxis', minimum: number, maximum: number, ticks: number[] }, curve: { __typename?: 'FigureCurve', temperatures: number[], diffusivities: number[], relativeExpandedUncertainties: number[], relativeNewLaboratory?: number[] | null, firstInside: number, lastInside: number }, series: Array<{ __typename?: 'FigureSeries', key: string, mark: number, title: string, used: boolean, temperatures: number[], reducedDiffusivities: number[], relativeUncertainties: number[], deviations: number[], leftOut: Array<number> }>, estimates: Array<{ __typename?: 'FigureEstimate', method: string, temperatures: number[], deviations: number[] }>, diffusivityCaption: Array<{ __typename?: 'TextRun', text: string, style: TextStyle }>, deviationCaption: Array<{ __typename?: 'TextRun', text: string, style: TextStyle }> }, recommended: { __typename?: 'RecommendedValues', pressure: number, temperatures: number[], diffusivities: number[], standardUncertainties: number[], expandedUncertainties: number[], newLaboratoryHalfWidths?: number[] | null, referenceRow?: number | null, note: Array<{ __typename?: 'TextRun', text: string, style: TextStyle }> }, seriesUsed: Array<{ __typename?: 'SheetSeries', key: string, mark: number, title: string, source: string, method: string, pointCount: number, weightedPointCount: number, temperatureMinimum: number, temperatureMaximum: number, relativeUncertainty?: number | null, uncertaintyAssigned: boolean, offset?: number | null, offsetStandardUncertainty?: number | null, reason?: string | null }>, seriesLeftOut: Array<{ __typename?: 'SheetSeries', key: string, mark: number, title: string, source: string, method: string, pointCount: number, weightedPointCount: number, temperatureMinimum: number, temperatureMaximum: number, relativeUncertainty?: number | null, uncertaintyAssigned: boolean, offset?: number | null, offsetStandardUncertainty?: number | null, reason?: string | null }>, pointsLeftOut: Array<{ __typename?: 'SheetExcludedPoint', seriesKey: string, temperature: number, pressure: number, diffusivity: number, deviation: number, reason: string }>, estimates: { __typename?: 'SheetEstimates', temperatures: number[], pressure: number, methods: Array<{ __typename?: 'SheetEstimate', method: string, diffusivities: number[], deviations: number[], usualMeanError: number, source: string }>, note: Array<{ __typename?: 'TextRun', text: string, style: TextStyle }> } } } | null } | null };

export type CurrentSheetQueryVariables = Exact<{
  code: Scalars['String']['input'];
}>;


export type CurrentSheetQuery = { __typename?: 'Query', dataSheet?: { __typename?: 'DataSheet', id: string, code: string, pair: { __typename?: 'GasPair', id: string }, current?: { __typename?: 'DataSheetVersion', id: string, number: string } | null, versions: Array<{ __typename?: 'DataSheetVersion', id: string, number: string, status: VersionStatus }> } | null };

export type SheetPageFragment = { __typename?: 'DataSheetVersion', id: string, number: string, status: VersionStatus, releasedAt?: string | null, withdrawnAt?: string | null, withdrawalReason?: string | null, contentHash?: string | null, doi?: string | null, supersededBy?: { __typename?: 'DataSheetVersion', id: string, number: string, releasedAt?: string | null, changeNote?: string | null } | null, fit: { __typename?: 'Fit', id: string, statistics: { __typename?: 'FitStatistics', betweenSeriesDeviation?: number | null } }, content: { __typename?: 'SheetContent', title: string, summary: string, lead: Array<{ __typename?: 'TextRun', text: string, style: TextStyle }>, substances: Array<{ __typename?: 'SheetSubstance', name: string, casNumber?: string | null, molarMass: number, formula: Array<{ __typename?: 'TextRun', text: string, style: TextStyle }> }>, definition: Array<{ __typename?: 'TextRun', text: string, style: TextStyle }>, uncertainty: { __typename?: 'SheetUncertainty', statement: Array<Array<{ __typename?: 'TextRun', text: string, style: TextStyle }>>, notIncluded: Array<Array<{ __typename?: 'TextRun', text: string, style: TextStyle }>> }, cautions: Array<Array<{ __typename?: 'TextRun', text: string, style: TextStyle }>>, citation: { __typename?: 'SheetCitation', plain: string, doi?: string | null, runs: Array<{ __typename?: 'TextRun', text: string, style: TextStyle }> }, versions: Array<{ __typename?: 'SheetVersionRow', number: string, status: string, word: string, date?: string | null, datePrinted: string, change: string, isThis: boolean }>, sections: Array<{ __typename?: 'SheetSection', id: string, number: number, title: string }>, remarks: Array<{ __typename?: 'SheetRemark', section: string, text: string }>, margin: { __typename?: 'SheetMargin', entries: Array<{ __typename?: 'MarginEntry', value: string, label: Array<{ __typename?: 'TextRun', text: string, style: TextStyle }> }>, fit: Array<Array<{ __typename?: 'TextRun', text: string, style: TextStyle }>>, figures: Array<Array<{ __typename?: 'TextRun', text: string, style: TextStyle }>>, series: Array<Array<{ __typename?: 'TextRun', text: string, style: TextStyle }>> }, correlation: { __typename?: 'SheetCorrelation', form: string, spoken: string, expression: string, coverageFactor: number, equation: Array<{ __typename?: 'EquationPiece', bracketed: boolean, runs: Array<{ __typename?: 'TextRun', text: string, style: TextStyle }>, numerator?: Array<{ __typename?: 'TextRun', text: string, style: TextStyle }> | null, denominator?: Array<{ __typename?: 'TextRun', text: string, style: TextStyle }> | null, exponent?: Array<{ __typename?: 'TextRun', text: string, style: TextStyle }> | null }>, parameters: Array<{ __typename?: 'SheetParameter', symbol: string, value: number, standardUncertainty?: number | null, unit: string, printed: string, note?: string | null, label: Array<{ __typename?: 'TextRun', text: string, style: TextStyle }> }>, coefficients: Array<{ __typename?: 'SheetCoefficient', printed: string, label: Array<{ __typename?: 'TextRun', text: string, style: TextStyle }> }> }, range: { __typename?: 'SheetRange', temperatureMinimum: number, temperatureMaximum: number, pressureMinimum: number, pressureMaximum: number, pressureBasis: string, sentence: Array<{ __typename?: 'TextRun', text: string, style: TextStyle }> }, figures: { __typename?: 'SheetFigures', pressure: number, temperatureAxis: { __typename?: 'FigureAxis', minimum: number, maximum: number }, diffusivityAxis: { __typename?: 'FigureAxis', minimum: number, maximum: number }, deviationAxis: { __typename?: 'FigureAxis', minimum: number, maximum: number, ticks: number[] }, curve: { __typename?: 'FigureCurve', temperatures: number[], diffusivities: number[], relativeExpandedUncertainties: number[], relativeNewLaboratory?: number[] | null, firstInside: number, lastInside: number }, series: Array<{ __typename?: 'FigureSeries', key: string, mark: number, title: string, used: boolean, temperatures: number[], reducedDiffusivities: number[], relativeUncertainties: number[], deviations: number[], leftOut: Array<number> }>, estimates: Array<{ __typename?: 'FigureEstimate', method: string, temperatures: number[], deviations: number[] }>, diffusivityCaption: Array<{ __typename?: 'TextRun', text: string, style: TextStyle }>, deviationCaption: Array<{ __typename?: 'TextRun', text: string, style: TextStyle }> }, recommended: { __typename?: 'RecommendedValues', pressure: number, temperatures: number[], diffusivities: number[], standardUncertainties: number[], expandedUncertainties: number[], newLaboratoryHalfWidths?: number[] | null, referenceRow?: number | null, note: Array<{ __typename?: 'TextRun', text: string, style: TextStyle }> }, seriesUsed: Array<{ __typename?: 'SheetSeries', key: string, mark: number, title: string, source: string, method: string, pointCount: number, weightedPointCount: number, temperatureMinimum: number, temperatureMaximum: number, relativeUncertainty?: number | null, uncertaintyAssigned: boolean, offset?: number | null, offsetStandardUncertainty?: number | null, reason?: string | null }>, seriesLeftOut: Array<{ __typename?: 'SheetSeries', key: string, mark: number, title: string, source: string, method: string, pointCount: number, weightedPointCount: number, temperatureMinimum: number, temperatureMaximum: number, relativeUncertainty?: number | null, uncertaintyAssigned: boolean, offset?: number | null, offsetStandardUncertainty?: number | null, reason?: string | null }>, pointsLeftOut: Array<{ __typename?: 'SheetExcludedPoint', seriesKey: string, temperature: number, pressure: number, diffusivity: number, deviation: number, reason: string }>, estimates: { __typename?: 'SheetEstimates', temperatures: number[], pressure: number, methods: Array<{ __typename?: 'SheetEstimate', method: string, diffusivities: number[], deviations: number[], usualMeanError: number, source: string }>, note: Array<{ __typename?: 'TextRun', text: string, style: TextStyle }> } } };

export type SheetTextFragment = { __typename?: 'SheetContent', title: string, summary: string, lead: Array<{ __typename?: 'TextRun', text: string, style: TextStyle }>, substances: Array<{ __typename?: 'SheetSubstance', name: string, casNumber?: string | null, molarMass: number, formula: Array<{ __typename?: 'TextRun', text: string, style: TextStyle }> }>, definition: Array<{ __typename?: 'TextRun', text: string, style: TextStyle }>, uncertainty: { __typename?: 'SheetUncertainty', statement: Array<Array<{ __typename?: 'TextRun', text: string, style: TextStyle }>>, notIncluded: Array<Array<{ __typename?: 'TextRun', text: string, style: TextStyle }>> }, cautions: Array<Array<{ __typename?: 'TextRun', text: string, style: TextStyle }>>, citation: { __typename?: 'SheetCitation', plain: string, doi?: string | null, runs: Array<{ __typename?: 'TextRun', text: string, style: TextStyle }> }, versions: Array<{ __typename?: 'SheetVersionRow', number: string, status: string, word: string, date?: string | null, datePrinted: string, change: string, isThis: boolean }>, sections: Array<{ __typename?: 'SheetSection', id: string, number: number, title: string }>, remarks: Array<{ __typename?: 'SheetRemark', section: string, text: string }>, margin: { __typename?: 'SheetMargin', entries: Array<{ __typename?: 'MarginEntry', value: string, label: Array<{ __typename?: 'TextRun', text: string, style: TextStyle }> }>, fit: Array<Array<{ __typename?: 'TextRun', text: string, style: TextStyle }>>, figures: Array<Array<{ __typename?: 'TextRun', text: string, style: TextStyle }>>, series: Array<Array<{ __typename?: 'TextRun', text: string, style: TextStyle }>> } };

export type SheetNumbersFragment = { __typename?: 'SheetContent', correlation: { __typename?: 'SheetCorrelation', form: string, spoken: string, expression: string, coverageFactor: number, equation: Array<{ __typename?: 'EquationPiece', bracketed: boolean, runs: Array<{ __typename?: 'TextRun', text: string, style: TextStyle }>, numerator?: Array<{ __typename?: 'TextRun', text: string, style: TextStyle }> | null, denominator?: Array<{ __typename?: 'TextRun', text: string, style: TextStyle }> | null, exponent?: Array<{ __typename?: 'TextRun', text: string, style: TextStyle }> | null }>, parameters: Array<{ __typename?: 'SheetParameter', symbol: string, value: number, standardUncertainty?: number | null, unit: string, printed: string, note?: string | null, label: Array<{ __typename?: 'TextRun', text: string, style: TextStyle }> }>, coefficients: Array<{ __typename?: 'SheetCoefficient', printed: string, label: Array<{ __typename?: 'TextRun', text: string, style: TextStyle }> }> }, range: { __typename?: 'SheetRange', temperatureMinimum: number, temperatureMaximum: number, pressureMinimum: number, pressureMaximum: number, pressureBasis: string, sentence: Array<{ __typename?: 'TextRun', text: string, style: TextStyle }> }, figures: { __typename?: 'SheetFigures', pressure: number, temperatureAxis: { __typename?: 'FigureAxis', minimum: number, maximum: number }, diffusivityAxis: { __typename?: 'FigureAxis', minimum: number, maximum: number }, deviationAxis: { __typename?: 'FigureAxis', minimum: number, maximum: number, ticks: number[] }, curve: { __typename?: 'FigureCurve', temperatures: number[], diffusivities: number[], relativeExpandedUncertainties: number[], relativeNewLaboratory?: number[] | null, firstInside: number, lastInside: number }, series: Array<{ __typename?: 'FigureSeries', key: string, mark: number, title: string, used: boolean, temperatures: number[], reducedDiffusivities: number[], relativeUncertainties: number[], deviations: number[], leftOut: Array<number> }>, estimates: Array<{ __typename?: 'FigureEstimate', method: string, temperatures: number[], deviations: number[] }>, diffusivityCaption: Array<{ __typename?: 'TextRun', text: string, style: TextStyle }>, deviationCaption: Array<{ __typename?: 'TextRun', text: string, style: TextStyle }> }, recommended: { __typename?: 'RecommendedValues', pressure: number, temperatures: number[], diffusivities: number[], standardUncertainties: number[], expandedUncertainties: number[], newLaboratoryHalfWidths?: number[] | null, referenceRow?: number | null, note: Array<{ __typename?: 'TextRun', text: string, style: TextStyle }> }, seriesUsed: Array<{ __typename?: 'SheetSeries', key: string, mark: number, title: string, source: string, method: string, pointCount: number, weightedPointCount: number, temperatureMinimum: number, temperatureMaximum: number, relativeUncertainty?: number | null, uncertaintyAssigned: boolean, offset?: number | null, offsetStandardUncertainty?: number | null, reason?: string | null }>, seriesLeftOut: Array<{ __typename?: 'SheetSeries', key: string, mark: number, title: string, source: string, method: string, pointCount: number, weightedPointCount: number, temperatureMinimum: number, temperatureMaximum: number, relativeUncertainty?: number | null, uncertaintyAssigned: boolean, offset?: number | null, offsetStandardUncertainty?: number | null, reason?: string | null }>, pointsLeftOut: Array<{ __typename?: 'SheetExcludedPoint', seriesKey: string, temperature: number, pressure: number, diffusivity: number, deviation: number, reason: string }>, estimates: { __typename?: 'SheetEstimates', temperatures: number[], pressure: number, methods: Array<{ __typename?: 'SheetEstimate', method: string, diffusivities: number[], deviations: number[], usualMeanError: number, source: string }>, note: Array<{ __typename?: 'TextRun', text: string, style: TextStyle }> } };

export type SheetSeriesRowFragment = { __typename?: 'SheetSeries', key: string, mark: number, title: string, source: string, method: string, pointCount: number, weightedPointCount: number, temperatureMinimum: number, temperatureMaximum: number, relativeUncertainty?: number | null, uncertaintyAssigned: boolean, offset?: number | null, offsetStandardUncertainty?: number | null, reason?: string | null };

export type FiguresDataFragment = { __typename?: 'SheetFigures', pressure: number, temperatureAxis: { __typename?: 'FigureAxis', minimum: number, maximum: number }, diffusivityAxis: { __typename?: 'FigureAxis', minimum: number, maximum: number }, deviationAxis: { __typename?: 'FigureAxis', minimum: number, maximum: number, ticks: number[] }, curve: { __typename?: 'FigureCurve', temperatures: number[], diffusivities: number[], relativeExpandedUncertainties: number[], relativeNewLaboratory?: number[] | null, firstInside: number, lastInside: number }, series: Array<{ __typename?: 'FigureSeries', key: string, mark: number, title: string, used: boolean, temperatures: number[], reducedDiffusivities: number[], relativeUncertainties: number[], deviations: number[], leftOut: Array<number> }>, estimates: Array<{ __typename?: 'FigureEstimate', method: string, temperatures: number[], deviations: number[] }>, diffusivityCaption: Array<{ __typename?: 'TextRun', text: string, style: TextStyle }>, deviationCaption: Array<{ __typename?: 'TextRun', text: string, style: TextStyle }> };

export type RunFragment = { __typename?: 'TextRun', text: string, style: TextStyle };

export type SubstanceListQueryVariables = Exact<{
  search?: InputMaybe<Scalars['String']['input']>;
  after?: InputMaybe<Scalars['String']['input']>;
}>;


export type SubstanceListQuery = { __typename?: 'Query', substances: { __typename?: 'SubstanceConnection', totalCount: number, pageInfo: { __typename?: 'PageInfo', hasNextPage: boolean, endCursor?: string | null }, edges: Array<{ __typename?: 'SubstanceEdge', node: { __typename?: 'Substance', id: string, name: string, formula: string, casNumber?: string | null, molarMass: number, synonyms: Array<string> } }> } };

export type SubstanceDetailQueryVariables = Exact<{
  id: Scalars['ID']['input'];
}>;


export type SubstanceDetailQuery = { __typename?: 'Query', substance?: { __typename?: 'Substance', id: string, name: string, formula: string, casNumber?: string | null, molarMass: number, synonyms: Array<string>, inchi?: string | null, lockVersion: number, composition?: Array<{ __typename?: 'BathComponent', casNumber: string, moleFraction: number }> | null, cautions: Array<{ __typename?: 'Caution', text: string, source: string }>, constants: Array<{ __typename?: 'SubstanceConstant', kind: SubstanceConstantKind, label: string, symbol: string, value?: number | null, form?: SubstanceEquationForm | null, unit: string, temperatureMinimum?: number | null, temperatureMaximum?: number | null, relativeUncertainty?: number | null, source: string, note?: string | null, coefficients: Array<{ __typename?: 'Coefficient', symbol: string, value: number }> }> } | null };

export type SubstanceFieldsFragment = { __typename?: 'Substance', id: string, name: string, formula: string, casNumber?: string | null, molarMass: number, synonyms: Array<string>, inchi?: string | null, lockVersion: number, composition?: Array<{ __typename?: 'BathComponent', casNumber: string, moleFraction: number }> | null, cautions: Array<{ __typename?: 'Caution', text: string, source: string }>, constants: Array<{ __typename?: 'SubstanceConstant', kind: SubstanceConstantKind, label: string, symbol: string, value?: number | null, form?: SubstanceEquationForm | null, unit: string, temperatureMinimum?: number | null, temperatureMaximum?: number | null, relativeUncertainty?: number | null, source: string, note?: string | null, coefficients: Array<{ __typename?: 'Coefficient', symbol: string, value: number }> }> };

export type SheetsOfSubstanceQueryVariables = Exact<{
  name: Scalars['String']['input'];
}>;


export type SheetsOfSubstanceQuery = { __typename?: 'Query', dataSheets: { __typename?: 'DataSheetConnection', edges: Array<{ __typename?: 'DataSheetEdge', node: { __typename?: 'DataSheet', id: string, code: string, pair: { __typename?: 'GasPair', id: string, substances: Array<{ __typename?: 'Substance', id: string, name: string }> }, current?: { __typename?: 'DataSheetVersion', id: string, number: string } | null } }> } };

export type CreateSubstanceMutationVariables = Exact<{
  input: SubstanceInput;
}>;


export type CreateSubstanceMutation = { __typename?: 'Mutation', createSubstance: { __typename?: 'SubstancePayload', substance?: { __typename?: 'Substance', id: string, name: string, formula: string, casNumber?: string | null, molarMass: number, synonyms: Array<string>, inchi?: string | null, lockVersion: number, composition?: Array<{ __typename?: 'BathComponent', casNumber: string, moleFraction: number }> | null, cautions: Array<{ __typename?: 'Caution', text: string, source: string }>, constants: Array<{ __typename?: 'SubstanceConstant', kind: SubstanceConstantKind, label: string, symbol: string, value?: number | null, form?: SubstanceEquationForm | null, unit: string, temperatureMinimum?: number | null, temperatureMaximum?: number | null, relativeUncertainty?: number | null, source: string, note?: string | null, coefficients: Array<{ __typename?: 'Coefficient', symbol: string, value: number }> }> } | null, problems: Array<{ __typename?: 'Problem', code: string, message: string, path?: string | null }> } };

export type UpdateSubstanceMutationVariables = Exact<{
  input: UpdateSubstanceInput;
}>;


export type UpdateSubstanceMutation = { __typename?: 'Mutation', updateSubstance: { __typename?: 'SubstancePayload', substance?: { __typename?: 'Substance', id: string, name: string, formula: string, casNumber?: string | null, molarMass: number, synonyms: Array<string>, inchi?: string | null, lockVersion: number, composition?: Array<{ __typename?: 'BathComponent', casNumber: string, moleFraction: number }> | null, cautions: Array<{ __typename?: 'Caution', text: string, source: string }>, constants: Array<{ __typename?: 'SubstanceConstant', kind: SubstanceConstantKind, label: string, symbol: string, value?: number | null, form?: SubstanceEquationForm | null, unit: string, temperatureMinimum?: number | null, temperatureMaximum?: number | null, relativeUncertainty?: number | null, source: string, note?: string | null, coefficients: Array<{ __typename?: 'Coefficient', symbol: string, value: number }> }> } | null, problems: Array<{ __typename?: 'Problem', code: string, message: string, path?: string | null }> } };

export const AccountRowFragmentDoc = {"kind":"Document","definitions":[{"kind":"FragmentDefinition","name":{"kind":"Name","value":"AccountRow"},"typeCondition":{"kind":"NamedType","name":{"kind":"Name","value":"Person"}},"selectionSet":{"kind":"SelectionSet","selections":[{"kind":"Field","name":{"kind":"Name","value":"id"}},{"kind":"Field","name":{"kind":"Name","value":"name"}},{"kind":"Field","name":{"kind":"Name","value":"email"}},{"kind":"Field","name":{"kind":"Name","value":"roles"}},{"kind":"Field","name":{"kind":"Name","value":"accountStatus"}},{"kind":"Field","name":{"kind":"Name","value":"lastSeenAt"}}]}}]} as unknown as DocumentNode<AccountRowFragment, unknown>;
export const NewsVersionFragmentDoc = {"kind":"Document","definitions":[{"kind":"FragmentDefinition","name":{"kind":"Name","value":"NewsVersion"},"typeCondition":{"kind":"NamedType","name":{"kind":"Name","value":"DataSheetVersion"}},"selectionSet":{"kind":"SelectionSet","selections":[{"kind":"Field","name":{"kind":"Name","value":"id"}},{"kind":"Field","name":{"kind":"Name","value":"number"}},{"kind":"Field","name":{"kind":"Name","value":"status"}},{"kind":"Field","name":{"kind":"Name","value":"sheet"},"selectionSet":{"kind":"SelectionSet","selections":[{"kind":"Field","name":{"kind":"Name","value":"id"}},{"kind":"Field","name":{"kind":"Name","value":"code"}},{"kind":"Field","name":{"kind":"Name","value":"pair"},"selectionSet":{"kind":"SelectionSet","selections":[{"kind":"Field","name":{"kind":"Name","value":"id"}},{"kind":"Field","name":{"kind":"Name","value":"substances"},"selectionSet":{"kind":"SelectionSet","selections":[{"kind":"Field","name":{"kind":"Name","value":"id"}},{"kind":"Field","name":{"kind":"Name","value":"name"}}]}}]}}]}}]}}]} as unknown as DocumentNode<NewsVersionFragment, unknown>;
export const ComparedFitFragmentDoc = {"kind":"Document","definitions":[{"kind":"FragmentDefinition","name":{"kind":"Name","value":"ComparedFit"},"typeCondition":{"kind":"NamedType","name":{"kind":"Name","value":"Fit"}},"selectionSet":{"kind":"SelectionSet","selections":[{"kind":"Field","name":{"kind":"Name","value":"id"}},{"kind":"Field","name":{"kind":"Name","value":"number"}},{"kind":"Field","name":{"kind":"Name","value":"correlation"},"selectionSet":{"kind":"SelectionSet","selections":[{"kind":"Field","name":{"kind":"Name","value":"evaluate"},"arguments":[{"kind":"Argument","name":{"kind":"Name","value":"temperatures"},"value":{"kind":"Variable","name":{"kind":"Name","value":"temperatures"}}},{"kind":"Argument","name":{"kind":"Name","value":"pressures"},"value":{"kind":"Variable","name":{"kind":"Name","value":"pressure"}}}],"selectionSet":{"kind":"SelectionSet","selections":[{"kind":"Field","name":{"kind":"Name","value":"diffusivities"}},{"kind":"Field","name":{"kind":"Name","value":"standardUncertainties"}},{"kind":"Field","name":{"kind":"Name","value":"expandedUncertainties"}}]}}]}}]}}]} as unknown as DocumentNode<ComparedFitFragment, unknown>;
export const StatisticsNumbersFragmentDoc = {"kind":"Document","definitions":[{"kind":"FragmentDefinition","name":{"kind":"Name","value":"StatisticsNumbers"},"typeCondition":{"kind":"NamedType","name":{"kind":"Name","value":"FitStatistics"}},"selectionSet":{"kind":"SelectionSet","selections":[{"kind":"Field","name":{"kind":"Name","value":"pointCount"}},{"kind":"Field","name":{"kind":"Name","value":"seriesCount"}},{"kind":"Field","name":{"kind":"Name","value":"residualDegreesOfFreedom"}},{"kind":"Field","name":{"kind":"Name","value":"chiSquare"}},{"kind":"Field","name":{"kind":"Name","value":"reducedChiSquare"}},{"kind":"Field","name":{"kind":"Name","value":"chiSquareProbability"}},{"kind":"Field","name":{"kind":"Name","value":"residualStandardError"}},{"kind":"Field","name":{"kind":"Name","value":"aicc"}},{"kind":"Field","name":{"kind":"Name","value":"betweenSeriesDeviation"}},{"kind":"Field","name":{"kind":"Name","value":"betweenSeriesOrigin"}},{"kind":"Field","name":{"kind":"Name","value":"cochranQ"}},{"kind":"Field","name":{"kind":"Name","value":"iSquared"}}]}}]} as unknown as DocumentNode<StatisticsNumbersFragment, unknown>;
export const AnalysisNumbersFragmentDoc = {"kind":"Document","definitions":[{"kind":"FragmentDefinition","name":{"kind":"Name","value":"AnalysisNumbers"},"typeCondition":{"kind":"NamedType","name":{"kind":"Name","value":"FitAnalysis"}},"selectionSet":{"kind":"SelectionSet","selections":[{"kind":"Field","name":{"kind":"Name","value":"correlationMatrix"}},{"kind":"Field","name":{"kind":"Name","value":"betweenSeriesSlopeDeviation"}},{"kind":"Field","name":{"kind":"Name","value":"statistics"},"selectionSet":{"kind":"SelectionSet","selections":[{"kind":"FragmentSpread","name":{"kind":"Name","value":"StatisticsNumbers"}}]}},{"kind":"Field","name":{"kind":"Name","value":"warnings"},"selectionSet":{"kind":"SelectionSet","selections":[{"kind":"Field","name":{"kind":"Name","value":"code"}},{"kind":"Field","name":{"kind":"Name","value":"message"}}]}},{"kind":"Field","name":{"kind":"Name","value":"series"},"selectionSet":{"kind":"SelectionSet","selections":[{"kind":"Field","name":{"kind":"Name","value":"seriesId"}},{"kind":"Field","name":{"kind":"Name","value":"carriesWeight"}},{"kind":"Field","name":{"kind":"Name","value":"offset"}},{"kind":"Field","name":{"kind":"Name","value":"offsetStandardUncertainty"}},{"kind":"Field","name":{"kind":"Name","value":"fitted"}},{"kind":"Field","name":{"kind":"Name","value":"lnDeviations"}},{"kind":"Field","name":{"kind":"Name","value":"standardizedResiduals"}},{"kind":"Field","name":{"kind":"Name","value":"weights"}}]}}]}},{"kind":"FragmentDefinition","name":{"kind":"Name","value":"StatisticsNumbers"},"typeCondition":{"kind":"NamedType","name":{"kind":"Name","value":"FitStatistics"}},"selectionSet":{"kind":"SelectionSet","selections":[{"kind":"Field","name":{"kind":"Name","value":"pointCount"}},{"kind":"Field","name":{"kind":"Name","value":"seriesCount"}},{"kind":"Field","name":{"kind":"Name","value":"residualDegreesOfFreedom"}},{"kind":"Field","name":{"kind":"Name","value":"chiSquare"}},{"kind":"Field","name":{"kind":"Name","value":"reducedChiSquare"}},{"kind":"Field","name":{"kind":"Name","value":"chiSquareProbability"}},{"kind":"Field","name":{"kind":"Name","value":"residualStandardError"}},{"kind":"Field","name":{"kind":"Name","value":"aicc"}},{"kind":"Field","name":{"kind":"Name","value":"betweenSeriesDeviation"}},{"kind":"Field","name":{"kind":"Name","value":"betweenSeriesOrigin"}},{"kind":"Field","name":{"kind":"Name","value":"cochranQ"}},{"kind":"Field","name":{"kind":"Name","value":"iSquared"}}]}}]} as unknown as DocumentNode<AnalysisNumbersFragment, unknown>;
export const FitSeriesFragmentDoc = {"kind":"Document","definitions":[{"kind":"FragmentDefinition","name":{"kind":"Name","value":"FitSeries"},"typeCondition":{"kind":"NamedType","name":{"kind":"Name","value":"Series"}},"selectionSet":{"kind":"SelectionSet","selections":[{"kind":"Field","name":{"kind":"Name","value":"id"}},{"kind":"Field","name":{"kind":"Name","value":"title"}},{"kind":"Field","name":{"kind":"Name","value":"status"}},{"kind":"Field","name":{"kind":"Name","value":"source"}},{"kind":"Field","name":{"kind":"Name","value":"method"}},{"kind":"Field","name":{"kind":"Name","value":"apparatus"}},{"kind":"Field","name":{"kind":"Name","value":"commonRelativeUncertainty"}},{"kind":"Field","name":{"kind":"Name","value":"sameDataAs"},"selectionSet":{"kind":"SelectionSet","selections":[{"kind":"Field","name":{"kind":"Name","value":"id"}},{"kind":"Field","name":{"kind":"Name","value":"title"}}]}},{"kind":"Field","name":{"kind":"Name","value":"submittedBy"},"selectionSet":{"kind":"SelectionSet","selections":[{"kind":"Field","name":{"kind":"Name","value":"id"}},{"kind":"Field","name":{"kind":"Name","value":"name"}}]}},{"kind":"Field","name":{"kind":"Name","value":"points"},"selectionSet":{"kind":"SelectionSet","selections":[{"kind":"Field","name":{"kind":"Name","value":"id"}},{"kind":"Field","name":{"kind":"Name","value":"temperature"}},{"kind":"Field","name":{"kind":"Name","value":"pressure"}},{"kind":"Field","name":{"kind":"Name","value":"diffusivity"}},{"kind":"Field","name":{"kind":"Name","value":"diffusivityUncertainty"}},{"kind":"Field","name":{"kind":"Name","value":"uncertaintyOrigin"}}]}}]}}]} as unknown as DocumentNode<FitSeriesFragment, unknown>;
export const CorrelationNumbersFragmentDoc = {"kind":"Document","definitions":[{"kind":"FragmentDefinition","name":{"kind":"Name","value":"CorrelationNumbers"},"typeCondition":{"kind":"NamedType","name":{"kind":"Name","value":"Correlation"}},"selectionSet":{"kind":"SelectionSet","selections":[{"kind":"Field","name":{"kind":"Name","value":"form"}},{"kind":"Field","name":{"kind":"Name","value":"expression"}},{"kind":"Field","name":{"kind":"Name","value":"referenceTemperature"}},{"kind":"Field","name":{"kind":"Name","value":"referencePressure"}},{"kind":"Field","name":{"kind":"Name","value":"degreesOfFreedom"}},{"kind":"Field","name":{"kind":"Name","value":"parameters"},"selectionSet":{"kind":"SelectionSet","selections":[{"kind":"Field","name":{"kind":"Name","value":"symbol"}},{"kind":"Field","name":{"kind":"Name","value":"value"}},{"kind":"Field","name":{"kind":"Name","value":"standardUncertainty"}},{"kind":"Field","name":{"kind":"Name","value":"unit"}}]}},{"kind":"Field","name":{"kind":"Name","value":"validity"},"selectionSet":{"kind":"SelectionSet","selections":[{"kind":"Field","name":{"kind":"Name","value":"temperatureMinimum"}},{"kind":"Field","name":{"kind":"Name","value":"temperatureMaximum"}},{"kind":"Field","name":{"kind":"Name","value":"pressureMinimum"}},{"kind":"Field","name":{"kind":"Name","value":"pressureMaximum"}},{"kind":"Field","name":{"kind":"Name","value":"pressureBasis"}}]}}]}}]} as unknown as DocumentNode<CorrelationNumbersFragment, unknown>;
export const KeptFitFragmentDoc = {"kind":"Document","definitions":[{"kind":"FragmentDefinition","name":{"kind":"Name","value":"KeptFit"},"typeCondition":{"kind":"NamedType","name":{"kind":"Name","value":"Fit"}},"selectionSet":{"kind":"SelectionSet","selections":[{"kind":"Field","name":{"kind":"Name","value":"id"}},{"kind":"Field","name":{"kind":"Name","value":"number"}},{"kind":"Field","name":{"kind":"Name","value":"createdAt"}},{"kind":"Field","name":{"kind":"Name","value":"createdBy"},"selectionSet":{"kind":"SelectionSet","selections":[{"kind":"Field","name":{"kind":"Name","value":"id"}},{"kind":"Field","name":{"kind":"Name","value":"name"}}]}},{"kind":"Field","name":{"kind":"Name","value":"objective"}},{"kind":"Field","name":{"kind":"Name","value":"weighting"}},{"kind":"Field","name":{"kind":"Name","value":"loss"}},{"kind":"Field","name":{"kind":"Name","value":"seriesEffect"}},{"kind":"Field","name":{"kind":"Name","value":"series"},"selectionSet":{"kind":"SelectionSet","selections":[{"kind":"Field","name":{"kind":"Name","value":"id"}}]}},{"kind":"Field","name":{"kind":"Name","value":"leftOutSeries"},"selectionSet":{"kind":"SelectionSet","selections":[{"kind":"Field","name":{"kind":"Name","value":"reason"}},{"kind":"Field","name":{"kind":"Name","value":"series"},"selectionSet":{"kind":"SelectionSet","selections":[{"kind":"Field","name":{"kind":"Name","value":"id"}}]}}]}},{"kind":"Field","name":{"kind":"Name","value":"excludedPoints"},"selectionSet":{"kind":"SelectionSet","selections":[{"kind":"Field","name":{"kind":"Name","value":"reason"}},{"kind":"Field","name":{"kind":"Name","value":"point"},"selectionSet":{"kind":"SelectionSet","selections":[{"kind":"Field","name":{"kind":"Name","value":"id"}}]}}]}},{"kind":"Field","name":{"kind":"Name","value":"statistics"},"selectionSet":{"kind":"SelectionSet","selections":[{"kind":"FragmentSpread","name":{"kind":"Name","value":"StatisticsNumbers"}}]}},{"kind":"Field","name":{"kind":"Name","value":"correlation"},"selectionSet":{"kind":"SelectionSet","selections":[{"kind":"FragmentSpread","name":{"kind":"Name","value":"CorrelationNumbers"}}]}}]}},{"kind":"FragmentDefinition","name":{"kind":"Name","value":"StatisticsNumbers"},"typeCondition":{"kind":"NamedType","name":{"kind":"Name","value":"FitStatistics"}},"selectionSet":{"kind":"SelectionSet","selections":[{"kind":"Field","name":{"kind":"Name","value":"pointCount"}},{"kind":"Field","name":{"kind":"Name","value":"seriesCount"}},{"kind":"Field","name":{"kind":"Name","value":"residualDegreesOfFreedom"}},{"kind":"Field","name":{"kind":"Name","value":"chiSquare"}},{"kind":"Field","name":{"kind":"Name","value":"reducedChiSquare"}},{"kind":"Field","name":{"kind":"Name","value":"chiSquareProbability"}},{"kind":"Field","name":{"kind":"Name","value":"residualStandardError"}},{"kind":"Field","name":{"kind":"Name","value":"aicc"}},{"kind":"Field","name":{"kind":"Name","value":"betweenSeriesDeviation"}},{"kind":"Field","name":{"kind":"Name","value":"betweenSeriesOrigin"}},{"kind":"Field","name":{"kind":"Name","value":"cochranQ"}},{"kind":"Field","name":{"kind":"Name","value":"iSquared"}}]}},{"kind":"FragmentDefinition","name":{"kind":"Name","value":"CorrelationNumbers"},"typeCondition":{"kind":"NamedType","name":{"kind":"Name","value":"Correlation"}},"selectionSet":{"kind":"SelectionSet","selections":[{"kind":"Field","name":{"kind":"Name","value":"form"}},{"kind":"Field","name":{"kind":"Name","value":"expression"}},{"kind":"Field","name":{"kind":"Name","value":"referenceTemperature"}},{"kind":"Field","name":{"kind":"Name","value":"referencePressure"}},{"kind":"Field","name":{"kind":"Name","value":"degreesOfFreedom"}},{"kind":"Field","name":{"kind":"Name","value":"parameters"},"selectionSet":{"kind":"SelectionSet","selections":[{"kind":"Field","name":{"kind":"Name","value":"symbol"}},{"kind":"Field","name":{"kind":"Name","value":"value"}},{"kind":"Field","name":{"kind":"Name","value":"standardUncertainty"}},{"kind":"Field","name":{"kind":"Name","value":"unit"}}]}},{"kind":"Field","name":{"kind":"Name","value":"validity"},"selectionSet":{"kind":"SelectionSet","selections":[{"kind":"Field","name":{"kind":"Name","value":"temperatureMinimum"}},{"kind":"Field","name":{"kind":"Name","value":"temperatureMaximum"}},{"kind":"Field","name":{"kind":"Name","value":"pressureMinimum"}},{"kind":"Field","name":{"kind":"Name","value":"pressureMaximum"}},{"kind":"Field","name":{"kind":"Name","value":"pressureBasis"}}]}}]}}]} as unknown as DocumentNode<KeptFitFragment, unknown>;
export const TaskFieldsFragmentDoc = {"kind":"Document","definitions":[{"kind":"FragmentDefinition","name":{"kind":"Name","value":"TaskFields"},"typeCondition":{"kind":"NamedType","name":{"kind":"Name","value":"Task"}},"selectionSet":{"kind":"SelectionSet","selections":[{"kind":"Field","name":{"kind":"Name","value":"kind"}},{"kind":"Field","name":{"kind":"Name","value":"since"}},{"kind":"Field","name":{"kind":"Name","value":"remark"}},{"kind":"Field","name":{"kind":"Name","value":"series"},"selectionSet":{"kind":"SelectionSet","selections":[{"kind":"Field","name":{"kind":"Name","value":"id"}},{"kind":"Field","name":{"kind":"Name","value":"title"}},{"kind":"Field","name":{"kind":"Name","value":"status"}},{"kind":"Field","name":{"kind":"Name","value":"pair"},"selectionSet":{"kind":"SelectionSet","selections":[{"kind":"Field","name":{"kind":"Name","value":"id"}},{"kind":"Field","name":{"kind":"Name","value":"substances"},"selectionSet":{"kind":"SelectionSet","selections":[{"kind":"Field","name":{"kind":"Name","value":"id"}},{"kind":"Field","name":{"kind":"Name","value":"name"}}]}}]}},{"kind":"Field","name":{"kind":"Name","value":"submittedBy"},"selectionSet":{"kind":"SelectionSet","selections":[{"kind":"Field","name":{"kind":"Name","value":"id"}},{"kind":"Field","name":{"kind":"Name","value":"name"}}]}}]}},{"kind":"Field","name":{"kind":"Name","value":"version"},"selectionSet":{"kind":"SelectionSet","selections":[{"kind":"Field","name":{"kind":"Name","value":"id"}},{"kind":"Field","name":{"kind":"Name","value":"number"}},{"kind":"Field","name":{"kind":"Name","value":"status"}},{"kind":"Field","name":{"kind":"Name","value":"sheet"},"selectionSet":{"kind":"SelectionSet","selections":[{"kind":"Field","name":{"kind":"Name","value":"id"}},{"kind":"Field","name":{"kind":"Name","value":"code"}},{"kind":"Field","name":{"kind":"Name","value":"pair"},"selectionSet":{"kind":"SelectionSet","selections":[{"kind":"Field","name":{"kind":"Name","value":"id"}},{"kind":"Field","name":{"kind":"Name","value":"substances"},"selectionSet":{"kind":"SelectionSet","selections":[{"kind":"Field","name":{"kind":"Name","value":"id"}},{"kind":"Field","name":{"kind":"Name","value":"name"}}]}}]}}]}},{"kind":"Field","name":{"kind":"Name","value":"preparedBy"},"selectionSet":{"kind":"SelectionSet","selections":[{"kind":"Field","name":{"kind":"Name","value":"id"}},{"kind":"Field","name":{"kind":"Name","value":"name"}}]}}]}}]}}]} as unknown as DocumentNode<TaskFieldsFragment, unknown>;
export const PairRowFragmentDoc = {"kind":"Document","definitions":[{"kind":"FragmentDefinition","name":{"kind":"Name","value":"PairRow"},"typeCondition":{"kind":"NamedType","name":{"kind":"Name","value":"GasPair"}},"selectionSet":{"kind":"SelectionSet","selections":[{"kind":"Field","name":{"kind":"Name","value":"id"}},{"kind":"Field","name":{"kind":"Name","value":"substances"},"selectionSet":{"kind":"SelectionSet","selections":[{"kind":"Field","name":{"kind":"Name","value":"id"}},{"kind":"Field","name":{"kind":"Name","value":"name"}},{"kind":"Field","name":{"kind":"Name","value":"formula"}}]}},{"kind":"Field","alias":{"kind":"Name","value":"accepted"},"name":{"kind":"Name","value":"series"},"arguments":[{"kind":"Argument","name":{"kind":"Name","value":"status"},"value":{"kind":"ListValue","values":[{"kind":"EnumValue","value":"ACCEPTED"}]}},{"kind":"Argument","name":{"kind":"Name","value":"first"},"value":{"kind":"IntValue","value":"1"}}],"selectionSet":{"kind":"SelectionSet","selections":[{"kind":"Field","name":{"kind":"Name","value":"totalCount"}}]}},{"kind":"Field","alias":{"kind":"Name","value":"waiting"},"name":{"kind":"Name","value":"series"},"arguments":[{"kind":"Argument","name":{"kind":"Name","value":"status"},"value":{"kind":"ListValue","values":[{"kind":"EnumValue","value":"SUBMITTED"}]}},{"kind":"Argument","name":{"kind":"Name","value":"first"},"value":{"kind":"IntValue","value":"1"}}],"selectionSet":{"kind":"SelectionSet","selections":[{"kind":"Field","name":{"kind":"Name","value":"totalCount"}}]}},{"kind":"Field","name":{"kind":"Name","value":"fits"},"selectionSet":{"kind":"SelectionSet","selections":[{"kind":"Field","name":{"kind":"Name","value":"id"}},{"kind":"Field","name":{"kind":"Name","value":"number"}}]}},{"kind":"Field","name":{"kind":"Name","value":"dataSheet"},"selectionSet":{"kind":"SelectionSet","selections":[{"kind":"Field","name":{"kind":"Name","value":"id"}},{"kind":"Field","name":{"kind":"Name","value":"code"}},{"kind":"Field","name":{"kind":"Name","value":"current"},"selectionSet":{"kind":"SelectionSet","selections":[{"kind":"Field","name":{"kind":"Name","value":"id"}},{"kind":"Field","name":{"kind":"Name","value":"number"}}]}},{"kind":"Field","name":{"kind":"Name","value":"versions"},"selectionSet":{"kind":"SelectionSet","selections":[{"kind":"Field","name":{"kind":"Name","value":"id"}},{"kind":"Field","name":{"kind":"Name","value":"number"}},{"kind":"Field","name":{"kind":"Name","value":"status"}}]}}]}}]}}]} as unknown as DocumentNode<PairRowFragment, unknown>;
export const SeriesRowFragmentDoc = {"kind":"Document","definitions":[{"kind":"FragmentDefinition","name":{"kind":"Name","value":"SeriesRow"},"typeCondition":{"kind":"NamedType","name":{"kind":"Name","value":"Series"}},"selectionSet":{"kind":"SelectionSet","selections":[{"kind":"Field","name":{"kind":"Name","value":"id"}},{"kind":"Field","name":{"kind":"Name","value":"title"}},{"kind":"Field","name":{"kind":"Name","value":"status"}},{"kind":"Field","name":{"kind":"Name","value":"method"}},{"kind":"Field","name":{"kind":"Name","value":"createdAt"}},{"kind":"Field","name":{"kind":"Name","value":"createdBy"},"selectionSet":{"kind":"SelectionSet","selections":[{"kind":"Field","name":{"kind":"Name","value":"id"}},{"kind":"Field","name":{"kind":"Name","value":"name"}}]}},{"kind":"Field","name":{"kind":"Name","value":"pair"},"selectionSet":{"kind":"SelectionSet","selections":[{"kind":"Field","name":{"kind":"Name","value":"id"}},{"kind":"Field","name":{"kind":"Name","value":"substances"},"selectionSet":{"kind":"SelectionSet","selections":[{"kind":"Field","name":{"kind":"Name","value":"id"}},{"kind":"Field","name":{"kind":"Name","value":"name"}}]}}]}},{"kind":"Field","name":{"kind":"Name","value":"points"},"selectionSet":{"kind":"SelectionSet","selections":[{"kind":"Field","name":{"kind":"Name","value":"id"}},{"kind":"Field","name":{"kind":"Name","value":"temperature"}}]}}]}}]} as unknown as DocumentNode<SeriesRowFragment, unknown>;
export const SeriesDetailFragmentDoc = {"kind":"Document","definitions":[{"kind":"FragmentDefinition","name":{"kind":"Name","value":"SeriesDetail"},"typeCondition":{"kind":"NamedType","name":{"kind":"Name","value":"Series"}},"selectionSet":{"kind":"SelectionSet","selections":[{"kind":"Field","name":{"kind":"Name","value":"id"}},{"kind":"Field","name":{"kind":"Name","value":"title"}},{"kind":"Field","name":{"kind":"Name","value":"status"}},{"kind":"Field","name":{"kind":"Name","value":"source"}},{"kind":"Field","name":{"kind":"Name","value":"method"}},{"kind":"Field","name":{"kind":"Name","value":"apparatus"}},{"kind":"Field","name":{"kind":"Name","value":"dataOrigin"}},{"kind":"Field","name":{"kind":"Name","value":"commonRelativeUncertainty"}},{"kind":"Field","name":{"kind":"Name","value":"createdAt"}},{"kind":"Field","name":{"kind":"Name","value":"lockVersion"}},{"kind":"Field","name":{"kind":"Name","value":"createdBy"},"selectionSet":{"kind":"SelectionSet","selections":[{"kind":"Field","name":{"kind":"Name","value":"id"}},{"kind":"Field","name":{"kind":"Name","value":"name"}}]}},{"kind":"Field","name":{"kind":"Name","value":"submittedBy"},"selectionSet":{"kind":"SelectionSet","selections":[{"kind":"Field","name":{"kind":"Name","value":"id"}},{"kind":"Field","name":{"kind":"Name","value":"name"}}]}},{"kind":"Field","name":{"kind":"Name","value":"sameDataAs"},"selectionSet":{"kind":"SelectionSet","selections":[{"kind":"Field","name":{"kind":"Name","value":"id"}},{"kind":"Field","name":{"kind":"Name","value":"title"}}]}},{"kind":"Field","name":{"kind":"Name","value":"pair"},"selectionSet":{"kind":"SelectionSet","selections":[{"kind":"Field","name":{"kind":"Name","value":"id"}},{"kind":"Field","name":{"kind":"Name","value":"substances"},"selectionSet":{"kind":"SelectionSet","selections":[{"kind":"Field","name":{"kind":"Name","value":"id"}},{"kind":"Field","name":{"kind":"Name","value":"name"}}]}}]}},{"kind":"Field","name":{"kind":"Name","value":"warnings"},"selectionSet":{"kind":"SelectionSet","selections":[{"kind":"Field","name":{"kind":"Name","value":"code"}},{"kind":"Field","name":{"kind":"Name","value":"message"}},{"kind":"Field","name":{"kind":"Name","value":"path"}}]}},{"kind":"Field","name":{"kind":"Name","value":"events"},"selectionSet":{"kind":"SelectionSet","selections":[{"kind":"Field","name":{"kind":"Name","value":"action"}},{"kind":"Field","name":{"kind":"Name","value":"status"}},{"kind":"Field","name":{"kind":"Name","value":"remark"}},{"kind":"Field","name":{"kind":"Name","value":"at"}},{"kind":"Field","name":{"kind":"Name","value":"person"},"selectionSet":{"kind":"SelectionSet","selections":[{"kind":"Field","name":{"kind":"Name","value":"id"}},{"kind":"Field","name":{"kind":"Name","value":"name"}}]}}]}},{"kind":"Field","name":{"kind":"Name","value":"points"},"selectionSet":{"kind":"SelectionSet","selections":[{"kind":"Field","name":{"kind":"Name","value":"id"}},{"kind":"Field","name":{"kind":"Name","value":"temperature"}},{"kind":"Field","name":{"kind":"Name","value":"pressure"}},{"kind":"Field","name":{"kind":"Name","value":"pressureOrigin"}},{"kind":"Field","name":{"kind":"Name","value":"diffusivity"}},{"kind":"Field","name":{"kind":"Name","value":"diffusivityUncertainty"}},{"kind":"Field","name":{"kind":"Name","value":"uncertaintyOrigin"}},{"kind":"Field","name":{"kind":"Name","value":"temperatureUncertainty"}},{"kind":"Field","name":{"kind":"Name","value":"pressureUncertainty"}},{"kind":"Field","name":{"kind":"Name","value":"moleFraction"}},{"kind":"Field","name":{"kind":"Name","value":"replicates"}}]}}]}}]} as unknown as DocumentNode<SeriesDetailFragment, unknown>;
export const SeriesOutcomeFragmentDoc = {"kind":"Document","definitions":[{"kind":"FragmentDefinition","name":{"kind":"Name","value":"SeriesOutcome"},"typeCondition":{"kind":"NamedType","name":{"kind":"Name","value":"SeriesPayload"}},"selectionSet":{"kind":"SelectionSet","selections":[{"kind":"Field","name":{"kind":"Name","value":"problems"},"selectionSet":{"kind":"SelectionSet","selections":[{"kind":"Field","name":{"kind":"Name","value":"code"}},{"kind":"Field","name":{"kind":"Name","value":"message"}},{"kind":"Field","name":{"kind":"Name","value":"path"}}]}},{"kind":"Field","name":{"kind":"Name","value":"series"},"selectionSet":{"kind":"SelectionSet","selections":[{"kind":"FragmentSpread","name":{"kind":"Name","value":"SeriesDetail"}}]}}]}},{"kind":"FragmentDefinition","name":{"kind":"Name","value":"SeriesDetail"},"typeCondition":{"kind":"NamedType","name":{"kind":"Name","value":"Series"}},"selectionSet":{"kind":"SelectionSet","selections":[{"kind":"Field","name":{"kind":"Name","value":"id"}},{"kind":"Field","name":{"kind":"Name","value":"title"}},{"kind":"Field","name":{"kind":"Name","value":"status"}},{"kind":"Field","name":{"kind":"Name","value":"source"}},{"kind":"Field","name":{"kind":"Name","value":"method"}},{"kind":"Field","name":{"kind":"Name","value":"apparatus"}},{"kind":"Field","name":{"kind":"Name","value":"dataOrigin"}},{"kind":"Field","name":{"kind":"Name","value":"commonRelativeUncertainty"}},{"kind":"Field","name":{"kind":"Name","value":"createdAt"}},{"kind":"Field","name":{"kind":"Name","value":"lockVersion"}},{"kind":"Field","name":{"kind":"Name","value":"createdBy"},"selectionSet":{"kind":"SelectionSet","selections":[{"kind":"Field","name":{"kind":"Name","value":"id"}},{"kind":"Field","name":{"kind":"Name","value":"name"}}]}},{"kind":"Field","name":{"kind":"Name","value":"submittedBy"},"selectionSet":{"kind":"SelectionSet","selections":[{"kind":"Field","name":{"kind":"Name","value":"id"}},{"kind":"Field","name":{"kind":"Name","value":"name"}}]}},{"kind":"Field","name":{"kind":"Name","value":"sameDataAs"},"selectionSet":{"kind":"SelectionSet","selections":[{"kind":"Field","name":{"kind":"Name","value":"id"}},{"kind":"Field","name":{"kind":"Name","value":"title"}}]}},{"kind":"Field","name":{"kind":"Name","value":"pair"},"selectionSet":{"kind":"SelectionSet","selections":[{"kind":"Field","name":{"kind":"Name","value":"id"}},{"kind":"Field","name":{"kind":"Name","value":"substances"},"selectionSet":{"kind":"SelectionSet","selections":[{"kind":"Field","name":{"kind":"Name","value":"id"}},{"kind":"Field","name":{"kind":"Name","value":"name"}}]}}]}},{"kind":"Field","name":{"kind":"Name","value":"warnings"},"selectionSet":{"kind":"SelectionSet","selections":[{"kind":"Field","name":{"kind":"Name","value":"code"}},{"kind":"Field","name":{"kind":"Name","value":"message"}},{"kind":"Field","name":{"kind":"Name","value":"path"}}]}},{"kind":"Field","name":{"kind":"Name","value":"events"},"selectionSet":{"kind":"SelectionSet","selections":[{"kind":"Field","name":{"kind":"Name","value":"action"}},{"kind":"Field","name":{"kind":"Name","value":"status"}},{"kind":"Field","name":{"kind":"Name","value":"remark"}},{"kind":"Field","name":{"kind":"Name","value":"at"}},{"kind":"Field","name":{"kind":"Name","value":"person"},"selectionSet":{"kind":"SelectionSet","selections":[{"kind":"Field","name":{"kind":"Name","value":"id"}},{"kind":"Field","name":{"kind":"Name","value":"name"}}]}}]}},{"kind":"Field","name":{"kind":"Name","value":"points"},"selectionSet":{"kind":"SelectionSet","selections":[{"kind":"Field","name":{"kind":"Name","value":"id"}},{"kind":"Field","name":{"kind":"Name","value":"temperature"}},{"kind":"Field","name":{"kind":"Name","value":"pressure"}},{"kind":"Field","name":{"kind":"Name","value":"pressureOrigin"}},{"kind":"Field","name":{"kind":"Name","value":"diffusivity"}},{"kind":"Field","name":{"kind":"Name","value":"diffusivityUncertainty"}},{"kind":"Field","name":{"kind":"Name","value":"uncertaintyOrigin"}},{"kind":"Field","name":{"kind":"Name","value":"temperatureUncertainty"}},{"kind":"Field","name":{"kind":"Name","value":"pressureUncertainty"}},{"kind":"Field","name":{"kind":"Name","value":"moleFraction"}},{"kind":"Field","name":{"kind":"Name","value":"replicates"}}]}}]}}]} as unknown as DocumentNode<SeriesOutcomeFragment, unknown>;
export const RunFragmentDoc = {"kind":"Document","definitions":[{"kind":"FragmentDefinition","name":{"kind":"Name","value":"Run"},"typeCondition":{"kind":"NamedType","name":{"kind":"Name","value":"TextRun"}},"selectionSet":{"kind":"SelectionSet","selections":[{"kind":"Field","name":{"kind":"Name","value":"text"}},{"kind":"Field","name":{"kind":"Name","value":"style"}}]}}]} as unknown as DocumentNode<RunFragment, unknown>;
export const SheetTextFragmentDoc = {"kind":"Document","definitions":[{"kind":"FragmentDefinition","name":{"kind":"Name","value":"SheetText"},"typeCondition":{"kind":"NamedType","name":{"kind":"Name","value":"SheetContent"}},"selectionSet":{"kind":"SelectionSet","selections":[{"kind":"Field","name":{"kind":"Name","value":"title"}},{"kind":"Field","name":{"kind":"Name","value":"lead"},"selectionSet":{"kind":"SelectionSet","selections":[{"kind":"FragmentSpread","name":{"kind":"Name","value":"Run"}}]}},{"kind":"Field","name":{"kind":"Name","value":"summary"}},{"kind":"Field","name":{"kind":"Name","value":"substances"},"selectionSet":{"kind":"SelectionSet","selections":[{"kind":"Field","name":{"kind":"Name","value":"name"}},{"kind":"Field","name":{"kind":"Name","value":"formula"},"selectionSet":{"kind":"SelectionSet","selections":[{"kind":"FragmentSpread","name":{"kind":"Name","value":"Run"}}]}},{"kind":"Field","name":{"kind":"Name","value":"casNumber"}},{"kind":"Field","name":{"kind":"Name","value":"molarMass"}}]}},{"kind":"Field","name":{"kind":"Name","value":"definition"},"selectionSet":{"kind":"SelectionSet","selections":[{"kind":"FragmentSpread","name":{"kind":"Name","value":"Run"}}]}},{"kind":"Field","name":{"kind":"Name","value":"uncertainty"},"selectionSet":{"kind":"SelectionSet","selections":[{"kind":"Field","name":{"kind":"Name","value":"statement"},"selectionSet":{"kind":"SelectionSet","selections":[{"kind":"FragmentSpread","name":{"kind":"Name","value":"Run"}}]}},{"kind":"Field","name":{"kind":"Name","value":"notIncluded"},"selectionSet":{"kind":"SelectionSet","selections":[{"kind":"FragmentSpread","name":{"kind":"Name","value":"Run"}}]}}]}},{"kind":"Field","name":{"kind":"Name","value":"cautions"},"selectionSet":{"kind":"SelectionSet","selections":[{"kind":"FragmentSpread","name":{"kind":"Name","value":"Run"}}]}},{"kind":"Field","name":{"kind":"Name","value":"citation"},"selectionSet":{"kind":"SelectionSet","selections":[{"kind":"Field","name":{"kind":"Name","value":"runs"},"selectionSet":{"kind":"SelectionSet","selections":[{"kind":"FragmentSpread","name":{"kind":"Name","value":"Run"}}]}},{"kind":"Field","name":{"kind":"Name","value":"plain"}},{"kind":"Field","name":{"kind":"Name","value":"doi"}}]}},{"kind":"Field","name":{"kind":"Name","value":"versions"},"selectionSet":{"kind":"SelectionSet","selections":[{"kind":"Field","name":{"kind":"Name","value":"number"}},{"kind":"Field","name":{"kind":"Name","value":"status"}},{"kind":"Field","name":{"kind":"Name","value":"word"}},{"kind":"Field","name":{"kind":"Name","value":"date"}},{"kind":"Field","name":{"kind":"Name","value":"datePrinted"}},{"kind":"Field","name":{"kind":"Name","value":"change"}},{"kind":"Field","name":{"kind":"Name","value":"isThis"}}]}},{"kind":"Field","name":{"kind":"Name","value":"sections"},"selectionSet":{"kind":"SelectionSet","selections":[{"kind":"Field","name":{"kind":"Name","value":"id"}},{"kind":"Field","name":{"kind":"Name","value":"number"}},{"kind":"Field","name":{"kind":"Name","value":"title"}}]}},{"kind":"Field","name":{"kind":"Name","value":"remarks"},"selectionSet":{"kind":"SelectionSet","selections":[{"kind":"Field","name":{"kind":"Name","value":"section"}},{"kind":"Field","name":{"kind":"Name","value":"text"}}]}},{"kind":"Field","name":{"kind":"Name","value":"margin"},"selectionSet":{"kind":"SelectionSet","selections":[{"kind":"Field","name":{"kind":"Name","value":"entries"},"selectionSet":{"kind":"SelectionSet","selections":[{"kind":"Field","name":{"kind":"Name","value":"label"},"selectionSet":{"kind":"SelectionSet","selections":[{"kind":"FragmentSpread","name":{"kind":"Name","value":"Run"}}]}},{"kind":"Field","name":{"kind":"Name","value":"value"}}]}},{"kind":"Field","name":{"kind":"Name","value":"fit"},"selectionSet":{"kind":"SelectionSet","selections":[{"kind":"FragmentSpread","name":{"kind":"Name","value":"Run"}}]}},{"kind":"Field","name":{"kind":"Name","value":"figures"},"selectionSet":{"kind":"SelectionSet","selections":[{"kind":"FragmentSpread","name":{"kind":"Name","value":"Run"}}]}},{"kind":"Field","name":{"kind":"Name","value":"series"},"selectionSet":{"kind":"SelectionSet","selections":[{"kind":"FragmentSpread","name":{"kind":"Name","value":"Run"}}]}}]}}]}},{"kind":"FragmentDefinition","name":{"kind":"Name","value":"Run"},"typeCondition":{"kind":"NamedType","name":{"kind":"Name","value":"TextRun"}},"selectionSet":{"kind":"SelectionSet","selections":[{"kind":"Field","name":{"kind":"Name","value":"text"}},{"kind":"Field","name":{"kind":"Name","value":"style"}}]}}]} as unknown as DocumentNode<SheetTextFragment, unknown>;
export const FiguresDataFragmentDoc = {"kind":"Document","definitions":[{"kind":"FragmentDefinition","name":{"kind":"Name","value":"FiguresData"},"typeCondition":{"kind":"NamedType","name":{"kind":"Name","value":"SheetFigures"}},"selectionSet":{"kind":"SelectionSet","selections":[{"kind":"Field","name":{"kind":"Name","value":"pressure"}},{"kind":"Field","name":{"kind":"Name","value":"temperatureAxis"},"selectionSet":{"kind":"SelectionSet","selections":[{"kind":"Field","name":{"kind":"Name","value":"minimum"}},{"kind":"Field","name":{"kind":"Name","value":"maximum"}}]}},{"kind":"Field","name":{"kind":"Name","value":"diffusivityAxis"},"selectionSet":{"kind":"SelectionSet","selections":[{"kind":"Field","name":{"kind":"Name","value":"minimum"}},{"kind":"Field","name":{"kind":"Name","value":"maximum"}}]}},{"kind":"Field","name":{"kind":"Name","value":"deviationAxis"},"selectionSet":{"kind":"SelectionSet","selections":[{"kind":"Field","name":{"kind":"Name","value":"minimum"}},{"kind":"Field","name":{"kind":"Name","value":"maximum"}},{"kind":"Field","name":{"kind":"Name","value":"ticks"}}]}},{"kind":"Field","name":{"kind":"Name","value":"curve"},"selectionSet":{"kind":"SelectionSet","selections":[{"kind":"Field","name":{"kind":"Name","value":"temperatures"}},{"kind":"Field","name":{"kind":"Name","value":"diffusivities"}},{"kind":"Field","name":{"kind":"Name","value":"relativeExpandedUncertainties"}},{"kind":"Field","name":{"kind":"Name","value":"relativeNewLaboratory"}},{"kind":"Field","name":{"kind":"Name","value":"firstInside"}},{"kind":"Field","name":{"kind":"Name","value":"lastInside"}}]}},{"kind":"Field","name":{"kind":"Name","value":"series"},"selectionSet":{"kind":"SelectionSet","selections":[{"kind":"Field","name":{"kind":"Name","value":"key"}},{"kind":"Field","name":{"kind":"Name","value":"mark"}},{"kind":"Field","name":{"kind":"Name","value":"title"}},{"kind":"Field","name":{"kind":"Name","value":"used"}},{"kind":"Field","name":{"kind":"Name","value":"temperatures"}},{"kind":"Field","name":{"kind":"Name","value":"reducedDiffusivities"}},{"kind":"Field","name":{"kind":"Name","value":"relativeUncertainties"}},{"kind":"Field","name":{"kind":"Name","value":"deviations"}},{"kind":"Field","name":{"kind":"Name","value":"leftOut"}}]}},{"kind":"Field","name":{"kind":"Name","value":"estimates"},"selectionSet":{"kind":"SelectionSet","selections":[{"kind":"Field","name":{"kind":"Name","value":"method"}},{"kind":"Field","name":{"kind":"Name","value":"temperatures"}},{"kind":"Field","name":{"kind":"Name","value":"deviations"}}]}},{"kind":"Field","name":{"kind":"Name","value":"diffusivityCaption"},"selectionSet":{"kind":"SelectionSet","selections":[{"kind":"FragmentSpread","name":{"kind":"Name","value":"Run"}}]}},{"kind":"Field","name":{"kind":"Name","value":"deviationCaption"},"selectionSet":{"kind":"SelectionSet","selections":[{"kind":"FragmentSpread","name":{"kind":"Name","value":"Run"}}]}}]}},{"kind":"FragmentDefinition","name":{"kind":"Name","value":"Run"},"typeCondition":{"kind":"NamedType","name":{"kind":"Name","value":"TextRun"}},"selectionSet":{"kind":"SelectionSet","selections":[{"kind":"Field","name":{"kind":"Name","value":"text"}},{"kind":"Field","name":{"kind":"Name","value":"style"}}]}}]} as unknown as DocumentNode<FiguresDataFragment, unknown>;
export const SheetSeriesRowFragmentDoc = {"kind":"Document","definitions":[{"kind":"FragmentDefinition","name":{"kind":"Name","value":"SheetSeriesRow"},"typeCondition":{"kind":"NamedType","name":{"kind":"Name","value":"SheetSeries"}},"selectionSet":{"kind":"SelectionSet","selections":[{"kind":"Field","name":{"kind":"Name","value":"key"}},{"kind":"Field","name":{"kind":"Name","value":"mark"}},{"kind":"Field","name":{"kind":"Name","value":"title"}},{"kind":"Field","name":{"kind":"Name","value":"source"}},{"kind":"Field","name":{"kind":"Name","value":"method"}},{"kind":"Field","name":{"kind":"Name","value":"pointCount"}},{"kind":"Field","name":{"kind":"Name","value":"weightedPointCount"}},{"kind":"Field","name":{"kind":"Name","value":"temperatureMinimum"}},{"kind":"Field","name":{"kind":"Name","value":"temperatureMaximum"}},{"kind":"Field","name":{"kind":"Name","value":"relativeUncertainty"}},{"kind":"Field","name":{"kind":"Name","value":"uncertaintyAssigned"}},{"kind":"Field","name":{"kind":"Name","value":"offset"}},{"kind":"Field","name":{"kind":"Name","value":"offsetStandardUncertainty"}},{"kind":"Field","name":{"kind":"Name","value":"reason"}}]}}]} as unknown as DocumentNode<SheetSeriesRowFragment, unknown>;
export const SheetNumbersFragmentDoc = {"kind":"Document","definitions":[{"kind":"FragmentDefinition","name":{"kind":"Name","value":"SheetNumbers"},"typeCondition":{"kind":"NamedType","name":{"kind":"Name","value":"SheetContent"}},"selectionSet":{"kind":"SelectionSet","selections":[{"kind":"Field","name":{"kind":"Name","value":"correlation"},"selectionSet":{"kind":"SelectionSet","selections":[{"kind":"Field","name":{"kind":"Name","value":"form"}},{"kind":"Field","name":{"kind":"Name","value":"equation"},"selectionSet":{"kind":"SelectionSet","selections":[{"kind":"Field","name":{"kind":"Name","value":"runs"},"selectionSet":{"kind":"SelectionSet","selections":[{"kind":"FragmentSpread","name":{"kind":"Name","value":"Run"}}]}},{"kind":"Field","name":{"kind":"Name","value":"numerator"},"selectionSet":{"kind":"SelectionSet","selections":[{"kind":"FragmentSpread","name":{"kind":"Name","value":"Run"}}]}},{"kind":"Field","name":{"kind":"Name","value":"denominator"},"selectionSet":{"kind":"SelectionSet","selections":[{"kind":"FragmentSpread","name":{"kind":"Name","value":"Run"}}]}},{"kind":"Field","name":{"kind":"Name","value":"bracketed"}},{"kind":"Field","name":{"kind":"Name","value":"exponent"},"selectionSet":{"kind":"SelectionSet","selections":[{"kind":"FragmentSpread","name":{"kind":"Name","value":"Run"}}]}}]}},{"kind":"Field","name":{"kind":"Name","value":"spoken"}},{"kind":"Field","name":{"kind":"Name","value":"expression"}},{"kind":"Field","name":{"kind":"Name","value":"parameters"},"selectionSet":{"kind":"SelectionSet","selections":[{"kind":"Field","name":{"kind":"Name","value":"symbol"}},{"kind":"Field","name":{"kind":"Name","value":"label"},"selectionSet":{"kind":"SelectionSet","selections":[{"kind":"FragmentSpread","name":{"kind":"Name","value":"Run"}}]}},{"kind":"Field","name":{"kind":"Name","value":"value"}},{"kind":"Field","name":{"kind":"Name","value":"standardUncertainty"}},{"kind":"Field","name":{"kind":"Name","value":"unit"}},{"kind":"Field","name":{"kind":"Name","value":"printed"}},{"kind":"Field","name":{"kind":"Name","value":"note"}}]}},{"kind":"Field","name":{"kind":"Name","value":"coefficients"},"selectionSet":{"kind":"SelectionSet","selections":[{"kind":"Field","name":{"kind":"Name","value":"label"},"selectionSet":{"kind":"SelectionSet","selections":[{"kind":"FragmentSpread","name":{"kind":"Name","value":"Run"}}]}},{"kind":"Field","name":{"kind":"Name","value":"printed"}}]}},{"kind":"Field","name":{"kind":"Name","value":"coverageFactor"}}]}},{"kind":"Field","name":{"kind":"Name","value":"range"},"selectionSet":{"kind":"SelectionSet","selections":[{"kind":"Field","name":{"kind":"Name","value":"temperatureMinimum"}},{"kind":"Field","name":{"kind":"Name","value":"temperatureMaximum"}},{"kind":"Field","name":{"kind":"Name","value":"pressureMinimum"}},{"kind":"Field","name":{"kind":"Name","value":"pressureMaximum"}},{"kind":"Field","name":{"kind":"Name","value":"pressureBasis"}},{"kind":"Field","name":{"kind":"Name","value":"sentence"},"selectionSet":{"kind":"SelectionSet","selections":[{"kind":"FragmentSpread","name":{"kind":"Name","value":"Run"}}]}}]}},{"kind":"Field","name":{"kind":"Name","value":"figures"},"selectionSet":{"kind":"SelectionSet","selections":[{"kind":"FragmentSpread","name":{"kind":"Name","value":"FiguresData"}}]}},{"kind":"Field","name":{"kind":"Name","value":"recommended"},"selectionSet":{"kind":"SelectionSet","selections":[{"kind":"Field","name":{"kind":"Name","value":"pressure"}},{"kind":"Field","name":{"kind":"Name","value":"temperatures"}},{"kind":"Field","name":{"kind":"Name","value":"diffusivities"}},{"kind":"Field","name":{"kind":"Name","value":"standardUncertainties"}},{"kind":"Field","name":{"kind":"Name","value":"expandedUncertainties"}},{"kind":"Field","name":{"kind":"Name","value":"newLaboratoryHalfWidths"}},{"kind":"Field","name":{"kind":"Name","value":"referenceRow"}},{"kind":"Field","name":{"kind":"Name","value":"note"},"selectionSet":{"kind":"SelectionSet","selections":[{"kind":"FragmentSpread","name":{"kind":"Name","value":"Run"}}]}}]}},{"kind":"Field","name":{"kind":"Name","value":"seriesUsed"},"selectionSet":{"kind":"SelectionSet","selections":[{"kind":"FragmentSpread","name":{"kind":"Name","value":"SheetSeriesRow"}}]}},{"kind":"Field","name":{"kind":"Name","value":"seriesLeftOut"},"selectionSet":{"kind":"SelectionSet","selections":[{"kind":"FragmentSpread","name":{"kind":"Name","value":"SheetSeriesRow"}}]}},{"kind":"Field","name":{"kind":"Name","value":"pointsLeftOut"},"selectionSet":{"kind":"SelectionSet","selections":[{"kind":"Field","name":{"kind":"Name","value":"seriesKey"}},{"kind":"Field","name":{"kind":"Name","value":"temperature"}},{"kind":"Field","name":{"kind":"Name","value":"pressure"}},{"kind":"Field","name":{"kind":"Name","value":"diffusivity"}},{"kind":"Field","name":{"kind":"Name","value":"deviation"}},{"kind":"Field","name":{"kind":"Name","value":"reason"}}]}},{"kind":"Field","name":{"kind":"Name","value":"estimates"},"selectionSet":{"kind":"SelectionSet","selections":[{"kind":"Field","name":{"kind":"Name","value":"temperatures"}},{"kind":"Field","name":{"kind":"Name","value":"pressure"}},{"kind":"Field","name":{"kind":"Name","value":"methods"},"selectionSet":{"kind":"SelectionSet","selections":[{"kind":"Field","name":{"kind":"Name","value":"method"}},{"kind":"Field","name":{"kind":"Name","value":"diffusivities"}},{"kind":"Field","name":{"kind":"Name","value":"deviations"}},{"kind":"Field","name":{"kind":"Name","value":"usualMeanError"}},{"kind":"Field","name":{"kind":"Name","value":"source"}}]}},{"kind":"Field","name":{"kind":"Name","value":"note"},"selectionSet":{"kind":"SelectionSet","selections":[{"kind":"FragmentSpread","name":{"kind":"Name","value":"Run"}}]}}]}}]}},{"kind":"FragmentDefinition","name":{"kind":"Name","value":"Run"},"typeCondition":{"kind":"NamedType","name":{"kind":"Name","value":"TextRun"}},"selectionSet":{"kind":"SelectionSet","selections":[{"kind":"Field","name":{"kind":"Name","value":"text"}},{"kind":"Field","name":{"kind":"Name","value":"style"}}]}},{"kind":"FragmentDefinition","name":{"kind":"Name","value":"FiguresData"},"typeCondition":{"kind":"NamedType","name":{"kind":"Name","value":"SheetFigures"}},"selectionSet":{"kind":"SelectionSet","selections":[{"kind":"Field","name":{"kind":"Name","value":"pressure"}},{"kind":"Field","name":{"kind":"Name","value":"temperatureAxis"},"selectionSet":{"kind":"SelectionSet","selections":[{"kind":"Field","name":{"kind":"Name","value":"minimum"}},{"kind":"Field","name":{"kind":"Name","value":"maximum"}}]}},{"kind":"Field","name":{"kind":"Name","value":"diffusivityAxis"},"selectionSet":{"kind":"SelectionSet","selections":[{"kind":"Field","name":{"kind":"Name","value":"minimum"}},{"kind":"Field","name":{"kind":"Name","value":"maximum"}}]}},{"kind":"Field","name":{"kind":"Name","value":"deviationAxis"},"selectionSet":{"kind":"SelectionSet","selections":[{"kind":"Field","name":{"kind":"Name","value":"minimum"}},{"kind":"Field","name":{"kind":"Name","value":"maximum"}},{"kind":"Field","name":{"kind":"Name","value":"ticks"}}]}},{"kind":"Field","name":{"kind":"Name","value":"curve"},"selectionSet":{"kind":"SelectionSet","selections":[{"kind":"Field","name":{"kind":"Name","value":"temperatures"}},{"kind":"Field","name":{"kind":"Name","value":"diffusivities"}},{"kind":"Field","name":{"kind":"Name","value":"relativeExpandedUncertainties"}},{"kind":"Field","name":{"kind":"Name","value":"relativeNewLaboratory"}},{"kind":"Field","name":{"kind":"Name","value":"firstInside"}},{"kind":"Field","name":{"kind":"Name","value":"lastInside"}}]}},{"kind":"Field","name":{"kind":"Name","value":"series"},"selectionSet":{"kind":"SelectionSet","selections":[{"kind":"Field","name":{"kind":"Name","value":"key"}},{"kind":"Field","name":{"kind":"Name","value":"mark"}},{"kind":"Field","name":{"kind":"Name","value":"title"}},{"kind":"Field","name":{"kind":"Name","value":"used"}},{"kind":"Field","name":{"kind":"Name","value":"temperatures"}},{"kind":"Field","name":{"kind":"Name","value":"reducedDiffusivities"}},{"kind":"Field","name":{"kind":"Name","value":"relativeUncertainties"}},{"kind":"Field","name":{"kind":"Name","value":"deviations"}},{"kind":"Field","name":{"kind":"Name","value":"leftOut"}}]}},{"kind":"Field","name":{"kind":"Name","value":"estimates"},"selectionSet":{"kind":"SelectionSet","selections":[{"kind":"Field","name":{"kind":"Name","value":"method"}},{"kind":"Field","name":{"kind":"Name","value":"temperatures"}},{"kind":"Field","name":{"kind":"Name","value":"deviations"}}]}},{"kind":"Field","name":{"kind":"Name","value":"diffusivityCaption"},"selectionSet":{"kind":"SelectionSet","selections":[{"kind":"FragmentSpread","name":{"kind":"Name","value":"Run"}}]}},{"kind":"Field","name":{"kind":"Name","value":"deviationCaption"},"selectionSet":{"kind":"SelectionSet","selections":[{"kind":"FragmentSpread","name":{"kind":"Name","value":"Run"}}]}}]}},{"kind":"FragmentDefinition","name":{"kind":"Name","value":"SheetSeriesRow"},"typeCondition":{"kind":"NamedType","name":{"kind":"Name","value":"SheetSeries"}},"selectionSet":{"kind":"SelectionSet","selections":[{"kind":"Field","name":{"kind":"Name","value":"key"}},{"kind":"Field","name":{"kind":"Name","value":"mark"}},{"kind":"Field","name":{"kind":"Name","value":"title"}},{"kind":"Field","name":{"kind":"Name","value":"source"}},{"kind":"Field","name":{"kind":"Name","value":"method"}},{"kind":"Field","name":{"kind":"Name","value":"pointCount"}},{"kind":"Field","name":{"kind":"Name","value":"weightedPointCount"}},{"kind":"Field","name":{"kind":"Name","value":"temperatureMinimum"}},{"kind":"Field","name":{"kind":"Name","value":"temperatureMaximum"}},{"kind":"Field","name":{"kind":"Name","value":"relativeUncertainty"}},{"kind":"Field","name":{"kind":"Name","value":"uncertaintyAssigned"}},{"kind":"Field","name":{"kind":"Name","value":"offset"}},{"kind":"Field","name":{"kind":"Name","value":"offsetStandardUncertainty"}},{"kind":"Field","name":{"kind":"Name","value":"reason"}}]}}]} as unknown as DocumentNode<SheetNumbersFragment, unknown>;
export const SheetPageFragmentDoc = {"kind":"Document","definitions":[{"kind":"FragmentDefinition","name":{"kind":"Name","value":"SheetPage"},"typeCondition":{"kind":"NamedType","name":{"kind":"Name","value":"DataSheetVersion"}},"selectionSet":{"kind":"SelectionSet","selections":[{"kind":"Field","name":{"kind":"Name","value":"id"}},{"kind":"Field","name":{"kind":"Name","value":"number"}},{"kind":"Field","name":{"kind":"Name","value":"status"}},{"kind":"Field","name":{"kind":"Name","value":"releasedAt"}},{"kind":"Field","name":{"kind":"Name","value":"withdrawnAt"}},{"kind":"Field","name":{"kind":"Name","value":"withdrawalReason"}},{"kind":"Field","name":{"kind":"Name","value":"contentHash"}},{"kind":"Field","name":{"kind":"Name","value":"doi"}},{"kind":"Field","name":{"kind":"Name","value":"supersededBy"},"selectionSet":{"kind":"SelectionSet","selections":[{"kind":"Field","name":{"kind":"Name","value":"id"}},{"kind":"Field","name":{"kind":"Name","value":"number"}},{"kind":"Field","name":{"kind":"Name","value":"releasedAt"}},{"kind":"Field","name":{"kind":"Name","value":"changeNote"}}]}},{"kind":"Field","name":{"kind":"Name","value":"fit"},"selectionSet":{"kind":"SelectionSet","selections":[{"kind":"Field","name":{"kind":"Name","value":"id"}},{"kind":"Field","name":{"kind":"Name","value":"statistics"},"selectionSet":{"kind":"SelectionSet","selections":[{"kind":"Field","name":{"kind":"Name","value":"betweenSeriesDeviation"}}]}}]}},{"kind":"Field","name":{"kind":"Name","value":"content"},"selectionSet":{"kind":"SelectionSet","selections":[{"kind":"FragmentSpread","name":{"kind":"Name","value":"SheetText"}},{"kind":"FragmentSpread","name":{"kind":"Name","value":"SheetNumbers"}}]}}]}},{"kind":"FragmentDefinition","name":{"kind":"Name","value":"Run"},"typeCondition":{"kind":"NamedType","name":{"kind":"Name","value":"TextRun"}},"selectionSet":{"kind":"SelectionSet","selections":[{"kind":"Field","name":{"kind":"Name","value":"text"}},{"kind":"Field","name":{"kind":"Name","value":"style"}}]}},{"kind":"FragmentDefinition","name":{"kind":"Name","value":"FiguresData"},"typeCondition":{"kind":"NamedType","name":{"kind":"Name","value":"SheetFigures"}},"selectionSet":{"kind":"SelectionSet","selections":[{"kind":"Field","name":{"kind":"Name","value":"pressure"}},{"kind":"Field","name":{"kind":"Name","value":"temperatureAxis"},"selectionSet":{"kind":"SelectionSet","selections":[{"kind":"Field","name":{"kind":"Name","value":"minimum"}},{"kind":"Field","name":{"kind":"Name","value":"maximum"}}]}},{"kind":"Field","name":{"kind":"Name","value":"diffusivityAxis"},"selectionSet":{"kind":"SelectionSet","selections":[{"kind":"Field","name":{"kind":"Name","value":"minimum"}},{"kind":"Field","name":{"kind":"Name","value":"maximum"}}]}},{"kind":"Field","name":{"kind":"Name","value":"deviationAxis"},"selectionSet":{"kind":"SelectionSet","selections":[{"kind":"Field","name":{"kind":"Name","value":"minimum"}},{"kind":"Field","name":{"kind":"Name","value":"maximum"}},{"kind":"Field","name":{"kind":"Name","value":"ticks"}}]}},{"kind":"Field","name":{"kind":"Name","value":"curve"},"selectionSet":{"kind":"SelectionSet","selections":[{"kind":"Field","name":{"kind":"Name","value":"temperatures"}},{"kind":"Field","name":{"kind":"Name","value":"diffusivities"}},{"kind":"Field","name":{"kind":"Name","value":"relativeExpandedUncertainties"}},{"kind":"Field","name":{"kind":"Name","value":"relativeNewLaboratory"}},{"kind":"Field","name":{"kind":"Name","value":"firstInside"}},{"kind":"Field","name":{"kind":"Name","value":"lastInside"}}]}},{"kind":"Field","name":{"kind":"Name","value":"series"},"selectionSet":{"kind":"SelectionSet","selections":[{"kind":"Field","name":{"kind":"Name","value":"key"}},{"kind":"Field","name":{"kind":"Name","value":"mark"}},{"kind":"Field","name":{"kind":"Name","value":"title"}},{"kind":"Field","name":{"kind":"Name","value":"used"}},{"kind":"Field","name":{"kind":"Name","value":"temperatures"}},{"kind":"Field","name":{"kind":"Name","value":"reducedDiffusivities"}},{"kind":"Field","name":{"kind":"Name","value":"relativeUncertainties"}},{"kind":"Field","name":{"kind":"Name","value":"deviations"}},{"kind":"Field","name":{"kind":"Name","value":"leftOut"}}]}},{"kind":"Field","name":{"kind":"Name","value":"estimates"},"selectionSet":{"kind":"SelectionSet","selections":[{"kind":"Field","name":{"kind":"Name","value":"method"}},{"kind":"Field","name":{"kind":"Name","value":"temperatures"}},{"kind":"Field","name":{"kind":"Name","value":"deviations"}}]}},{"kind":"Field","name":{"kind":"Name","value":"diffusivityCaption"},"selectionSet":{"kind":"SelectionSet","selections":[{"kind":"FragmentSpread","name":{"kind":"Name","value":"Run"}}]}},{"kind":"Field","name":{"kind":"Name","value":"deviationCaption"},"selectionSet":{"kind":"SelectionSet","selections":[{"kind":"FragmentSpread","name":{"kind":"Name","value":"Run"}}]}}]}},{"kind":"FragmentDefinition","name":{"kind":"Name","value":"SheetSeriesRow"},"typeCondition":{"kind":"NamedType","name":{"kind":"Name","value":"SheetSeries"}},"selectionSet":{"kind":"SelectionSet","selections":[{"kind":"Field","name":{"kind":"Name","value":"key"}},{"kind":"Field","name":{"kind":"Name","value":"mark"}},{"kind":"Field","name":{"kind":"Name","value":"title"}},{"kind":"Field","name":{"kind":"Name","value":"source"}},{"kind":"Field","name":{"kind":"Name","value":"method"}},{"kind":"Field","name":{"kind":"Name","value":"pointCount"}},{"kind":"Field","name":{"kind":"Name","value":"weightedPointCount"}},{"kind":"Field","name":{"kind":"Name","value":"temperatureMinimum"}},{"kind":"Field","name":{"kind":"Name","value":"temperatureMaximum"}},{"kind":"Field","name":{"kind":"Name","value":"relativeUncertainty"}},{"kind":"Field","name":{"kind":"Name","value":"uncertaintyAssigned"}},{"kind":"Field","name":{"kind":"Name","value":"offset"}},{"kind":"Field","name":{"kind":"Name","value":"offsetStandardUncertainty"}},{"kind":"Field","name":{"kind":"Name","value":"reason"}}]}},{"kind":"FragmentDefinition","name":{"kind":"Name","value":"SheetText"},"typeCondition":{"kind":"NamedType","name":{"kind":"Name","value":"SheetContent"}},"selectionSet":{"kind":"SelectionSet","selections":[{"kind":"Field","name":{"kind":"Name","value":"title"}},{"kind":"Field","name":{"kind":"Name","value":"lead"},"selectionSet":{"kind":"SelectionSet","selections":[{"kind":"FragmentSpread","name":{"kind":"Name","value":"Run"}}]}},{"kind":"Field","name":{"kind":"Name","value":"summary"}},{"kind":"Field","name":{"kind":"Name","value":"substances"},"selectionSet":{"kind":"SelectionSet","selections":[{"kind":"Field","name":{"kind":"Name","value":"name"}},{"kind":"Field","name":{"kind":"Name","value":"formula"},"selectionSet":{"kind":"SelectionSet","selections":[{"kind":"FragmentSpread","name":{"kind":"Name","value":"Run"}}]}},{"kind":"Field","name":{"kind":"Name","value":"casNumber"}},{"kind":"Field","name":{"kind":"Name","value":"molarMass"}}]}},{"kind":"Field","name":{"kind":"Name","value":"definition"},"selectionSet":{"kind":"SelectionSet","selections":[{"kind":"FragmentSpread","name":{"kind":"Name","value":"Run"}}]}},{"kind":"Field","name":{"kind":"Name","value":"uncertainty"},"selectionSet":{"kind":"SelectionSet","selections":[{"kind":"Field","name":{"kind":"Name","value":"statement"},"selectionSet":{"kind":"SelectionSet","selections":[{"kind":"FragmentSpread","name":{"kind":"Name","value":"Run"}}]}},{"kind":"Field","name":{"kind":"Name","value":"notIncluded"},"selectionSet":{"kind":"SelectionSet","selections":[{"kind":"FragmentSpread","name":{"kind":"Name","value":"Run"}}]}}]}},{"kind":"Field","name":{"kind":"Name","value":"cautions"},"selectionSet":{"kind":"SelectionSet","selections":[{"kind":"FragmentSpread","name":{"kind":"Name","value":"Run"}}]}},{"kind":"Field","name":{"kind":"Name","value":"citation"},"selectionSet":{"kind":"SelectionSet","selections":[{"kind":"Field","name":{"kind":"Name","value":"runs"},"selectionSet":{"kind":"SelectionSet","selections":[{"kind":"FragmentSpread","name":{"kind":"Name","value":"Run"}}]}},{"kind":"Field","name":{"kind":"Name","value":"plain"}},{"kind":"Field","name":{"kind":"Name","value":"doi"}}]}},{"kind":"Field","name":{"kind":"Name","value":"versions"},"selectionSet":{"kind":"SelectionSet","selections":[{"kind":"Field","name":{"kind":"Name","value":"number"}},{"kind":"Field","name":{"kind":"Name","value":"status"}},{"kind":"Field","name":{"kind":"Name","value":"word"}},{"kind":"Field","name":{"kind":"Name","value":"date"}},{"kind":"Field","name":{"kind":"Name","value":"datePrinted"}},{"kind":"Field","name":{"kind":"Name","value":"change"}},{"kind":"Field","name":{"kind":"Name","value":"isThis"}}]}},{"kind":"Field","name":{"kind":"Name","value":"sections"},"selectionSet":{"kind":"SelectionSet","selections":[{"kind":"Field","name":{"kind":"Name","value":"id"}},{"kind":"Field","name":{"kind":"Name","value":"number"}},{"kind":"Field","name":{"kind":"Name","value":"title"}}]}},{"kind":"Field","name":{"kind":"Name","value":"remarks"},"selectionSet":{"kind":"SelectionSet","selections":[{"kind":"Field","name":{"kind":"Name","value":"section"}},{"kind":"Field","name":{"kind":"Name","value":"text"}}]}},{"kind":"Field","name":{"kind":"Name","value":"margin"},"selectionSet":{"kind":"SelectionSet","selections":[{"kind":"Field","name":{"kind":"Name","value":"entries"},"selectionSet":{"kind":"SelectionSet","selections":[{"kind":"Field","name":{"kind":"Name","value":"label"},"selectionSet":{"kind":"SelectionSet","selections":[{"kind":"FragmentSpread","name":{"kind":"Name","value":"Run"}}]}},{"kind":"Field","name":{"kind":"Name","value":"value"}}]}},{"kind":"Field","name":{"kind":"Name","value":"fit"},"selectionSet":{"kind":"SelectionSet","selections":[{"kind":"FragmentSpread","name":{"kind":"Name","value":"Run"}}]}},{"kind":"Field","name":{"kind":"Name","value":"figures"},"selectionSet":{"kind":"SelectionSet","selections":[{"kind":"FragmentSpread","name":{"kind":"Name","value":"Run"}}]}},{"kind":"Field","name":{"kind":"Name","value":"series"},"selectionSet":{"kind":"SelectionSet","selections":[{"kind":"FragmentSpread","name":{"kind":"Name","value":"Run"}}]}}]}}]}},{"kind":"FragmentDefinition","name":{"kind":"Name","value":"SheetNumbers"},"typeCondition":{"kind":"NamedType","name":{"kind":"Name","value":"SheetContent"}},"selectionSet":{"kind":"SelectionSet","selections":[{"kind":"Field","name":{"kind":"Name","value":"correlation"},"selectionSet":{"kind":"SelectionSet","selections":[{"kind":"Field","name":{"kind":"Name","value":"form"}},{"kind":"Field","name":{"kind":"Name","value":"equation"},"selectionSet":{"kind":"SelectionSet","selections":[{"kind":"Field","name":{"kind":"Name","value":"runs"},"selectionSet":{"kind":"SelectionSet","selections":[{"kind":"FragmentSpread","name":{"kind":"Name","value":"Run"}}]}},{"kind":"Field","name":{"kind":"Name","value":"numerator"},"selectionSet":{"kind":"SelectionSet","selections":[{"kind":"FragmentSpread","name":{"kind":"Name","value":"Run"}}]}},{"kind":"Field","name":{"kind":"Name","value":"denominator"},"selectionSet":{"kind":"SelectionSet","selections":[{"kind":"FragmentSpread","name":{"kind":"Name","value":"Run"}}]}},{"kind":"Field","name":{"kind":"Name","value":"bracketed"}},{"kind":"Field","name":{"kind":"Name","value":"exponent"},"selectionSet":{"kind":"SelectionSet","selections":[{"kind":"FragmentSpread","name":{"kind":"Name","value":"Run"}}]}}]}},{"kind":"Field","name":{"kind":"Name","value":"spoken"}},{"kind":"Field","name":{"kind":"Name","value":"expression"}},{"kind":"Field","name":{"kind":"Name","value":"parameters"},"selectionSet":{"kind":"SelectionSet","selections":[{"kind":"Field","name":{"kind":"Name","value":"symbol"}},{"kind":"Field","name":{"kind":"Name","value":"label"},"selectionSet":{"kind":"SelectionSet","selections":[{"kind":"FragmentSpread","name":{"kind":"Name","value":"Run"}}]}},{"kind":"Field","name":{"kind":"Name","value":"value"}},{"kind":"Field","name":{"kind":"Name","value":"standardUncertainty"}},{"kind":"Field","name":{"kind":"Name","value":"unit"}},{"kind":"Field","name":{"kind":"Name","value":"printed"}},{"kind":"Field","name":{"kind":"Name","value":"note"}}]}},{"kind":"Field","name":{"kind":"Name","value":"coefficients"},"selectionSet":{"kind":"SelectionSet","selections":[{"kind":"Field","name":{"kind":"Name","value":"label"},"selectionSet":{"kind":"SelectionSet","selections":[{"kind":"FragmentSpread","name":{"kind":"Name","value":"Run"}}]}},{"kind":"Field","name":{"kind":"Name","value":"printed"}}]}},{"kind":"Field","name":{"kind":"Name","value":"coverageFactor"}}]}},{"kind":"Field","name":{"kind":"Name","value":"range"},"selectionSet":{"kind":"SelectionSet","selections":[{"kind":"Field","name":{"kind":"Name","value":"temperatureMinimum"}},{"kind":"Field","name":{"kind":"Name","value":"temperatureMaximum"}},{"kind":"Field","name":{"kind":"Name","value":"pressureMinimum"}},{"kind":"Field","name":{"kind":"Name","value":"pressureMaximum"}},{"kind":"Field","name":{"kind":"Name","value":"pressureBasis"}},{"kind":"Field","name":{"kind":"Name","value":"sentence"},"selectionSet":{"kind":"SelectionSet","selections":[{"kind":"FragmentSpread","name":{"kind":"Name","value":"Run"}}]}}]}},{"kind":"Field","name":{"kind":"Name","value":"figures"},"selectionSet":{"kind":"SelectionSet","selections":[{"kind":"FragmentSpread","name":{"kind":"Name","value":"FiguresData"}}]}},{"kind":"Field","name":{"kind":"Name","value":"recommended"},"selectionSet":{"kind":"SelectionSet","selections":[{"kind":"Field","name":{"kind":"Name","value":"pressure"}},{"kind":"Field","name":{"kind":"Name","value":"temperatures"}},{"kind":"Field","name":{"kind":"Name","value":"diffusivities"}},{"kind":"Field","name":{"kind":"Name","value":"standardUncertainties"}},{"kind":"Field","name":{"kind":"Name","value":"expandedUncertainties"}},{"kind":"Field","name":{"kind":"Name","value":"newLaboratoryHalfWidths"}},{"kind":"Field","name":{"kind":"Name","value":"referenceRow"}},{"kind":"Field","name":{"kind":"Name","value":"note"},"selectionSet":{"kind":"SelectionSet","selections":[{"kind":"FragmentSpread","name":{"kind":"Name","value":"Run"}}]}}]}},{"kind":"Field","name":{"kind":"Name","value":"seriesUsed"},"selectionSet":{"kind":"SelectionSet","selections":[{"kind":"FragmentSpread","name":{"kind":"Name","value":"SheetSeriesRow"}}]}},{"kind":"Field","name":{"kind":"Name","value":"seriesLeftOut"},"selectionSet":{"kind":"SelectionSet","selections":[{"kind":"FragmentSpread","name":{"kind":"Name","value":"SheetSeriesRow"}}]}},{"kind":"Field","name":{"kind":"Name","value":"pointsLeftOut"},"selectionSet":{"kind":"SelectionSet","selections":[{"kind":"Field","name":{"kind":"Name","value":"seriesKey"}},{"kind":"Field","name":{"kind":"Name","value":"temperature"}},{"kind":"Field","name":{"kind":"Name","value":"pressure"}},{"kind":"Field","name":{"kind":"Name","value":"diffusivity"}},{"kind":"Field","name":{"kind":"Name","value":"deviation"}},{"kind":"Field","name":{"kind":"Name","value":"reason"}}]}},{"kind":"Field","name":{"kind":"Name","value":"estimates"},"selectionSet":{"kind":"SelectionSet","selections":[{"kind":"Field","name":{"kind":"Name","value":"temperatures"}},{"kind":"Field","name":{"kind":"Name","value":"pressure"}},{"kind":"Field","name":{"kind":"Name","value":"methods"},"selectionSet":{"kind":"SelectionSet","selections":[{"kind":"Field","name":{"kind":"Name","value":"method"}},{"kind":"Field","name":{"kind":"Name","value":"diffusivities"}},{"kind":"Field","name":{"kind":"Name","value":"deviations"}},{"kind":"Field","name":{"kind":"Name","value":"usualMeanError"}},{"kind":"Field","name":{"kind":"Name","value":"source"}}]}},{"kind":"Field","name":{"kind":"Name","value":"note"},"selectionSet":{"kind":"SelectionSet","selections":[{"kind":"FragmentSpread","name":{"kind":"Name","value":"Run"}}]}}]}}]}}]} as unknown as DocumentNode<SheetPageFragment, unknown>;
export const SubstanceFieldsFragmentDoc = {"kind":"Document","definitions":[{"kind":"FragmentDefinition","name":{"kind":"Name","value":"SubstanceFields"},"typeCondition":{"kind":"NamedType","name":{"kind":"Name","value":"Substance"}},"selectionSet":{"kind":"SelectionSet","selections":[{"kind":"Field","name":{"kind":"Name","value":"id"}},{"kind":"Field","name":{"kind":"Name","value":"name"}},{"kind":"Field","name":{"kind":"Name","value":"formula"}},{"kind":"Field","name":{"kind":"Name","value":"casNumber"}},{"kind":"Field","name":{"kind":"Name","value":"molarMass"}},{"kind":"Field","name":{"kind":"Name","value":"synonyms"}},{"kind":"Field","name":{"kind":"Name","value":"inchi"}},{"kind":"Field","name":{"kind":"Name","value":"lockVersion"}},{"kind":"Field","name":{"kind":"Name","value":"composition"},"selectionSet":{"kind":"SelectionSet","selections":[{"kind":"Field","name":{"kind":"Name","value":"casNumber"}},{"kind":"Field","name":{"kind":"Name","value":"moleFraction"}}]}},{"kind":"Field","name":{"kind":"Name","value":"cautions"},"selectionSet":{"kind":"SelectionSet","selections":[{"kind":"Field","name":{"kind":"Name","value":"text"}},{"kind":"Field","name":{"kind":"Name","value":"source"}}]}},{"kind":"Field","name":{"kind":"Name","value":"constants"},"selectionSet":{"kind":"SelectionSet","selections":[{"kind":"Field","name":{"kind":"Name","value":"kind"}},{"kind":"Field","name":{"kind":"Name","value":"label"}},{"kind":"Field","name":{"kind":"Name","value":"symbol"}},{"kind":"Field","name":{"kind":"Name","value":"value"}},{"kind":"Field","name":{"kind":"Name","value":"form"}},{"kind":"Field","name":{"kind":"Name","value":"coefficients"},"selectionSet":{"kind":"SelectionSet","selections":[{"kind":"Field","name":{"kind":"Name","value":"symbol"}},{"kind":"Field","name":{"kind":"Name","value":"value"}}]}},{"kind":"Field","name":{"kind":"Name","value":"unit"}},{"kind":"Field","name":{"kind":"Name","value":"temperatureMinimum"}},{"kind":"Field","name":{"kind":"Name","value":"temperatureMaximum"}},{"kind":"Field","name":{"kind":"Name","value":"relativeUncertainty"}},{"kind":"Field","name":{"kind":"Name","value":"source"}},{"kind":"Field","name":{"kind":"Name","value":"note"}}]}}]}}]} as unknown as DocumentNode<SubstanceFieldsFragment, unknown>;
export const PeopleDocument = {"kind":"Document","definitions":[{"kind":"OperationDefinition","operation":"query","name":{"kind":"Name","value":"People"},"selectionSet":{"kind":"SelectionSet","selections":[{"kind":"Field","name":{"kind":"Name","value":"people"},"selectionSet":{"kind":"SelectionSet","selections":[{"kind":"FragmentSpread","name":{"kind":"Name","value":"AccountRow"}}]}}]}},{"kind":"FragmentDefinition","name":{"kind":"Name","value":"AccountRow"},"typeCondition":{"kind":"NamedType","name":{"kind":"Name","value":"Person"}},"selectionSet":{"kind":"SelectionSet","selections":[{"kind":"Field","name":{"kind":"Name","value":"id"}},{"kind":"Field","name":{"kind":"Name","value":"name"}},{"kind":"Field","name":{"kind":"Name","value":"email"}},{"kind":"Field","name":{"kind":"Name","value":"roles"}},{"kind":"Field","name":{"kind":"Name","value":"accountStatus"}},{"kind":"Field","name":{"kind":"Name","value":"lastSeenAt"}}]}}]} as unknown as DocumentNode<PeopleQuery, PeopleQueryVariables>;
export const InvitePersonDocument = {"kind":"Document","definitions":[{"kind":"OperationDefinition","operation":"mutation","name":{"kind":"Name","value":"InvitePerson"},"variableDefinitions":[{"kind":"VariableDefinition","variable":{"kind":"Variable","name":{"kind":"Name","value":"input"}},"type":{"kind":"NonNullType","type":{"kind":"NamedType","name":{"kind":"Name","value":"InvitePersonInput"}}}}],"selectionSet":{"kind":"SelectionSet","selections":[{"kind":"Field","name":{"kind":"Name","value":"invitePerson"},"arguments":[{"kind":"Argument","name":{"kind":"Name","value":"input"},"value":{"kind":"Variable","name":{"kind":"Name","value":"input"}}}],"selectionSet":{"kind":"SelectionSet","selections":[{"kind":"Field","name":{"kind":"Name","value":"person"},"selectionSet":{"kind":"SelectionSet","selections":[{"kind":"FragmentSpread","name":{"kind":"Name","value":"AccountRow"}}]}},{"kind":"Field","name":{"kind":"Name","value":"problems"},"selectionSet":{"kind":"SelectionSet","selections":[{"kind":"Field","name":{"kind":"Name","value":"message"}},{"kind":"Field","name":{"kind":"Name","value":"path"}}]}}]}}]}},{"kind":"FragmentDefinition","name":{"kind":"Name","value":"AccountRow"},"typeCondition":{"kind":"NamedType","name":{"kind":"Name","value":"Person"}},"selectionSet":{"kind":"SelectionSet","selections":[{"kind":"Field","name":{"kind":"Name","value":"id"}},{"kind":"Field","name":{"kind":"Name","value":"name"}},{"kind":"Field","name":{"kind":"Name","value":"email"}},{"kind":"Field","name":{"kind":"Name","value":"roles"}},{"kind":"Field","name":{"kind":"Name","value":"accountStatus"}},{"kind":"Field","name":{"kind":"Name","value":"lastSeenAt"}}]}}]} as unknown as DocumentNode<InvitePersonMutation, InvitePersonMutationVariables>;
export const UpdatePersonDocument = {"kind":"Document","definitions":[{"kind":"OperationDefinition","operation":"mutation","name":{"kind":"Name","value":"UpdatePerson"},"variableDefinitions":[{"kind":"VariableDefinition","variable":{"kind":"Variable","name":{"kind":"Name","value":"input"}},"type":{"kind":"NonNullType","type":{"kind":"NamedType","name":{"kind":"Name","value":"UpdatePersonInput"}}}}],"selectionSet":{"kind":"SelectionSet","selections":[{"kind":"Field","name":{"kind":"Name","value":"updatePerson"},"arguments":[{"kind":"Argument","name":{"kind":"Name","value":"input"},"value":{"kind":"Variable","name":{"kind":"Name","value":"input"}}}],"selectionSet":{"kind":"SelectionSet","selections":[{"kind":"Field","name":{"kind":"Name","value":"person"},"selectionSet":{"kind":"SelectionSet","selections":[{"kind":"FragmentSpread","name":{"kind":"Name","value":"AccountRow"}}]}},{"kind":"Field","name":{"kind":"Name","value":"problems"},"selectionSet":{"kind":"SelectionSet","selections":[{"kind":"Field","name":{"kind":"Name","value":"message"}},{"kind":"Field","name":{"kind":"Name","value":"path"}}]}}]}}]}},{"kind":"FragmentDefinition","name":{"kind":"Name","value":"AccountRow"},"typeCondition":{"kind":"NamedType","name":{"kind":"Name","value":"Person"}},"selectionSet":{"kind":"SelectionSet","selections":[{"kind":"Field","name":{"kind":"Name","value":"id"}},{"kind":"Field","name":{"kind":"Name","value":"name"}},{"kind":"Field","name":{"kind":"Name","value":"email"}},{"kind":"Field","name":{"kind":"Name","value":"roles"}},{"kind":"Field","name":{"kind":"Name","value":"accountStatus"}},{"kind":"Field","name":{"kind":"Name","value":"lastSeenAt"}}]}}]} as unknown as DocumentNode<UpdatePersonMutation, UpdatePersonMutationVariables>;
export const JobsDocument = {"kind":"Document","definitions":[{"kind":"OperationDefinition","operation":"query","name":{"kind":"Name","value":"Jobs"},"selectionSet":{"kind":"SelectionSet","selections":[{"kind":"Field","name":{"kind":"Name","value":"jobs"},"arguments":[{"kind":"Argument","name":{"kind":"Name","value":"failures"},"value":{"kind":"IntValue","value":"50"}}],"selectionSet":{"kind":"SelectionSet","selections":[{"kind":"Field","name":{"kind":"Name","value":"queues"},"selectionSet":{"kind":"SelectionSet","selections":[{"kind":"Field","name":{"kind":"Name","value":"queue"}},{"kind":"Field","name":{"kind":"Name","value":"waiting"}},{"kind":"Field","name":{"kind":"Name","value":"active"}},{"kind":"Field","name":{"kind":"Name","value":"completed"}},{"kind":"Field","name":{"kind":"Name","value":"failed"}}]}},{"kind":"Field","name":{"kind":"Name","value":"failures"},"selectionSet":{"kind":"SelectionSet","selections":[{"kind":"Field","name":{"kind":"Name","value":"id"}},{"kind":"Field","name":{"kind":"Name","value":"queue"}},{"kind":"Field","name":{"kind":"Name","value":"failedAt"}},{"kind":"Field","name":{"kind":"Name","value":"attempts"}},{"kind":"Field","name":{"kind":"Name","value":"reason"}}]}}]}}]}}]} as unknown as DocumentNode<JobsQuery, JobsQueryVariables>;
export const ApiKeysDocument = {"kind":"Document","definitions":[{"kind":"OperationDefinition","operation":"query","name":{"kind":"Name","value":"ApiKeys"},"selectionSet":{"kind":"SelectionSet","selections":[{"kind":"Field","name":{"kind":"Name","value":"apiKeys"},"selectionSet":{"kind":"SelectionSet","selections":[{"kind":"Field","name":{"kind":"Name","value":"id"}},{"kind":"Field","name":{"kind":"Name","value":"name"}},{"kind":"Field","name":{"kind":"Name","value":"prefix"}},{"kind":"Field","name":{"kind":"Name","value":"createdAt"}},{"kind":"Field","name":{"kind":"Name","value":"expiresAt"}},{"kind":"Field","name":{"kind":"Name","value":"lastUsedAt"}},{"kind":"Field","name":{"kind":"Name","value":"revokedAt"}}]}}]}}]} as unknown as DocumentNode<ApiKeysQuery, ApiKeysQueryVariables>;
export const CreateApiKeyDocument = {"kind":"Document","definitions":[{"kind":"OperationDefinition","operation":"mutation","name":{"kind":"Name","value":"CreateApiKey"},"variableDefinitions":[{"kind":"VariableDefinition","variable":{"kind":"Variable","name":{"kind":"Name","value":"name"}},"type":{"kind":"NonNullType","type":{"kind":"NamedType","name":{"kind":"Name","value":"String"}}}},{"kind":"VariableDefinition","variable":{"kind":"Variable","name":{"kind":"Name","value":"expiresInDays"}},"type":{"kind":"NamedType","name":{"kind":"Name","value":"Int"}}}],"selectionSet":{"kind":"SelectionSet","selections":[{"kind":"Field","name":{"kind":"Name","value":"createApiKey"},"arguments":[{"kind":"Argument","name":{"kind":"Name","value":"name"},"value":{"kind":"Variable","name":{"kind":"Name","value":"name"}}},{"kind":"Argument","name":{"kind":"Name","value":"expiresInDays"},"value":{"kind":"Variable","name":{"kind":"Name","value":"expiresInDays"}}}],"selectionSet":{"kind":"SelectionSet","selections":[{"kind":"Field","name":{"kind":"Name","value":"apiKey"},"selectionSet":{"kind":"SelectionSet","selections":[{"kind":"Field","name":{"kind":"Name","value":"id"}},{"kind":"Field","name":{"kind":"Name","value":"name"}},{"kind":"Field","name":{"kind":"Name","value":"prefix"}},{"kind":"Field","name":{"kind":"Name","value":"createdAt"}},{"kind":"Field","name":{"kind":"Name","value":"expiresAt"}},{"kind":"Field","name":{"kind":"Name","value":"lastUsedAt"}},{"kind":"Field","name":{"kind":"Name","value":"revokedAt"}}]}},{"kind":"Field","name":{"kind":"Name","value":"secret"}},{"kind":"Field","name":{"kind":"Name","value":"problems"},"selectionSet":{"kind":"SelectionSet","selections":[{"kind":"Field","name":{"kind":"Name","value":"code"}},{"kind":"Field","name":{"kind":"Name","value":"message"}},{"kind":"Field","name":{"kind":"Name","value":"path"}}]}}]}}]}}]} as unknown as DocumentNode<CreateApiKeyMutation, CreateApiKeyMutationVariables>;
export const RevokeApiKeyDocument = {"kind":"Document","definitions":[{"kind":"OperationDefinition","operation":"mutation","name":{"kind":"Name","value":"RevokeApiKey"},"variableDefinitions":[{"kind":"VariableDefinition","variable":{"kind":"Variable","name":{"kind":"Name","value":"id"}},"type":{"kind":"NonNullType","type":{"kind":"NamedType","name":{"kind":"Name","value":"ID"}}}}],"selectionSet":{"kind":"SelectionSet","selections":[{"kind":"Field","name":{"kind":"Name","value":"revokeApiKey"},"arguments":[{"kind":"Argument","name":{"kind":"Name","value":"id"},"value":{"kind":"Variable","name":{"kind":"Name","value":"id"}}}],"selectionSet":{"kind":"SelectionSet","selections":[{"kind":"Field","name":{"kind":"Name","value":"apiKey"},"selectionSet":{"kind":"SelectionSet","selections":[{"kind":"Field","name":{"kind":"Name","value":"id"}},{"kind":"Field","name":{"kind":"Name","value":"revokedAt"}}]}},{"kind":"Field","name":{"kind":"Name","value":"problems"},"selectionSet":{"kind":"SelectionSet","selections":[{"kind":"Field","name":{"kind":"Name","value":"code"}},{"kind":"Field","name":{"kind":"Name","value":"message"}},{"kind":"Field","name":{"kind":"Name","value":"path"}}]}}]}}]}}]} as unknown as DocumentNode<RevokeApiKeyMutation, RevokeApiKeyMutationVariables>;
export const SheetsToChooseDocument = {"kind":"Document","definitions":[{"kind":"OperationDefinition","operation":"query","name":{"kind":"Name","value":"SheetsToChoose"},"selectionSet":{"kind":"SelectionSet","selections":[{"kind":"Field","name":{"kind":"Name","value":"dataSheets"},"arguments":[{"kind":"Argument","name":{"kind":"Name","value":"first"},"value":{"kind":"IntValue","value":"50"}}],"selectionSet":{"kind":"SelectionSet","selections":[{"kind":"Field","name":{"kind":"Name","value":"edges"},"selectionSet":{"kind":"SelectionSet","selections":[{"kind":"Field","name":{"kind":"Name","value":"node"},"selectionSet":{"kind":"SelectionSet","selections":[{"kind":"Field","name":{"kind":"Name","value":"code"}},{"kind":"Field","name":{"kind":"Name","value":"pair"},"selectionSet":{"kind":"SelectionSet","selections":[{"kind":"Field","name":{"kind":"Name","value":"substances"},"selectionSet":{"kind":"SelectionSet","selections":[{"kind":"Field","name":{"kind":"Name","value":"name"}}]}}]}},{"kind":"Field","name":{"kind":"Name","value":"current"},"selectionSet":{"kind":"SelectionSet","selections":[{"kind":"Field","name":{"kind":"Name","value":"number"}}]}}]}}]}}]}}]}}]} as unknown as DocumentNode<SheetsToChooseQuery, SheetsToChooseQueryVariables>;
export const VersionsToChooseDocument = {"kind":"Document","definitions":[{"kind":"OperationDefinition","operation":"query","name":{"kind":"Name","value":"VersionsToChoose"},"variableDefinitions":[{"kind":"VariableDefinition","variable":{"kind":"Variable","name":{"kind":"Name","value":"code"}},"type":{"kind":"NonNullType","type":{"kind":"NamedType","name":{"kind":"Name","value":"String"}}}}],"selectionSet":{"kind":"SelectionSet","selections":[{"kind":"Field","name":{"kind":"Name","value":"dataSheet"},"arguments":[{"kind":"Argument","name":{"kind":"Name","value":"code"},"value":{"kind":"Variable","name":{"kind":"Name","value":"code"}}}],"selectionSet":{"kind":"SelectionSet","selections":[{"kind":"Field","name":{"kind":"Name","value":"id"}},{"kind":"Field","name":{"kind":"Name","value":"code"}},{"kind":"Field","name":{"kind":"Name","value":"versions"},"selectionSet":{"kind":"SelectionSet","selections":[{"kind":"Field","name":{"kind":"Name","value":"id"}},{"kind":"Field","name":{"kind":"Name","value":"number"}},{"kind":"Field","name":{"kind":"Name","value":"status"}},{"kind":"Field","name":{"kind":"Name","value":"correlation"},"selectionSet":{"kind":"SelectionSet","selections":[{"kind":"Field","name":{"kind":"Name","value":"validity"},"selectionSet":{"kind":"SelectionSet","selections":[{"kind":"Field","name":{"kind":"Name","value":"temperatureMinimum"}},{"kind":"Field","name":{"kind":"Name","value":"temperatureMaximum"}},{"kind":"Field","name":{"kind":"Name","value":"pressureMinimum"}},{"kind":"Field","name":{"kind":"Name","value":"pressureMaximum"}}]}}]}}]}}]}}]}}]} as unknown as DocumentNode<VersionsToChooseQuery, VersionsToChooseQueryVariables>;
export const ExampleAnswerDocument = {"kind":"Document","definitions":[{"kind":"OperationDefinition","operation":"query","name":{"kind":"Name","value":"ExampleAnswer"},"variableDefinitions":[{"kind":"VariableDefinition","variable":{"kind":"Variable","name":{"kind":"Name","value":"code"}},"type":{"kind":"NonNullType","type":{"kind":"NamedType","name":{"kind":"Name","value":"String"}}}},{"kind":"VariableDefinition","variable":{"kind":"Variable","name":{"kind":"Name","value":"number"}},"type":{"kind":"NonNullType","type":{"kind":"NamedType","name":{"kind":"Name","value":"String"}}}},{"kind":"VariableDefinition","variable":{"kind":"Variable","name":{"kind":"Name","value":"T"}},"type":{"kind":"NonNullType","type":{"kind":"NamedType","name":{"kind":"Name","value":"FloatColumn"}}}},{"kind":"VariableDefinition","variable":{"kind":"Variable","name":{"kind":"Name","value":"P"}},"type":{"kind":"NonNullType","type":{"kind":"NamedType","name":{"kind":"Name","value":"FloatColumn"}}}}],"selectionSet":{"kind":"SelectionSet","selections":[{"kind":"Field","name":{"kind":"Name","value":"dataSheet"},"arguments":[{"kind":"Argument","name":{"kind":"Name","value":"code"},"value":{"kind":"Variable","name":{"kind":"Name","value":"code"}}}],"selectionSet":{"kind":"SelectionSet","selections":[{"kind":"Field","name":{"kind":"Name","value":"version"},"arguments":[{"kind":"Argument","name":{"kind":"Name","value":"number"},"value":{"kind":"Variable","name":{"kind":"Name","value":"number"}}}],"selectionSet":{"kind":"SelectionSet","selections":[{"kind":"Field","name":{"kind":"Name","value":"status"}},{"kind":"Field","name":{"kind":"Name","value":"contentHash"}},{"kind":"Field","name":{"kind":"Name","value":"correlation"},"selectionSet":{"kind":"SelectionSet","selections":[{"kind":"Field","name":{"kind":"Name","value":"evaluate"},"arguments":[{"kind":"Argument","name":{"kind":"Name","value":"temperatures"},"value":{"kind":"Variable","name":{"kind":"Name","value":"T"}}},{"kind":"Argument","name":{"kind":"Name","value":"pressures"},"value":{"kind":"Variable","name":{"kind":"Name","value":"P"}}},{"kind":"Argument","name":{"kind":"Name","value":"outsideRange"},"value":{"kind":"EnumValue","value":"REFUSE"}}],"selectionSet":{"kind":"SelectionSet","selections":[{"kind":"Field","name":{"kind":"Name","value":"diffusivities"}},{"kind":"Field","name":{"kind":"Name","value":"expandedUncertainties"}},{"kind":"Field","name":{"kind":"Name","value":"coverageFactor"}}]}}]}}]}}]}}]}}]} as unknown as DocumentNode<ExampleAnswerQuery, ExampleAnswerQueryVariables>;
export const BringInSubstancesDocument = {"kind":"Document","definitions":[{"kind":"OperationDefinition","operation":"query","name":{"kind":"Name","value":"BringInSubstances"},"variableDefinitions":[{"kind":"VariableDefinition","variable":{"kind":"Variable","name":{"kind":"Name","value":"search"}},"type":{"kind":"NonNullType","type":{"kind":"NamedType","name":{"kind":"Name","value":"String"}}}}],"selectionSet":{"kind":"SelectionSet","selections":[{"kind":"Field","name":{"kind":"Name","value":"substances"},"arguments":[{"kind":"Argument","name":{"kind":"Name","value":"search"},"value":{"kind":"Variable","name":{"kind":"Name","value":"search"}}},{"kind":"Argument","name":{"kind":"Name","value":"first"},"value":{"kind":"IntValue","value":"8"}}],"selectionSet":{"kind":"SelectionSet","selections":[{"kind":"Field","name":{"kind":"Name","value":"edges"},"selectionSet":{"kind":"SelectionSet","selections":[{"kind":"Field","name":{"kind":"Name","value":"node"},"selectionSet":{"kind":"SelectionSet","selections":[{"kind":"Field","name":{"kind":"Name","value":"id"}},{"kind":"Field","name":{"kind":"Name","value":"name"}},{"kind":"Field","name":{"kind":"Name","value":"formula"}},{"kind":"Field","name":{"kind":"Name","value":"casNumber"}},{"kind":"Field","name":{"kind":"Name","value":"synonyms"}}]}}]}}]}}]}}]} as unknown as DocumentNode<BringInSubstancesQuery, BringInSubstancesQueryVariables>;
export const BringInPairDocument = {"kind":"Document","definitions":[{"kind":"OperationDefinition","operation":"query","name":{"kind":"Name","value":"BringInPair"},"variableDefinitions":[{"kind":"VariableDefinition","variable":{"kind":"Variable","name":{"kind":"Name","value":"id"}},"type":{"kind":"NonNullType","type":{"kind":"NamedType","name":{"kind":"Name","value":"ID"}}}}],"selectionSet":{"kind":"SelectionSet","selections":[{"kind":"Field","name":{"kind":"Name","value":"node"},"arguments":[{"kind":"Argument","name":{"kind":"Name","value":"id"},"value":{"kind":"Variable","name":{"kind":"Name","value":"id"}}}],"selectionSet":{"kind":"SelectionSet","selections":[{"kind":"Field","name":{"kind":"Name","value":"id"}},{"kind":"InlineFragment","typeCondition":{"kind":"NamedType","name":{"kind":"Name","value":"GasPair"}},"selectionSet":{"kind":"SelectionSet","selections":[{"kind":"Field","name":{"kind":"Name","value":"substances"},"selectionSet":{"kind":"SelectionSet","selections":[{"kind":"Field","name":{"kind":"Name","value":"id"}},{"kind":"Field","name":{"kind":"Name","value":"name"}}]}}]}}]}}]}}]} as unknown as DocumentNode<BringInPairQuery, BringInPairQueryVariables>;
export const BringInSeriesDocument = {"kind":"Document","definitions":[{"kind":"OperationDefinition","operation":"query","name":{"kind":"Name","value":"BringInSeries"},"variableDefinitions":[{"kind":"VariableDefinition","variable":{"kind":"Variable","name":{"kind":"Name","value":"a"}},"type":{"kind":"NonNullType","type":{"kind":"NamedType","name":{"kind":"Name","value":"SubstanceRef"}}}},{"kind":"VariableDefinition","variable":{"kind":"Variable","name":{"kind":"Name","value":"b"}},"type":{"kind":"NonNullType","type":{"kind":"NamedType","name":{"kind":"Name","value":"SubstanceRef"}}}}],"selectionSet":{"kind":"SelectionSet","selections":[{"kind":"Field","name":{"kind":"Name","value":"pair"},"arguments":[{"kind":"Argument","name":{"kind":"Name","value":"a"},"value":{"kind":"Variable","name":{"kind":"Name","value":"a"}}},{"kind":"Argument","name":{"kind":"Name","value":"b"},"value":{"kind":"Variable","name":{"kind":"Name","value":"b"}}}],"selectionSet":{"kind":"SelectionSet","selections":[{"kind":"Field","name":{"kind":"Name","value":"id"}},{"kind":"Field","name":{"kind":"Name","value":"series"},"arguments":[{"kind":"Argument","name":{"kind":"Name","value":"first"},"value":{"kind":"IntValue","value":"100"}}],"selectionSet":{"kind":"SelectionSet","selections":[{"kind":"Field","name":{"kind":"Name","value":"edges"},"selectionSet":{"kind":"SelectionSet","selections":[{"kind":"Field","name":{"kind":"Name","value":"node"},"selectionSet":{"kind":"SelectionSet","selections":[{"kind":"Field","name":{"kind":"Name","value":"id"}},{"kind":"Field","name":{"kind":"Name","value":"title"}},{"kind":"Field","name":{"kind":"Name","value":"status"}}]}}]}}]}}]}}]}}]} as unknown as DocumentNode<BringInSeriesQuery, BringInSeriesQueryVariables>;
export const CatalogueDocument = {"kind":"Document","definitions":[{"kind":"OperationDefinition","operation":"query","name":{"kind":"Name","value":"Catalogue"},"variableDefinitions":[{"kind":"VariableDefinition","variable":{"kind":"Variable","name":{"kind":"Name","value":"search"}},"type":{"kind":"NamedType","name":{"kind":"Name","value":"String"}}},{"kind":"VariableDefinition","variable":{"kind":"Variable","name":{"kind":"Name","value":"after"}},"type":{"kind":"NamedType","name":{"kind":"Name","value":"String"}}}],"selectionSet":{"kind":"SelectionSet","selections":[{"kind":"Field","name":{"kind":"Name","value":"dataSheets"},"arguments":[{"kind":"Argument","name":{"kind":"Name","value":"search"},"value":{"kind":"Variable","name":{"kind":"Name","value":"search"}}},{"kind":"Argument","name":{"kind":"Name","value":"first"},"value":{"kind":"IntValue","value":"15"}},{"kind":"Argument","name":{"kind":"Name","value":"after"},"value":{"kind":"Variable","name":{"kind":"Name","value":"after"}}}],"selectionSet":{"kind":"SelectionSet","selections":[{"kind":"Field","name":{"kind":"Name","value":"pageInfo"},"selectionSet":{"kind":"SelectionSet","selections":[{"kind":"Field","name":{"kind":"Name","value":"hasNextPage"}},{"kind":"Field","name":{"kind":"Name","value":"endCursor"}}]}},{"kind":"Field","name":{"kind":"Name","value":"edges"},"selectionSet":{"kind":"SelectionSet","selections":[{"kind":"Field","name":{"kind":"Name","value":"node"},"selectionSet":{"kind":"SelectionSet","selections":[{"kind":"Field","name":{"kind":"Name","value":"id"}},{"kind":"Field","name":{"kind":"Name","value":"code"}},{"kind":"Field","name":{"kind":"Name","value":"pair"},"selectionSet":{"kind":"SelectionSet","selections":[{"kind":"Field","name":{"kind":"Name","value":"substances"},"selectionSet":{"kind":"SelectionSet","selections":[{"kind":"Field","name":{"kind":"Name","value":"name"}},{"kind":"Field","name":{"kind":"Name","value":"formula"}}]}}]}},{"kind":"Field","name":{"kind":"Name","value":"current"},"selectionSet":{"kind":"SelectionSet","selections":[{"kind":"Field","name":{"kind":"Name","value":"number"}},{"kind":"Field","name":{"kind":"Name","value":"releasedAt"}},{"kind":"Field","name":{"kind":"Name","value":"correlation"},"selectionSet":{"kind":"SelectionSet","selections":[{"kind":"Field","name":{"kind":"Name","value":"parameters"},"selectionSet":{"kind":"SelectionSet","selections":[{"kind":"Field","name":{"kind":"Name","value":"symbol"}},{"kind":"Field","name":{"kind":"Name","value":"value"}},{"kind":"Field","name":{"kind":"Name","value":"standardUncertainty"}}]}},{"kind":"Field","name":{"kind":"Name","value":"validity"},"selectionSet":{"kind":"SelectionSet","selections":[{"kind":"Field","name":{"kind":"Name","value":"temperatureMinimum"}},{"kind":"Field","name":{"kind":"Name","value":"temperatureMaximum"}},{"kind":"Field","name":{"kind":"Name","value":"pressureMinimum"}},{"kind":"Field","name":{"kind":"Name","value":"pressureMaximum"}}]}},{"kind":"Field","name":{"kind":"Name","value":"evaluate"},"arguments":[{"kind":"Argument","name":{"kind":"Name","value":"temperatures"},"value":{"kind":"ListValue","values":[{"kind":"FloatValue","value":"298.15"}]}},{"kind":"Argument","name":{"kind":"Name","value":"pressures"},"value":{"kind":"ListValue","values":[{"kind":"IntValue","value":"101325"}]}}],"selectionSet":{"kind":"SelectionSet","selections":[{"kind":"Field","name":{"kind":"Name","value":"diffusivities"}},{"kind":"Field","name":{"kind":"Name","value":"expandedUncertainties"}},{"kind":"Field","name":{"kind":"Name","value":"outside"}}]}}]}}]}}]}}]}}]}}]}}]} as unknown as DocumentNode<CatalogueQuery, CatalogueQueryVariables>;
export const CatalogueNewsDocument = {"kind":"Document","definitions":[{"kind":"OperationDefinition","operation":"query","name":{"kind":"Name","value":"CatalogueNews"},"selectionSet":{"kind":"SelectionSet","selections":[{"kind":"Field","name":{"kind":"Name","value":"latestReleases"},"arguments":[{"kind":"Argument","name":{"kind":"Name","value":"first"},"value":{"kind":"IntValue","value":"3"}}],"selectionSet":{"kind":"SelectionSet","selections":[{"kind":"FragmentSpread","name":{"kind":"Name","value":"NewsVersion"}},{"kind":"Field","name":{"kind":"Name","value":"releasedAt"}},{"kind":"Field","name":{"kind":"Name","value":"changeNote"}},{"kind":"Field","name":{"kind":"Name","value":"summary"}}]}},{"kind":"Field","name":{"kind":"Name","value":"latestWithdrawals"},"arguments":[{"kind":"Argument","name":{"kind":"Name","value":"first"},"value":{"kind":"IntValue","value":"2"}}],"selectionSet":{"kind":"SelectionSet","selections":[{"kind":"FragmentSpread","name":{"kind":"Name","value":"NewsVersion"}},{"kind":"Field","name":{"kind":"Name","value":"withdrawnAt"}},{"kind":"Field","name":{"kind":"Name","value":"withdrawalReason"}}]}}]}},{"kind":"FragmentDefinition","name":{"kind":"Name","value":"NewsVersion"},"typeCondition":{"kind":"NamedType","name":{"kind":"Name","value":"DataSheetVersion"}},"selectionSet":{"kind":"SelectionSet","selections":[{"kind":"Field","name":{"kind":"Name","value":"id"}},{"kind":"Field","name":{"kind":"Name","value":"number"}},{"kind":"Field","name":{"kind":"Name","value":"status"}},{"kind":"Field","name":{"kind":"Name","value":"sheet"},"selectionSet":{"kind":"SelectionSet","selections":[{"kind":"Field","name":{"kind":"Name","value":"id"}},{"kind":"Field","name":{"kind":"Name","value":"code"}},{"kind":"Field","name":{"kind":"Name","value":"pair"},"selectionSet":{"kind":"SelectionSet","selections":[{"kind":"Field","name":{"kind":"Name","value":"id"}},{"kind":"Field","name":{"kind":"Name","value":"substances"},"selectionSet":{"kind":"SelectionSet","selections":[{"kind":"Field","name":{"kind":"Name","value":"id"}},{"kind":"Field","name":{"kind":"Name","value":"name"}}]}}]}}]}}]}}]} as unknown as DocumentNode<CatalogueNewsQuery, CatalogueNewsQueryVariables>;
export const CompareFitsDocument = {"kind":"Document","definitions":[{"kind":"OperationDefinition","operation":"query","name":{"kind":"Name","value":"CompareFits"},"variableDefinitions":[{"kind":"VariableDefinition","variable":{"kind":"Variable","name":{"kind":"Name","value":"first"}},"type":{"kind":"NonNullType","type":{"kind":"NamedType","name":{"kind":"Name","value":"ID"}}}},{"kind":"VariableDefinition","variable":{"kind":"Variable","name":{"kind":"Name","value":"second"}},"type":{"kind":"NonNullType","type":{"kind":"NamedType","name":{"kind":"Name","value":"ID"}}}},{"kind":"VariableDefinition","variable":{"kind":"Variable","name":{"kind":"Name","value":"third"}},"type":{"kind":"NonNullType","type":{"kind":"NamedType","name":{"kind":"Name","value":"ID"}}}},{"kind":"VariableDefinition","variable":{"kind":"Variable","name":{"kind":"Name","value":"fourth"}},"type":{"kind":"NonNullType","type":{"kind":"NamedType","name":{"kind":"Name","value":"ID"}}}},{"kind":"VariableDefinition","variable":{"kind":"Variable","name":{"kind":"Name","value":"hasThird"}},"type":{"kind":"NonNullType","type":{"kind":"NamedType","name":{"kind":"Name","value":"Boolean"}}}},{"kind":"VariableDefinition","variable":{"kind":"Variable","name":{"kind":"Name","value":"hasFourth"}},"type":{"kind":"NonNullType","type":{"kind":"NamedType","name":{"kind":"Name","value":"Boolean"}}}},{"kind":"VariableDefinition","variable":{"kind":"Variable","name":{"kind":"Name","value":"temperatures"}},"type":{"kind":"NonNullType","type":{"kind":"NamedType","name":{"kind":"Name","value":"FloatColumn"}}}},{"kind":"VariableDefinition","variable":{"kind":"Variable","name":{"kind":"Name","value":"pressure"}},"type":{"kind":"NonNullType","type":{"kind":"NamedType","name":{"kind":"Name","value":"FloatColumn"}}}}],"selectionSet":{"kind":"SelectionSet","selections":[{"kind":"Field","alias":{"kind":"Name","value":"first"},"name":{"kind":"Name","value":"fit"},"arguments":[{"kind":"Argument","name":{"kind":"Name","value":"id"},"value":{"kind":"Variable","name":{"kind":"Name","value":"first"}}}],"selectionSet":{"kind":"SelectionSet","selections":[{"kind":"FragmentSpread","name":{"kind":"Name","value":"ComparedFit"}}]}},{"kind":"Field","alias":{"kind":"Name","value":"second"},"name":{"kind":"Name","value":"fit"},"arguments":[{"kind":"Argument","name":{"kind":"Name","value":"id"},"value":{"kind":"Variable","name":{"kind":"Name","value":"second"}}}],"selectionSet":{"kind":"SelectionSet","selections":[{"kind":"FragmentSpread","name":{"kind":"Name","value":"ComparedFit"}}]}},{"kind":"Field","alias":{"kind":"Name","value":"third"},"name":{"kind":"Name","value":"fit"},"arguments":[{"kind":"Argument","name":{"kind":"Name","value":"id"},"value":{"kind":"Variable","name":{"kind":"Name","value":"third"}}}],"directives":[{"kind":"Directive","name":{"kind":"Name","value":"include"},"arguments":[{"kind":"Argument","name":{"kind":"Name","value":"if"},"value":{"kind":"Variable","name":{"kind":"Name","value":"hasThird"}}}]}],"selectionSet":{"kind":"SelectionSet","selections":[{"kind":"FragmentSpread","name":{"kind":"Name","value":"ComparedFit"}}]}},{"kind":"Field","alias":{"kind":"Name","value":"fourth"},"name":{"kind":"Name","value":"fit"},"arguments":[{"kind":"Argument","name":{"kind":"Name","value":"id"},"value":{"kind":"Variable","name":{"kind":"Name","value":"fourth"}}}],"directives":[{"kind":"Directive","name":{"kind":"Name","value":"include"},"arguments":[{"kind":"Argument","name":{"kind":"Name","value":"if"},"value":{"kind":"Variable","name":{"kind":"Name","value":"hasFourth"}}}]}],"selectionSet":{"kind":"SelectionSet","selections":[{"kind":"FragmentSpread","name":{"kind":"Name","value":"ComparedFit"}}]}}]}},{"kind":"FragmentDefinition","name":{"kind":"Name","value":"ComparedFit"},"typeCondition":{"kind":"NamedType","name":{"kind":"Name","value":"Fit"}},"selectionSet":{"kind":"SelectionSet","selections":[{"kind":"Field","name":{"kind":"Name","value":"id"}},{"kind":"Field","name":{"kind":"Name","value":"number"}},{"kind":"Field","name":{"kind":"Name","value":"correlation"},"selectionSet":{"kind":"SelectionSet","selections":[{"kind":"Field","name":{"kind":"Name","value":"evaluate"},"arguments":[{"kind":"Argument","name":{"kind":"Name","value":"temperatures"},"value":{"kind":"Variable","name":{"kind":"Name","value":"temperatures"}}},{"kind":"Argument","name":{"kind":"Name","value":"pressures"},"value":{"kind":"Variable","name":{"kind":"Name","value":"pressure"}}}],"selectionSet":{"kind":"SelectionSet","selections":[{"kind":"Field","name":{"kind":"Name","value":"diffusivities"}},{"kind":"Field","name":{"kind":"Name","value":"standardUncertainties"}},{"kind":"Field","name":{"kind":"Name","value":"expandedUncertainties"}}]}}]}}]}}]} as unknown as DocumentNode<CompareFitsQuery, CompareFitsQueryVariables>;
export const FitsToCompareDocument = {"kind":"Document","definitions":[{"kind":"OperationDefinition","operation":"query","name":{"kind":"Name","value":"FitsToCompare"},"variableDefinitions":[{"kind":"VariableDefinition","variable":{"kind":"Variable","name":{"kind":"Name","value":"id"}},"type":{"kind":"NonNullType","type":{"kind":"NamedType","name":{"kind":"Name","value":"ID"}}}}],"selectionSet":{"kind":"SelectionSet","selections":[{"kind":"Field","name":{"kind":"Name","value":"fit"},"arguments":[{"kind":"Argument","name":{"kind":"Name","value":"id"},"value":{"kind":"Variable","name":{"kind":"Name","value":"id"}}}],"selectionSet":{"kind":"SelectionSet","selections":[{"kind":"Field","name":{"kind":"Name","value":"id"}},{"kind":"Field","name":{"kind":"Name","value":"pair"},"selectionSet":{"kind":"SelectionSet","selections":[{"kind":"Field","name":{"kind":"Name","value":"id"}},{"kind":"Field","name":{"kind":"Name","value":"substances"},"selectionSet":{"kind":"SelectionSet","selections":[{"kind":"Field","name":{"kind":"Name","value":"id"}},{"kind":"Field","name":{"kind":"Name","value":"name"}}]}},{"kind":"Field","name":{"kind":"Name","value":"fits"},"selectionSet":{"kind":"SelectionSet","selections":[{"kind":"FragmentSpread","name":{"kind":"Name","value":"KeptFit"}}]}}]}}]}}]}},{"kind":"FragmentDefinition","name":{"kind":"Name","value":"StatisticsNumbers"},"typeCondition":{"kind":"NamedType","name":{"kind":"Name","value":"FitStatistics"}},"selectionSet":{"kind":"SelectionSet","selections":[{"kind":"Field","name":{"kind":"Name","value":"pointCount"}},{"kind":"Field","name":{"kind":"Name","value":"seriesCount"}},{"kind":"Field","name":{"kind":"Name","value":"residualDegreesOfFreedom"}},{"kind":"Field","name":{"kind":"Name","value":"chiSquare"}},{"kind":"Field","name":{"kind":"Name","value":"reducedChiSquare"}},{"kind":"Field","name":{"kind":"Name","value":"chiSquareProbability"}},{"kind":"Field","name":{"kind":"Name","value":"residualStandardError"}},{"kind":"Field","name":{"kind":"Name","value":"aicc"}},{"kind":"Field","name":{"kind":"Name","value":"betweenSeriesDeviation"}},{"kind":"Field","name":{"kind":"Name","value":"betweenSeriesOrigin"}},{"kind":"Field","name":{"kind":"Name","value":"cochranQ"}},{"kind":"Field","name":{"kind":"Name","value":"iSquared"}}]}},{"kind":"FragmentDefinition","name":{"kind":"Name","value":"CorrelationNumbers"},"typeCondition":{"kind":"NamedType","name":{"kind":"Name","value":"Correlation"}},"selectionSet":{"kind":"SelectionSet","selections":[{"kind":"Field","name":{"kind":"Name","value":"form"}},{"kind":"Field","name":{"kind":"Name","value":"expression"}},{"kind":"Field","name":{"kind":"Name","value":"referenceTemperature"}},{"kind":"Field","name":{"kind":"Name","value":"referencePressure"}},{"kind":"Field","name":{"kind":"Name","value":"degreesOfFreedom"}},{"kind":"Field","name":{"kind":"Name","value":"parameters"},"selectionSet":{"kind":"SelectionSet","selections":[{"kind":"Field","name":{"kind":"Name","value":"symbol"}},{"kind":"Field","name":{"kind":"Name","value":"value"}},{"kind":"Field","name":{"kind":"Name","value":"standardUncertainty"}},{"kind":"Field","name":{"kind":"Name","value":"unit"}}]}},{"kind":"Field","name":{"kind":"Name","value":"validity"},"selectionSet":{"kind":"SelectionSet","selections":[{"kind":"Field","name":{"kind":"Name","value":"temperatureMinimum"}},{"kind":"Field","name":{"kind":"Name","value":"temperatureMaximum"}},{"kind":"Field","name":{"kind":"Name","value":"pressureMinimum"}},{"kind":"Field","name":{"kind":"Name","value":"pressureMaximum"}},{"kind":"Field","name":{"kind":"Name","value":"pressureBasis"}}]}}]}},{"kind":"FragmentDefinition","name":{"kind":"Name","value":"KeptFit"},"typeCondition":{"kind":"NamedType","name":{"kind":"Name","value":"Fit"}},"selectionSet":{"kind":"SelectionSet","selections":[{"kind":"Field","name":{"kind":"Name","value":"id"}},{"kind":"Field","name":{"kind":"Name","value":"number"}},{"kind":"Field","name":{"kind":"Name","value":"createdAt"}},{"kind":"Field","name":{"kind":"Name","value":"createdBy"},"selectionSet":{"kind":"SelectionSet","selections":[{"kind":"Field","name":{"kind":"Name","value":"id"}},{"kind":"Field","name":{"kind":"Name","value":"name"}}]}},{"kind":"Field","name":{"kind":"Name","value":"objective"}},{"kind":"Field","name":{"kind":"Name","value":"weighting"}},{"kind":"Field","name":{"kind":"Name","value":"loss"}},{"kind":"Field","name":{"kind":"Name","value":"seriesEffect"}},{"kind":"Field","name":{"kind":"Name","value":"series"},"selectionSet":{"kind":"SelectionSet","selections":[{"kind":"Field","name":{"kind":"Name","value":"id"}}]}},{"kind":"Field","name":{"kind":"Name","value":"leftOutSeries"},"selectionSet":{"kind":"SelectionSet","selections":[{"kind":"Field","name":{"kind":"Name","value":"reason"}},{"kind":"Field","name":{"kind":"Name","value":"series"},"selectionSet":{"kind":"SelectionSet","selections":[{"kind":"Field","name":{"kind":"Name","value":"id"}}]}}]}},{"kind":"Field","name":{"kind":"Name","value":"excludedPoints"},"selectionSet":{"kind":"SelectionSet","selections":[{"kind":"Field","name":{"kind":"Name","value":"reason"}},{"kind":"Field","name":{"kind":"Name","value":"point"},"selectionSet":{"kind":"SelectionSet","selections":[{"kind":"Field","name":{"kind":"Name","value":"id"}}]}}]}},{"kind":"Field","name":{"kind":"Name","value":"statistics"},"selectionSet":{"kind":"SelectionSet","selections":[{"kind":"FragmentSpread","name":{"kind":"Name","value":"StatisticsNumbers"}}]}},{"kind":"Field","name":{"kind":"Name","value":"correlation"},"selectionSet":{"kind":"SelectionSet","selections":[{"kind":"FragmentSpread","name":{"kind":"Name","value":"CorrelationNumbers"}}]}}]}}]} as unknown as DocumentNode<FitsToCompareQuery, FitsToCompareQueryVariables>;
export const FitDetailDocument = {"kind":"Document","definitions":[{"kind":"OperationDefinition","operation":"query","name":{"kind":"Name","value":"FitDetail"},"variableDefinitions":[{"kind":"VariableDefinition","variable":{"kind":"Variable","name":{"kind":"Name","value":"id"}},"type":{"kind":"NonNullType","type":{"kind":"NamedType","name":{"kind":"Name","value":"ID"}}}}],"selectionSet":{"kind":"SelectionSet","selections":[{"kind":"Field","name":{"kind":"Name","value":"fit"},"arguments":[{"kind":"Argument","name":{"kind":"Name","value":"id"},"value":{"kind":"Variable","name":{"kind":"Name","value":"id"}}}],"selectionSet":{"kind":"SelectionSet","selections":[{"kind":"FragmentSpread","name":{"kind":"Name","value":"KeptFit"}},{"kind":"Field","name":{"kind":"Name","value":"engineVersion"}},{"kind":"Field","name":{"kind":"Name","value":"pair"},"selectionSet":{"kind":"SelectionSet","selections":[{"kind":"Field","name":{"kind":"Name","value":"id"}},{"kind":"Field","name":{"kind":"Name","value":"substances"},"selectionSet":{"kind":"SelectionSet","selections":[{"kind":"Field","name":{"kind":"Name","value":"id"}},{"kind":"Field","name":{"kind":"Name","value":"name"}}]}},{"kind":"Field","name":{"kind":"Name","value":"dataSheet"},"selectionSet":{"kind":"SelectionSet","selections":[{"kind":"Field","name":{"kind":"Name","value":"id"}},{"kind":"Field","name":{"kind":"Name","value":"code"}},{"kind":"Field","name":{"kind":"Name","value":"versions"},"selectionSet":{"kind":"SelectionSet","selections":[{"kind":"Field","name":{"kind":"Name","value":"id"}},{"kind":"Field","name":{"kind":"Name","value":"number"}},{"kind":"Field","name":{"kind":"Name","value":"status"}},{"kind":"Field","name":{"kind":"Name","value":"fit"},"selectionSet":{"kind":"SelectionSet","selections":[{"kind":"Field","name":{"kind":"Name","value":"id"}}]}}]}}]}},{"kind":"Field","name":{"kind":"Name","value":"series"},"arguments":[{"kind":"Argument","name":{"kind":"Name","value":"first"},"value":{"kind":"IntValue","value":"100"}}],"selectionSet":{"kind":"SelectionSet","selections":[{"kind":"Field","name":{"kind":"Name","value":"edges"},"selectionSet":{"kind":"SelectionSet","selections":[{"kind":"Field","name":{"kind":"Name","value":"node"},"selectionSet":{"kind":"SelectionSet","selections":[{"kind":"FragmentSpread","name":{"kind":"Name","value":"FitSeries"}}]}}]}}]}}]}},{"kind":"Field","name":{"kind":"Name","value":"analysis"},"selectionSet":{"kind":"SelectionSet","selections":[{"kind":"FragmentSpread","name":{"kind":"Name","value":"AnalysisNumbers"}},{"kind":"Field","name":{"kind":"Name","value":"correlation"},"selectionSet":{"kind":"SelectionSet","selections":[{"kind":"FragmentSpread","name":{"kind":"Name","value":"CorrelationNumbers"}},{"kind":"Field","alias":{"kind":"Name","value":"coverage"},"name":{"kind":"Name","value":"evaluate"},"arguments":[{"kind":"Argument","name":{"kind":"Name","value":"temperatures"},"value":{"kind":"ListValue","values":[{"kind":"FloatValue","value":"298.15"}]}},{"kind":"Argument","name":{"kind":"Name","value":"pressures"},"value":{"kind":"ListValue","values":[{"kind":"IntValue","value":"101325"}]}}],"selectionSet":{"kind":"SelectionSet","selections":[{"kind":"Field","name":{"kind":"Name","value":"coverageFactor"}}]}}]}}]}}]}}]}},{"kind":"FragmentDefinition","name":{"kind":"Name","value":"StatisticsNumbers"},"typeCondition":{"kind":"NamedType","name":{"kind":"Name","value":"FitStatistics"}},"selectionSet":{"kind":"SelectionSet","selections":[{"kind":"Field","name":{"kind":"Name","value":"pointCount"}},{"kind":"Field","name":{"kind":"Name","value":"seriesCount"}},{"kind":"Field","name":{"kind":"Name","value":"residualDegreesOfFreedom"}},{"kind":"Field","name":{"kind":"Name","value":"chiSquare"}},{"kind":"Field","name":{"kind":"Name","value":"reducedChiSquare"}},{"kind":"Field","name":{"kind":"Name","value":"chiSquareProbability"}},{"kind":"Field","name":{"kind":"Name","value":"residualStandardError"}},{"kind":"Field","name":{"kind":"Name","value":"aicc"}},{"kind":"Field","name":{"kind":"Name","value":"betweenSeriesDeviation"}},{"kind":"Field","name":{"kind":"Name","value":"betweenSeriesOrigin"}},{"kind":"Field","name":{"kind":"Name","value":"cochranQ"}},{"kind":"Field","name":{"kind":"Name","value":"iSquared"}}]}},{"kind":"FragmentDefinition","name":{"kind":"Name","value":"CorrelationNumbers"},"typeCondition":{"kind":"NamedType","name":{"kind":"Name","value":"Correlation"}},"selectionSet":{"kind":"SelectionSet","selections":[{"kind":"Field","name":{"kind":"Name","value":"form"}},{"kind":"Field","name":{"kind":"Name","value":"expression"}},{"kind":"Field","name":{"kind":"Name","value":"referenceTemperature"}},{"kind":"Field","name":{"kind":"Name","value":"referencePressure"}},{"kind":"Field","name":{"kind":"Name","value":"degreesOfFreedom"}},{"kind":"Field","name":{"kind":"Name","value":"parameters"},"selectionSet":{"kind":"SelectionSet","selections":[{"kind":"Field","name":{"kind":"Name","value":"symbol"}},{"kind":"Field","name":{"kind":"Name","value":"value"}},{"kind":"Field","name":{"kind":"Name","value":"standardUncertainty"}},{"kind":"Field","name":{"kind":"Name","value":"unit"}}]}},{"kind":"Field","name":{"kind":"Name","value":"validity"},"selectionSet":{"kind":"SelectionSet","selections":[{"kind":"Field","name":{"kind":"Name","value":"temperatureMinimum"}},{"kind":"Field","name":{"kind":"Name","value":"temperatureMaximum"}},{"kind":"Field","name":{"kind":"Name","value":"pressureMinimum"}},{"kind":"Field","name":{"kind":"Name","value":"pressureMaximum"}},{"kind":"Field","name":{"kind":"Name","value":"pressureBasis"}}]}}]}},{"kind":"FragmentDefinition","name":{"kind":"Name","value":"KeptFit"},"typeCondition":{"kind":"NamedType","name":{"kind":"Name","value":"Fit"}},"selectionSet":{"kind":"SelectionSet","selections":[{"kind":"Field","name":{"kind":"Name","value":"id"}},{"kind":"Field","name":{"kind":"Name","value":"number"}},{"kind":"Field","name":{"kind":"Name","value":"createdAt"}},{"kind":"Field","name":{"kind":"Name","value":"createdBy"},"selectionSet":{"kind":"SelectionSet","selections":[{"kind":"Field","name":{"kind":"Name","value":"id"}},{"kind":"Field","name":{"kind":"Name","value":"name"}}]}},{"kind":"Field","name":{"kind":"Name","value":"objective"}},{"kind":"Field","name":{"kind":"Name","value":"weighting"}},{"kind":"Field","name":{"kind":"Name","value":"loss"}},{"kind":"Field","name":{"kind":"Name","value":"seriesEffect"}},{"kind":"Field","name":{"kind":"Name","value":"series"},"selectionSet":{"kind":"SelectionSet","selections":[{"kind":"Field","name":{"kind":"Name","value":"id"}}]}},{"kind":"Field","name":{"kind":"Name","value":"leftOutSeries"},"selectionSet":{"kind":"SelectionSet","selections":[{"kind":"Field","name":{"kind":"Name","value":"reason"}},{"kind":"Field","name":{"kind":"Name","value":"series"},"selectionSet":{"kind":"SelectionSet","selections":[{"kind":"Field","name":{"kind":"Name","value":"id"}}]}}]}},{"kind":"Field","name":{"kind":"Name","value":"excludedPoints"},"selectionSet":{"kind":"SelectionSet","selections":[{"kind":"Field","name":{"kind":"Name","value":"reason"}},{"kind":"Field","name":{"kind":"Name","value":"point"},"selectionSet":{"kind":"SelectionSet","selections":[{"kind":"Field","name":{"kind":"Name","value":"id"}}]}}]}},{"kind":"Field","name":{"kind":"Name","value":"statistics"},"selectionSet":{"kind":"SelectionSet","selections":[{"kind":"FragmentSpread","name":{"kind":"Name","value":"StatisticsNumbers"}}]}},{"kind":"Field","name":{"kind":"Name","value":"correlation"},"selectionSet":{"kind":"SelectionSet","selections":[{"kind":"FragmentSpread","name":{"kind":"Name","value":"CorrelationNumbers"}}]}}]}},{"kind":"FragmentDefinition","name":{"kind":"Name","value":"FitSeries"},"typeCondition":{"kind":"NamedType","name":{"kind":"Name","value":"Series"}},"selectionSet":{"kind":"SelectionSet","selections":[{"kind":"Field","name":{"kind":"Name","value":"id"}},{"kind":"Field","name":{"kind":"Name","value":"title"}},{"kind":"Field","name":{"kind":"Name","value":"status"}},{"kind":"Field","name":{"kind":"Name","value":"source"}},{"kind":"Field","name":{"kind":"Name","value":"method"}},{"kind":"Field","name":{"kind":"Name","value":"apparatus"}},{"kind":"Field","name":{"kind":"Name","value":"commonRelativeUncertainty"}},{"kind":"Field","name":{"kind":"Name","value":"sameDataAs"},"selectionSet":{"kind":"SelectionSet","selections":[{"kind":"Field","name":{"kind":"Name","value":"id"}},{"kind":"Field","name":{"kind":"Name","value":"title"}}]}},{"kind":"Field","name":{"kind":"Name","value":"submittedBy"},"selectionSet":{"kind":"SelectionSet","selections":[{"kind":"Field","name":{"kind":"Name","value":"id"}},{"kind":"Field","name":{"kind":"Name","value":"name"}}]}},{"kind":"Field","name":{"kind":"Name","value":"points"},"selectionSet":{"kind":"SelectionSet","selections":[{"kind":"Field","name":{"kind":"Name","value":"id"}},{"kind":"Field","name":{"kind":"Name","value":"temperature"}},{"kind":"Field","name":{"kind":"Name","value":"pressure"}},{"kind":"Field","name":{"kind":"Name","value":"diffusivity"}},{"kind":"Field","name":{"kind":"Name","value":"diffusivityUncertainty"}},{"kind":"Field","name":{"kind":"Name","value":"uncertaintyOrigin"}}]}}]}},{"kind":"FragmentDefinition","name":{"kind":"Name","value":"AnalysisNumbers"},"typeCondition":{"kind":"NamedType","name":{"kind":"Name","value":"FitAnalysis"}},"selectionSet":{"kind":"SelectionSet","selections":[{"kind":"Field","name":{"kind":"Name","value":"correlationMatrix"}},{"kind":"Field","name":{"kind":"Name","value":"betweenSeriesSlopeDeviation"}},{"kind":"Field","name":{"kind":"Name","value":"statistics"},"selectionSet":{"kind":"SelectionSet","selections":[{"kind":"FragmentSpread","name":{"kind":"Name","value":"StatisticsNumbers"}}]}},{"kind":"Field","name":{"kind":"Name","value":"warnings"},"selectionSet":{"kind":"SelectionSet","selections":[{"kind":"Field","name":{"kind":"Name","value":"code"}},{"kind":"Field","name":{"kind":"Name","value":"message"}}]}},{"kind":"Field","name":{"kind":"Name","value":"series"},"selectionSet":{"kind":"SelectionSet","selections":[{"kind":"Field","name":{"kind":"Name","value":"seriesId"}},{"kind":"Field","name":{"kind":"Name","value":"carriesWeight"}},{"kind":"Field","name":{"kind":"Name","value":"offset"}},{"kind":"Field","name":{"kind":"Name","value":"offsetStandardUncertainty"}},{"kind":"Field","name":{"kind":"Name","value":"fitted"}},{"kind":"Field","name":{"kind":"Name","value":"lnDeviations"}},{"kind":"Field","name":{"kind":"Name","value":"standardizedResiduals"}},{"kind":"Field","name":{"kind":"Name","value":"weights"}}]}}]}}]} as unknown as DocumentNode<FitDetailQuery, FitDetailQueryVariables>;
export const ReproduceFitDocument = {"kind":"Document","definitions":[{"kind":"OperationDefinition","operation":"query","name":{"kind":"Name","value":"ReproduceFit"},"variableDefinitions":[{"kind":"VariableDefinition","variable":{"kind":"Variable","name":{"kind":"Name","value":"input"}},"type":{"kind":"NonNullType","type":{"kind":"NamedType","name":{"kind":"Name","value":"FitCorrelationInput"}}}}],"selectionSet":{"kind":"SelectionSet","selections":[{"kind":"Field","name":{"kind":"Name","value":"previewFit"},"arguments":[{"kind":"Argument","name":{"kind":"Name","value":"input"},"value":{"kind":"Variable","name":{"kind":"Name","value":"input"}}}],"selectionSet":{"kind":"SelectionSet","selections":[{"kind":"Field","name":{"kind":"Name","value":"problems"},"selectionSet":{"kind":"SelectionSet","selections":[{"kind":"Field","name":{"kind":"Name","value":"code"}},{"kind":"Field","name":{"kind":"Name","value":"message"}}]}},{"kind":"Field","name":{"kind":"Name","value":"analysis"},"selectionSet":{"kind":"SelectionSet","selections":[{"kind":"Field","name":{"kind":"Name","value":"correlation"},"selectionSet":{"kind":"SelectionSet","selections":[{"kind":"Field","name":{"kind":"Name","value":"parameters"},"selectionSet":{"kind":"SelectionSet","selections":[{"kind":"Field","name":{"kind":"Name","value":"symbol"}},{"kind":"Field","name":{"kind":"Name","value":"value"}},{"kind":"Field","name":{"kind":"Name","value":"standardUncertainty"}},{"kind":"Field","name":{"kind":"Name","value":"unit"}}]}}]}}]}}]}}]}}]} as unknown as DocumentNode<ReproduceFitQuery, ReproduceFitQueryVariables>;
export const WorkspaceDocument = {"kind":"Document","definitions":[{"kind":"OperationDefinition","operation":"query","name":{"kind":"Name","value":"Workspace"},"variableDefinitions":[{"kind":"VariableDefinition","variable":{"kind":"Variable","name":{"kind":"Name","value":"id"}},"type":{"kind":"NonNullType","type":{"kind":"NamedType","name":{"kind":"Name","value":"ID"}}}}],"selectionSet":{"kind":"SelectionSet","selections":[{"kind":"Field","name":{"kind":"Name","value":"pairById"},"arguments":[{"kind":"Argument","name":{"kind":"Name","value":"id"},"value":{"kind":"Variable","name":{"kind":"Name","value":"id"}}}],"selectionSet":{"kind":"SelectionSet","selections":[{"kind":"Field","name":{"kind":"Name","value":"id"}},{"kind":"Field","name":{"kind":"Name","value":"substances"},"selectionSet":{"kind":"SelectionSet","selections":[{"kind":"Field","name":{"kind":"Name","value":"id"}},{"kind":"Field","name":{"kind":"Name","value":"name"}},{"kind":"Field","name":{"kind":"Name","value":"formula"}}]}},{"kind":"Field","name":{"kind":"Name","value":"dataSheet"},"selectionSet":{"kind":"SelectionSet","selections":[{"kind":"Field","name":{"kind":"Name","value":"id"}},{"kind":"Field","name":{"kind":"Name","value":"code"}},{"kind":"Field","name":{"kind":"Name","value":"current"},"selectionSet":{"kind":"SelectionSet","selections":[{"kind":"Field","name":{"kind":"Name","value":"id"}},{"kind":"Field","name":{"kind":"Name","value":"number"}}]}},{"kind":"Field","name":{"kind":"Name","value":"versions"},"selectionSet":{"kind":"SelectionSet","selections":[{"kind":"Field","name":{"kind":"Name","value":"id"}},{"kind":"Field","name":{"kind":"Name","value":"number"}},{"kind":"Field","name":{"kind":"Name","value":"status"}},{"kind":"Field","name":{"kind":"Name","value":"fit"},"selectionSet":{"kind":"SelectionSet","selections":[{"kind":"Field","name":{"kind":"Name","value":"id"}}]}}]}}]}},{"kind":"Field","name":{"kind":"Name","value":"series"},"arguments":[{"kind":"Argument","name":{"kind":"Name","value":"first"},"value":{"kind":"IntValue","value":"100"}}],"selectionSet":{"kind":"SelectionSet","selections":[{"kind":"Field","name":{"kind":"Name","value":"totalCount"}},{"kind":"Field","name":{"kind":"Name","value":"edges"},"selectionSet":{"kind":"SelectionSet","selections":[{"kind":"Field","name":{"kind":"Name","value":"node"},"selectionSet":{"kind":"SelectionSet","selections":[{"kind":"FragmentSpread","name":{"kind":"Name","value":"FitSeries"}}]}}]}}]}},{"kind":"Field","name":{"kind":"Name","value":"fits"},"selectionSet":{"kind":"SelectionSet","selections":[{"kind":"FragmentSpread","name":{"kind":"Name","value":"KeptFit"}}]}}]}}]}},{"kind":"FragmentDefinition","name":{"kind":"Name","value":"StatisticsNumbers"},"typeCondition":{"kind":"NamedType","name":{"kind":"Name","value":"FitStatistics"}},"selectionSet":{"kind":"SelectionSet","selections":[{"kind":"Field","name":{"kind":"Name","value":"pointCount"}},{"kind":"Field","name":{"kind":"Name","value":"seriesCount"}},{"kind":"Field","name":{"kind":"Name","value":"residualDegreesOfFreedom"}},{"kind":"Field","name":{"kind":"Name","value":"chiSquare"}},{"kind":"Field","name":{"kind":"Name","value":"reducedChiSquare"}},{"kind":"Field","name":{"kind":"Name","value":"chiSquareProbability"}},{"kind":"Field","name":{"kind":"Name","value":"residualStandardError"}},{"kind":"Field","name":{"kind":"Name","value":"aicc"}},{"kind":"Field","name":{"kind":"Name","value":"betweenSeriesDeviation"}},{"kind":"Field","name":{"kind":"Name","value":"betweenSeriesOrigin"}},{"kind":"Field","name":{"kind":"Name","value":"cochranQ"}},{"kind":"Field","name":{"kind":"Name","value":"iSquared"}}]}},{"kind":"FragmentDefinition","name":{"kind":"Name","value":"CorrelationNumbers"},"typeCondition":{"kind":"NamedType","name":{"kind":"Name","value":"Correlation"}},"selectionSet":{"kind":"SelectionSet","selections":[{"kind":"Field","name":{"kind":"Name","value":"form"}},{"kind":"Field","name":{"kind":"Name","value":"expression"}},{"kind":"Field","name":{"kind":"Name","value":"referenceTemperature"}},{"kind":"Field","name":{"kind":"Name","value":"referencePressure"}},{"kind":"Field","name":{"kind":"Name","value":"degreesOfFreedom"}},{"kind":"Field","name":{"kind":"Name","value":"parameters"},"selectionSet":{"kind":"SelectionSet","selections":[{"kind":"Field","name":{"kind":"Name","value":"symbol"}},{"kind":"Field","name":{"kind":"Name","value":"value"}},{"kind":"Field","name":{"kind":"Name","value":"standardUncertainty"}},{"kind":"Field","name":{"kind":"Name","value":"unit"}}]}},{"kind":"Field","name":{"kind":"Name","value":"validity"},"selectionSet":{"kind":"SelectionSet","selections":[{"kind":"Field","name":{"kind":"Name","value":"temperatureMinimum"}},{"kind":"Field","name":{"kind":"Name","value":"temperatureMaximum"}},{"kind":"Field","name":{"kind":"Name","value":"pressureMinimum"}},{"kind":"Field","name":{"kind":"Name","value":"pressureMaximum"}},{"kind":"Field","name":{"kind":"Name","value":"pressureBasis"}}]}}]}},{"kind":"FragmentDefinition","name":{"kind":"Name","value":"FitSeries"},"typeCondition":{"kind":"NamedType","name":{"kind":"Name","value":"Series"}},"selectionSet":{"kind":"SelectionSet","selections":[{"kind":"Field","name":{"kind":"Name","value":"id"}},{"kind":"Field","name":{"kind":"Name","value":"title"}},{"kind":"Field","name":{"kind":"Name","value":"status"}},{"kind":"Field","name":{"kind":"Name","value":"source"}},{"kind":"Field","name":{"kind":"Name","value":"method"}},{"kind":"Field","name":{"kind":"Name","value":"apparatus"}},{"kind":"Field","name":{"kind":"Name","value":"commonRelativeUncertainty"}},{"kind":"Field","name":{"kind":"Name","value":"sameDataAs"},"selectionSet":{"kind":"SelectionSet","selections":[{"kind":"Field","name":{"kind":"Name","value":"id"}},{"kind":"Field","name":{"kind":"Name","value":"title"}}]}},{"kind":"Field","name":{"kind":"Name","value":"submittedBy"},"selectionSet":{"kind":"SelectionSet","selections":[{"kind":"Field","name":{"kind":"Name","value":"id"}},{"kind":"Field","name":{"kind":"Name","value":"name"}}]}},{"kind":"Field","name":{"kind":"Name","value":"points"},"selectionSet":{"kind":"SelectionSet","selections":[{"kind":"Field","name":{"kind":"Name","value":"id"}},{"kind":"Field","name":{"kind":"Name","value":"temperature"}},{"kind":"Field","name":{"kind":"Name","value":"pressure"}},{"kind":"Field","name":{"kind":"Name","value":"diffusivity"}},{"kind":"Field","name":{"kind":"Name","value":"diffusivityUncertainty"}},{"kind":"Field","name":{"kind":"Name","value":"uncertaintyOrigin"}}]}}]}},{"kind":"FragmentDefinition","name":{"kind":"Name","value":"KeptFit"},"typeCondition":{"kind":"NamedType","name":{"kind":"Name","value":"Fit"}},"selectionSet":{"kind":"SelectionSet","selections":[{"kind":"Field","name":{"kind":"Name","value":"id"}},{"kind":"Field","name":{"kind":"Name","value":"number"}},{"kind":"Field","name":{"kind":"Name","value":"createdAt"}},{"kind":"Field","name":{"kind":"Name","value":"createdBy"},"selectionSet":{"kind":"SelectionSet","selections":[{"kind":"Field","name":{"kind":"Name","value":"id"}},{"kind":"Field","name":{"kind":"Name","value":"name"}}]}},{"kind":"Field","name":{"kind":"Name","value":"objective"}},{"kind":"Field","name":{"kind":"Name","value":"weighting"}},{"kind":"Field","name":{"kind":"Name","value":"loss"}},{"kind":"Field","name":{"kind":"Name","value":"seriesEffect"}},{"kind":"Field","name":{"kind":"Name","value":"series"},"selectionSet":{"kind":"SelectionSet","selections":[{"kind":"Field","name":{"kind":"Name","value":"id"}}]}},{"kind":"Field","name":{"kind":"Name","value":"leftOutSeries"},"selectionSet":{"kind":"SelectionSet","selections":[{"kind":"Field","name":{"kind":"Name","value":"reason"}},{"kind":"Field","name":{"kind":"Name","value":"series"},"selectionSet":{"kind":"SelectionSet","selections":[{"kind":"Field","name":{"kind":"Name","value":"id"}}]}}]}},{"kind":"Field","name":{"kind":"Name","value":"excludedPoints"},"selectionSet":{"kind":"SelectionSet","selections":[{"kind":"Field","name":{"kind":"Name","value":"reason"}},{"kind":"Field","name":{"kind":"Name","value":"point"},"selectionSet":{"kind":"SelectionSet","selections":[{"kind":"Field","name":{"kind":"Name","value":"id"}}]}}]}},{"kind":"Field","name":{"kind":"Name","value":"statistics"},"selectionSet":{"kind":"SelectionSet","selections":[{"kind":"FragmentSpread","name":{"kind":"Name","value":"StatisticsNumbers"}}]}},{"kind":"Field","name":{"kind":"Name","value":"correlation"},"selectionSet":{"kind":"SelectionSet","selections":[{"kind":"FragmentSpread","name":{"kind":"Name","value":"CorrelationNumbers"}}]}}]}}]} as unknown as DocumentNode<WorkspaceQuery, WorkspaceQueryVariables>;
export const PreviewFitDocument = {"kind":"Document","definitions":[{"kind":"OperationDefinition","operation":"query","name":{"kind":"Name","value":"PreviewFit"},"variableDefinitions":[{"kind":"VariableDefinition","variable":{"kind":"Variable","name":{"kind":"Name","value":"input"}},"type":{"kind":"NonNullType","type":{"kind":"NamedType","name":{"kind":"Name","value":"FitCorrelationInput"}}}},{"kind":"VariableDefinition","variable":{"kind":"Variable","name":{"kind":"Name","value":"temperatures"}},"type":{"kind":"NonNullType","type":{"kind":"NamedType","name":{"kind":"Name","value":"FloatColumn"}}}},{"kind":"VariableDefinition","variable":{"kind":"Variable","name":{"kind":"Name","value":"pressure"}},"type":{"kind":"NonNullType","type":{"kind":"NamedType","name":{"kind":"Name","value":"FloatColumn"}}}},{"kind":"VariableDefinition","variable":{"kind":"Variable","name":{"kind":"Name","value":"withPrediction"}},"type":{"kind":"NonNullType","type":{"kind":"NamedType","name":{"kind":"Name","value":"Boolean"}}}}],"selectionSet":{"kind":"SelectionSet","selections":[{"kind":"Field","name":{"kind":"Name","value":"previewFit"},"arguments":[{"kind":"Argument","name":{"kind":"Name","value":"input"},"value":{"kind":"Variable","name":{"kind":"Name","value":"input"}}}],"selectionSet":{"kind":"SelectionSet","selections":[{"kind":"Field","name":{"kind":"Name","value":"problems"},"selectionSet":{"kind":"SelectionSet","selections":[{"kind":"Field","name":{"kind":"Name","value":"code"}},{"kind":"Field","name":{"kind":"Name","value":"message"}},{"kind":"Field","name":{"kind":"Name","value":"path"}}]}},{"kind":"Field","name":{"kind":"Name","value":"analysis"},"selectionSet":{"kind":"SelectionSet","selections":[{"kind":"FragmentSpread","name":{"kind":"Name","value":"AnalysisNumbers"}},{"kind":"Field","name":{"kind":"Name","value":"correlation"},"selectionSet":{"kind":"SelectionSet","selections":[{"kind":"FragmentSpread","name":{"kind":"Name","value":"CorrelationNumbers"}},{"kind":"Field","alias":{"kind":"Name","value":"curve"},"name":{"kind":"Name","value":"evaluate"},"arguments":[{"kind":"Argument","name":{"kind":"Name","value":"temperatures"},"value":{"kind":"Variable","name":{"kind":"Name","value":"temperatures"}}},{"kind":"Argument","name":{"kind":"Name","value":"pressures"},"value":{"kind":"Variable","name":{"kind":"Name","value":"pressure"}}}],"selectionSet":{"kind":"SelectionSet","selections":[{"kind":"Field","name":{"kind":"Name","value":"diffusivities"}},{"kind":"Field","name":{"kind":"Name","value":"expandedUncertainties"}}]}},{"kind":"Field","alias":{"kind":"Name","value":"newLaboratory"},"name":{"kind":"Name","value":"evaluate"},"arguments":[{"kind":"Argument","name":{"kind":"Name","value":"temperatures"},"value":{"kind":"Variable","name":{"kind":"Name","value":"temperatures"}}},{"kind":"Argument","name":{"kind":"Name","value":"pressures"},"value":{"kind":"Variable","name":{"kind":"Name","value":"pressure"}}},{"kind":"Argument","name":{"kind":"Name","value":"kind"},"value":{"kind":"EnumValue","value":"NEW_SERIES"}}],"directives":[{"kind":"Directive","name":{"kind":"Name","value":"include"},"arguments":[{"kind":"Argument","name":{"kind":"Name","value":"if"},"value":{"kind":"Variable","name":{"kind":"Name","value":"withPrediction"}}}]}],"selectionSet":{"kind":"SelectionSet","selections":[{"kind":"Field","name":{"kind":"Name","value":"expandedUncertainties"}}]}}]}}]}}]}}]}},{"kind":"FragmentDefinition","name":{"kind":"Name","value":"StatisticsNumbers"},"typeCondition":{"kind":"NamedType","name":{"kind":"Name","value":"FitStatistics"}},"selectionSet":{"kind":"SelectionSet","selections":[{"kind":"Field","name":{"kind":"Name","value":"pointCount"}},{"kind":"Field","name":{"kind":"Name","value":"seriesCount"}},{"kind":"Field","name":{"kind":"Name","value":"residualDegreesOfFreedom"}},{"kind":"Field","name":{"kind":"Name","value":"chiSquare"}},{"kind":"Field","name":{"kind":"Name","value":"reducedChiSquare"}},{"kind":"Field","name":{"kind":"Name","value":"chiSquareProbability"}},{"kind":"Field","name":{"kind":"Name","value":"residualStandardError"}},{"kind":"Field","name":{"kind":"Name","value":"aicc"}},{"kind":"Field","name":{"kind":"Name","value":"betweenSeriesDeviation"}},{"kind":"Field","name":{"kind":"Name","value":"betweenSeriesOrigin"}},{"kind":"Field","name":{"kind":"Name","value":"cochranQ"}},{"kind":"Field","name":{"kind":"Name","value":"iSquared"}}]}},{"kind":"FragmentDefinition","name":{"kind":"Name","value":"AnalysisNumbers"},"typeCondition":{"kind":"NamedType","name":{"kind":"Name","value":"FitAnalysis"}},"selectionSet":{"kind":"SelectionSet","selections":[{"kind":"Field","name":{"kind":"Name","value":"correlationMatrix"}},{"kind":"Field","name":{"kind":"Name","value":"betweenSeriesSlopeDeviation"}},{"kind":"Field","name":{"kind":"Name","value":"statistics"},"selectionSet":{"kind":"SelectionSet","selections":[{"kind":"FragmentSpread","name":{"kind":"Name","value":"StatisticsNumbers"}}]}},{"kind":"Field","name":{"kind":"Name","value":"warnings"},"selectionSet":{"kind":"SelectionSet","selections":[{"kind":"Field","name":{"kind":"Name","value":"code"}},{"kind":"Field","name":{"kind":"Name","value":"message"}}]}},{"kind":"Field","name":{"kind":"Name","value":"series"},"selectionSet":{"kind":"SelectionSet","selections":[{"kind":"Field","name":{"kind":"Name","value":"seriesId"}},{"kind":"Field","name":{"kind":"Name","value":"carriesWeight"}},{"kind":"Field","name":{"kind":"Name","value":"offset"}},{"kind":"Field","name":{"kind":"Name","value":"offsetStandardUncertainty"}},{"kind":"Field","name":{"kind":"Name","value":"fitted"}},{"kind":"Field","name":{"kind":"Name","value":"lnDeviations"}},{"kind":"Field","name":{"kind":"Name","value":"standardizedResiduals"}},{"kind":"Field","name":{"kind":"Name","value":"weights"}}]}}]}},{"kind":"FragmentDefinition","name":{"kind":"Name","value":"CorrelationNumbers"},"typeCondition":{"kind":"NamedType","name":{"kind":"Name","value":"Correlation"}},"selectionSet":{"kind":"SelectionSet","selections":[{"kind":"Field","name":{"kind":"Name","value":"form"}},{"kind":"Field","name":{"kind":"Name","value":"expression"}},{"kind":"Field","name":{"kind":"Name","value":"referenceTemperature"}},{"kind":"Field","name":{"kind":"Name","value":"referencePressure"}},{"kind":"Field","name":{"kind":"Name","value":"degreesOfFreedom"}},{"kind":"Field","name":{"kind":"Name","value":"parameters"},"selectionSet":{"kind":"SelectionSet","selections":[{"kind":"Field","name":{"kind":"Name","value":"symbol"}},{"kind":"Field","name":{"kind":"Name","value":"value"}},{"kind":"Field","name":{"kind":"Name","value":"standardUncertainty"}},{"kind":"Field","name":{"kind":"Name","value":"unit"}}]}},{"kind":"Field","name":{"kind":"Name","value":"validity"},"selectionSet":{"kind":"SelectionSet","selections":[{"kind":"Field","name":{"kind":"Name","value":"temperatureMinimum"}},{"kind":"Field","name":{"kind":"Name","value":"temperatureMaximum"}},{"kind":"Field","name":{"kind":"Name","value":"pressureMinimum"}},{"kind":"Field","name":{"kind":"Name","value":"pressureMaximum"}},{"kind":"Field","name":{"kind":"Name","value":"pressureBasis"}}]}}]}}]} as unknown as DocumentNode<PreviewFitQuery, PreviewFitQueryVariables>;
export const PairEstimatesDocument = {"kind":"Document","definitions":[{"kind":"OperationDefinition","operation":"query","name":{"kind":"Name","value":"PairEstimates"},"variableDefinitions":[{"kind":"VariableDefinition","variable":{"kind":"Variable","name":{"kind":"Name","value":"id"}},"type":{"kind":"NonNullType","type":{"kind":"NamedType","name":{"kind":"Name","value":"ID"}}}},{"kind":"VariableDefinition","variable":{"kind":"Variable","name":{"kind":"Name","value":"temperatures"}},"type":{"kind":"NonNullType","type":{"kind":"NamedType","name":{"kind":"Name","value":"FloatColumn"}}}},{"kind":"VariableDefinition","variable":{"kind":"Variable","name":{"kind":"Name","value":"pressure"}},"type":{"kind":"NonNullType","type":{"kind":"NamedType","name":{"kind":"Name","value":"Float"}}}}],"selectionSet":{"kind":"SelectionSet","selections":[{"kind":"Field","name":{"kind":"Name","value":"pairById"},"arguments":[{"kind":"Argument","name":{"kind":"Name","value":"id"},"value":{"kind":"Variable","name":{"kind":"Name","value":"id"}}}],"selectionSet":{"kind":"SelectionSet","selections":[{"kind":"Field","name":{"kind":"Name","value":"id"}},{"kind":"Field","name":{"kind":"Name","value":"estimates"},"arguments":[{"kind":"Argument","name":{"kind":"Name","value":"temperatures"},"value":{"kind":"Variable","name":{"kind":"Name","value":"temperatures"}}},{"kind":"Argument","name":{"kind":"Name","value":"pressure"},"value":{"kind":"Variable","name":{"kind":"Name","value":"pressure"}}}],"selectionSet":{"kind":"SelectionSet","selections":[{"kind":"Field","name":{"kind":"Name","value":"method"}},{"kind":"Field","name":{"kind":"Name","value":"label"}},{"kind":"Field","name":{"kind":"Name","value":"diffusivities"}},{"kind":"Field","name":{"kind":"Name","value":"usualRelativeError"}},{"kind":"Field","name":{"kind":"Name","value":"source"}}]}}]}}]}}]} as unknown as DocumentNode<PairEstimatesQuery, PairEstimatesQueryVariables>;
export const KeepFitDocument = {"kind":"Document","definitions":[{"kind":"OperationDefinition","operation":"mutation","name":{"kind":"Name","value":"KeepFit"},"variableDefinitions":[{"kind":"VariableDefinition","variable":{"kind":"Variable","name":{"kind":"Name","value":"input"}},"type":{"kind":"NonNullType","type":{"kind":"NamedType","name":{"kind":"Name","value":"FitCorrelationInput"}}}}],"selectionSet":{"kind":"SelectionSet","selections":[{"kind":"Field","name":{"kind":"Name","value":"fitCorrelation"},"arguments":[{"kind":"Argument","name":{"kind":"Name","value":"input"},"value":{"kind":"Variable","name":{"kind":"Name","value":"input"}}}],"selectionSet":{"kind":"SelectionSet","selections":[{"kind":"Field","name":{"kind":"Name","value":"problems"},"selectionSet":{"kind":"SelectionSet","selections":[{"kind":"Field","name":{"kind":"Name","value":"code"}},{"kind":"Field","name":{"kind":"Name","value":"message"}},{"kind":"Field","name":{"kind":"Name","value":"path"}}]}},{"kind":"Field","name":{"kind":"Name","value":"fit"},"selectionSet":{"kind":"SelectionSet","selections":[{"kind":"FragmentSpread","name":{"kind":"Name","value":"KeptFit"}}]}}]}}]}},{"kind":"FragmentDefinition","name":{"kind":"Name","value":"StatisticsNumbers"},"typeCondition":{"kind":"NamedType","name":{"kind":"Name","value":"FitStatistics"}},"selectionSet":{"kind":"SelectionSet","selections":[{"kind":"Field","name":{"kind":"Name","value":"pointCount"}},{"kind":"Field","name":{"kind":"Name","value":"seriesCount"}},{"kind":"Field","name":{"kind":"Name","value":"residualDegreesOfFreedom"}},{"kind":"Field","name":{"kind":"Name","value":"chiSquare"}},{"kind":"Field","name":{"kind":"Name","value":"reducedChiSquare"}},{"kind":"Field","name":{"kind":"Name","value":"chiSquareProbability"}},{"kind":"Field","name":{"kind":"Name","value":"residualStandardError"}},{"kind":"Field","name":{"kind":"Name","value":"aicc"}},{"kind":"Field","name":{"kind":"Name","value":"betweenSeriesDeviation"}},{"kind":"Field","name":{"kind":"Name","value":"betweenSeriesOrigin"}},{"kind":"Field","name":{"kind":"Name","value":"cochranQ"}},{"kind":"Field","name":{"kind":"Name","value":"iSquared"}}]}},{"kind":"FragmentDefinition","name":{"kind":"Name","value":"CorrelationNumbers"},"typeCondition":{"kind":"NamedType","name":{"kind":"Name","value":"Correlation"}},"selectionSet":{"kind":"SelectionSet","selections":[{"kind":"Field","name":{"kind":"Name","value":"form"}},{"kind":"Field","name":{"kind":"Name","value":"expression"}},{"kind":"Field","name":{"kind":"Name","value":"referenceTemperature"}},{"kind":"Field","name":{"kind":"Name","value":"referencePressure"}},{"kind":"Field","name":{"kind":"Name","value":"degreesOfFreedom"}},{"kind":"Field","name":{"kind":"Name","value":"parameters"},"selectionSet":{"kind":"SelectionSet","selections":[{"kind":"Field","name":{"kind":"Name","value":"symbol"}},{"kind":"Field","name":{"kind":"Name","value":"value"}},{"kind":"Field","name":{"kind":"Name","value":"standardUncertainty"}},{"kind":"Field","name":{"kind":"Name","value":"unit"}}]}},{"kind":"Field","name":{"kind":"Name","value":"validity"},"selectionSet":{"kind":"SelectionSet","selections":[{"kind":"Field","name":{"kind":"Name","value":"temperatureMinimum"}},{"kind":"Field","name":{"kind":"Name","value":"temperatureMaximum"}},{"kind":"Field","name":{"kind":"Name","value":"pressureMinimum"}},{"kind":"Field","name":{"kind":"Name","value":"pressureMaximum"}},{"kind":"Field","name":{"kind":"Name","value":"pressureBasis"}}]}}]}},{"kind":"FragmentDefinition","name":{"kind":"Name","value":"KeptFit"},"typeCondition":{"kind":"NamedType","name":{"kind":"Name","value":"Fit"}},"selectionSet":{"kind":"SelectionSet","selections":[{"kind":"Field","name":{"kind":"Name","value":"id"}},{"kind":"Field","name":{"kind":"Name","value":"number"}},{"kind":"Field","name":{"kind":"Name","value":"createdAt"}},{"kind":"Field","name":{"kind":"Name","value":"createdBy"},"selectionSet":{"kind":"SelectionSet","selections":[{"kind":"Field","name":{"kind":"Name","value":"id"}},{"kind":"Field","name":{"kind":"Name","value":"name"}}]}},{"kind":"Field","name":{"kind":"Name","value":"objective"}},{"kind":"Field","name":{"kind":"Name","value":"weighting"}},{"kind":"Field","name":{"kind":"Name","value":"loss"}},{"kind":"Field","name":{"kind":"Name","value":"seriesEffect"}},{"kind":"Field","name":{"kind":"Name","value":"series"},"selectionSet":{"kind":"SelectionSet","selections":[{"kind":"Field","name":{"kind":"Name","value":"id"}}]}},{"kind":"Field","name":{"kind":"Name","value":"leftOutSeries"},"selectionSet":{"kind":"SelectionSet","selections":[{"kind":"Field","name":{"kind":"Name","value":"reason"}},{"kind":"Field","name":{"kind":"Name","value":"series"},"selectionSet":{"kind":"SelectionSet","selections":[{"kind":"Field","name":{"kind":"Name","value":"id"}}]}}]}},{"kind":"Field","name":{"kind":"Name","value":"excludedPoints"},"selectionSet":{"kind":"SelectionSet","selections":[{"kind":"Field","name":{"kind":"Name","value":"reason"}},{"kind":"Field","name":{"kind":"Name","value":"point"},"selectionSet":{"kind":"SelectionSet","selections":[{"kind":"Field","name":{"kind":"Name","value":"id"}}]}}]}},{"kind":"Field","name":{"kind":"Name","value":"statistics"},"selectionSet":{"kind":"SelectionSet","selections":[{"kind":"FragmentSpread","name":{"kind":"Name","value":"StatisticsNumbers"}}]}},{"kind":"Field","name":{"kind":"Name","value":"correlation"},"selectionSet":{"kind":"SelectionSet","selections":[{"kind":"FragmentSpread","name":{"kind":"Name","value":"CorrelationNumbers"}}]}}]}}]} as unknown as DocumentNode<KeepFitMutation, KeepFitMutationVariables>;
export const AcceptFromWorkspaceDocument = {"kind":"Document","definitions":[{"kind":"OperationDefinition","operation":"mutation","name":{"kind":"Name","value":"AcceptFromWorkspace"},"variableDefinitions":[{"kind":"VariableDefinition","variable":{"kind":"Variable","name":{"kind":"Name","value":"id"}},"type":{"kind":"NonNullType","type":{"kind":"NamedType","name":{"kind":"Name","value":"ID"}}}}],"selectionSet":{"kind":"SelectionSet","selections":[{"kind":"Field","name":{"kind":"Name","value":"acceptSeries"},"arguments":[{"kind":"Argument","name":{"kind":"Name","value":"id"},"value":{"kind":"Variable","name":{"kind":"Name","value":"id"}}}],"selectionSet":{"kind":"SelectionSet","selections":[{"kind":"Field","name":{"kind":"Name","value":"problems"},"selectionSet":{"kind":"SelectionSet","selections":[{"kind":"Field","name":{"kind":"Name","value":"code"}},{"kind":"Field","name":{"kind":"Name","value":"message"}},{"kind":"Field","name":{"kind":"Name","value":"path"}}]}},{"kind":"Field","name":{"kind":"Name","value":"series"},"selectionSet":{"kind":"SelectionSet","selections":[{"kind":"Field","name":{"kind":"Name","value":"id"}},{"kind":"Field","name":{"kind":"Name","value":"status"}}]}}]}}]}}]} as unknown as DocumentNode<AcceptFromWorkspaceMutation, AcceptFromWorkspaceMutationVariables>;
export const ReturnFromWorkspaceDocument = {"kind":"Document","definitions":[{"kind":"OperationDefinition","operation":"mutation","name":{"kind":"Name","value":"ReturnFromWorkspace"},"variableDefinitions":[{"kind":"VariableDefinition","variable":{"kind":"Variable","name":{"kind":"Name","value":"id"}},"type":{"kind":"NonNullType","type":{"kind":"NamedType","name":{"kind":"Name","value":"ID"}}}},{"kind":"VariableDefinition","variable":{"kind":"Variable","name":{"kind":"Name","value":"remark"}},"type":{"kind":"NonNullType","type":{"kind":"NamedType","name":{"kind":"Name","value":"String"}}}}],"selectionSet":{"kind":"SelectionSet","selections":[{"kind":"Field","name":{"kind":"Name","value":"returnSeries"},"arguments":[{"kind":"Argument","name":{"kind":"Name","value":"id"},"value":{"kind":"Variable","name":{"kind":"Name","value":"id"}}},{"kind":"Argument","name":{"kind":"Name","value":"remark"},"value":{"kind":"Variable","name":{"kind":"Name","value":"remark"}}}],"selectionSet":{"kind":"SelectionSet","selections":[{"kind":"Field","name":{"kind":"Name","value":"problems"},"selectionSet":{"kind":"SelectionSet","selections":[{"kind":"Field","name":{"kind":"Name","value":"code"}},{"kind":"Field","name":{"kind":"Name","value":"message"}},{"kind":"Field","name":{"kind":"Name","value":"path"}}]}},{"kind":"Field","name":{"kind":"Name","value":"series"},"selectionSet":{"kind":"SelectionSet","selections":[{"kind":"Field","name":{"kind":"Name","value":"id"}},{"kind":"Field","name":{"kind":"Name","value":"status"}}]}}]}}]}}]} as unknown as DocumentNode<ReturnFromWorkspaceMutation, ReturnFromWorkspaceMutationVariables>;
export const HomeDocument = {"kind":"Document","definitions":[{"kind":"OperationDefinition","operation":"query","name":{"kind":"Name","value":"Home"},"selectionSet":{"kind":"SelectionSet","selections":[{"kind":"Field","name":{"kind":"Name","value":"home"},"selectionSet":{"kind":"SelectionSet","selections":[{"kind":"Field","name":{"kind":"Name","value":"tasks"},"selectionSet":{"kind":"SelectionSet","selections":[{"kind":"FragmentSpread","name":{"kind":"Name","value":"TaskFields"}}]}},{"kind":"Field","name":{"kind":"Name","value":"waiting"},"selectionSet":{"kind":"SelectionSet","selections":[{"kind":"FragmentSpread","name":{"kind":"Name","value":"TaskFields"}}]}}]}}]}},{"kind":"FragmentDefinition","name":{"kind":"Name","value":"TaskFields"},"typeCondition":{"kind":"NamedType","name":{"kind":"Name","value":"Task"}},"selectionSet":{"kind":"SelectionSet","selections":[{"kind":"Field","name":{"kind":"Name","value":"kind"}},{"kind":"Field","name":{"kind":"Name","value":"since"}},{"kind":"Field","name":{"kind":"Name","value":"remark"}},{"kind":"Field","name":{"kind":"Name","value":"series"},"selectionSet":{"kind":"SelectionSet","selections":[{"kind":"Field","name":{"kind":"Name","value":"id"}},{"kind":"Field","name":{"kind":"Name","value":"title"}},{"kind":"Field","name":{"kind":"Name","value":"status"}},{"kind":"Field","name":{"kind":"Name","value":"pair"},"selectionSet":{"kind":"SelectionSet","selections":[{"kind":"Field","name":{"kind":"Name","value":"id"}},{"kind":"Field","name":{"kind":"Name","value":"substances"},"selectionSet":{"kind":"SelectionSet","selections":[{"kind":"Field","name":{"kind":"Name","value":"id"}},{"kind":"Field","name":{"kind":"Name","value":"name"}}]}}]}},{"kind":"Field","name":{"kind":"Name","value":"submittedBy"},"selectionSet":{"kind":"SelectionSet","selections":[{"kind":"Field","name":{"kind":"Name","value":"id"}},{"kind":"Field","name":{"kind":"Name","value":"name"}}]}}]}},{"kind":"Field","name":{"kind":"Name","value":"version"},"selectionSet":{"kind":"SelectionSet","selections":[{"kind":"Field","name":{"kind":"Name","value":"id"}},{"kind":"Field","name":{"kind":"Name","value":"number"}},{"kind":"Field","name":{"kind":"Name","value":"status"}},{"kind":"Field","name":{"kind":"Name","value":"sheet"},"selectionSet":{"kind":"SelectionSet","selections":[{"kind":"Field","name":{"kind":"Name","value":"id"}},{"kind":"Field","name":{"kind":"Name","value":"code"}},{"kind":"Field","name":{"kind":"Name","value":"pair"},"selectionSet":{"kind":"SelectionSet","selections":[{"kind":"Field","name":{"kind":"Name","value":"id"}},{"kind":"Field","name":{"kind":"Name","value":"substances"},"selectionSet":{"kind":"SelectionSet","selections":[{"kind":"Field","name":{"kind":"Name","value":"id"}},{"kind":"Field","name":{"kind":"Name","value":"name"}}]}}]}}]}},{"kind":"Field","name":{"kind":"Name","value":"preparedBy"},"selectionSet":{"kind":"SelectionSet","selections":[{"kind":"Field","name":{"kind":"Name","value":"id"}},{"kind":"Field","name":{"kind":"Name","value":"name"}}]}}]}}]}}]} as unknown as DocumentNode<HomeQuery, HomeQueryVariables>;
export const PairsDocument = {"kind":"Document","definitions":[{"kind":"OperationDefinition","operation":"query","name":{"kind":"Name","value":"Pairs"},"variableDefinitions":[{"kind":"VariableDefinition","variable":{"kind":"Variable","name":{"kind":"Name","value":"search"}},"type":{"kind":"NamedType","name":{"kind":"Name","value":"String"}}},{"kind":"VariableDefinition","variable":{"kind":"Variable","name":{"kind":"Name","value":"after"}},"type":{"kind":"NamedType","name":{"kind":"Name","value":"String"}}}],"selectionSet":{"kind":"SelectionSet","selections":[{"kind":"Field","name":{"kind":"Name","value":"gasPairs"},"arguments":[{"kind":"Argument","name":{"kind":"Name","value":"search"},"value":{"kind":"Variable","name":{"kind":"Name","value":"search"}}},{"kind":"Argument","name":{"kind":"Name","value":"first"},"value":{"kind":"IntValue","value":"50"}},{"kind":"Argument","name":{"kind":"Name","value":"after"},"value":{"kind":"Variable","name":{"kind":"Name","value":"after"}}}],"selectionSet":{"kind":"SelectionSet","selections":[{"kind":"Field","name":{"kind":"Name","value":"totalCount"}},{"kind":"Field","name":{"kind":"Name","value":"pageInfo"},"selectionSet":{"kind":"SelectionSet","selections":[{"kind":"Field","name":{"kind":"Name","value":"hasNextPage"}},{"kind":"Field","name":{"kind":"Name","value":"endCursor"}}]}},{"kind":"Field","name":{"kind":"Name","value":"edges"},"selectionSet":{"kind":"SelectionSet","selections":[{"kind":"Field","name":{"kind":"Name","value":"node"},"selectionSet":{"kind":"SelectionSet","selections":[{"kind":"FragmentSpread","name":{"kind":"Name","value":"PairRow"}}]}}]}}]}}]}},{"kind":"FragmentDefinition","name":{"kind":"Name","value":"PairRow"},"typeCondition":{"kind":"NamedType","name":{"kind":"Name","value":"GasPair"}},"selectionSet":{"kind":"SelectionSet","selections":[{"kind":"Field","name":{"kind":"Name","value":"id"}},{"kind":"Field","name":{"kind":"Name","value":"substances"},"selectionSet":{"kind":"SelectionSet","selections":[{"kind":"Field","name":{"kind":"Name","value":"id"}},{"kind":"Field","name":{"kind":"Name","value":"name"}},{"kind":"Field","name":{"kind":"Name","value":"formula"}}]}},{"kind":"Field","alias":{"kind":"Name","value":"accepted"},"name":{"kind":"Name","value":"series"},"arguments":[{"kind":"Argument","name":{"kind":"Name","value":"status"},"value":{"kind":"ListValue","values":[{"kind":"EnumValue","value":"ACCEPTED"}]}},{"kind":"Argument","name":{"kind":"Name","value":"first"},"value":{"kind":"IntValue","value":"1"}}],"selectionSet":{"kind":"SelectionSet","selections":[{"kind":"Field","name":{"kind":"Name","value":"totalCount"}}]}},{"kind":"Field","alias":{"kind":"Name","value":"waiting"},"name":{"kind":"Name","value":"series"},"arguments":[{"kind":"Argument","name":{"kind":"Name","value":"status"},"value":{"kind":"ListValue","values":[{"kind":"EnumValue","value":"SUBMITTED"}]}},{"kind":"Argument","name":{"kind":"Name","value":"first"},"value":{"kind":"IntValue","value":"1"}}],"selectionSet":{"kind":"SelectionSet","selections":[{"kind":"Field","name":{"kind":"Name","value":"totalCount"}}]}},{"kind":"Field","name":{"kind":"Name","value":"fits"},"selectionSet":{"kind":"SelectionSet","selections":[{"kind":"Field","name":{"kind":"Name","value":"id"}},{"kind":"Field","name":{"kind":"Name","value":"number"}}]}},{"kind":"Field","name":{"kind":"Name","value":"dataSheet"},"selectionSet":{"kind":"SelectionSet","selections":[{"kind":"Field","name":{"kind":"Name","value":"id"}},{"kind":"Field","name":{"kind":"Name","value":"code"}},{"kind":"Field","name":{"kind":"Name","value":"current"},"selectionSet":{"kind":"SelectionSet","selections":[{"kind":"Field","name":{"kind":"Name","value":"id"}},{"kind":"Field","name":{"kind":"Name","value":"number"}}]}},{"kind":"Field","name":{"kind":"Name","value":"versions"},"selectionSet":{"kind":"SelectionSet","selections":[{"kind":"Field","name":{"kind":"Name","value":"id"}},{"kind":"Field","name":{"kind":"Name","value":"number"}},{"kind":"Field","name":{"kind":"Name","value":"status"}}]}}]}}]}}]} as unknown as DocumentNode<PairsQuery, PairsQueryVariables>;
export const SeriesListDocument = {"kind":"Document","definitions":[{"kind":"OperationDefinition","operation":"query","name":{"kind":"Name","value":"SeriesList"},"variableDefinitions":[{"kind":"VariableDefinition","variable":{"kind":"Variable","name":{"kind":"Name","value":"status"}},"type":{"kind":"ListType","type":{"kind":"NonNullType","type":{"kind":"NamedType","name":{"kind":"Name","value":"SeriesStatus"}}}}},{"kind":"VariableDefinition","variable":{"kind":"Variable","name":{"kind":"Name","value":"mine"}},"type":{"kind":"NonNullType","type":{"kind":"NamedType","name":{"kind":"Name","value":"Boolean"}}}},{"kind":"VariableDefinition","variable":{"kind":"Variable","name":{"kind":"Name","value":"after"}},"type":{"kind":"NamedType","name":{"kind":"Name","value":"String"}}}],"selectionSet":{"kind":"SelectionSet","selections":[{"kind":"Field","name":{"kind":"Name","value":"allSeries"},"arguments":[{"kind":"Argument","name":{"kind":"Name","value":"status"},"value":{"kind":"Variable","name":{"kind":"Name","value":"status"}}},{"kind":"Argument","name":{"kind":"Name","value":"mine"},"value":{"kind":"Variable","name":{"kind":"Name","value":"mine"}}},{"kind":"Argument","name":{"kind":"Name","value":"first"},"value":{"kind":"IntValue","value":"50"}},{"kind":"Argument","name":{"kind":"Name","value":"after"},"value":{"kind":"Variable","name":{"kind":"Name","value":"after"}}}],"selectionSet":{"kind":"SelectionSet","selections":[{"kind":"Field","name":{"kind":"Name","value":"totalCount"}},{"kind":"Field","name":{"kind":"Name","value":"pageInfo"},"selectionSet":{"kind":"SelectionSet","selections":[{"kind":"Field","name":{"kind":"Name","value":"hasNextPage"}},{"kind":"Field","name":{"kind":"Name","value":"endCursor"}}]}},{"kind":"Field","name":{"kind":"Name","value":"edges"},"selectionSet":{"kind":"SelectionSet","selections":[{"kind":"Field","name":{"kind":"Name","value":"node"},"selectionSet":{"kind":"SelectionSet","selections":[{"kind":"FragmentSpread","name":{"kind":"Name","value":"SeriesRow"}}]}}]}}]}}]}},{"kind":"FragmentDefinition","name":{"kind":"Name","value":"SeriesRow"},"typeCondition":{"kind":"NamedType","name":{"kind":"Name","value":"Series"}},"selectionSet":{"kind":"SelectionSet","selections":[{"kind":"Field","name":{"kind":"Name","value":"id"}},{"kind":"Field","name":{"kind":"Name","value":"title"}},{"kind":"Field","name":{"kind":"Name","value":"status"}},{"kind":"Field","name":{"kind":"Name","value":"method"}},{"kind":"Field","name":{"kind":"Name","value":"createdAt"}},{"kind":"Field","name":{"kind":"Name","value":"createdBy"},"selectionSet":{"kind":"SelectionSet","selections":[{"kind":"Field","name":{"kind":"Name","value":"id"}},{"kind":"Field","name":{"kind":"Name","value":"name"}}]}},{"kind":"Field","name":{"kind":"Name","value":"pair"},"selectionSet":{"kind":"SelectionSet","selections":[{"kind":"Field","name":{"kind":"Name","value":"id"}},{"kind":"Field","name":{"kind":"Name","value":"substances"},"selectionSet":{"kind":"SelectionSet","selections":[{"kind":"Field","name":{"kind":"Name","value":"id"}},{"kind":"Field","name":{"kind":"Name","value":"name"}}]}}]}},{"kind":"Field","name":{"kind":"Name","value":"points"},"selectionSet":{"kind":"SelectionSet","selections":[{"kind":"Field","name":{"kind":"Name","value":"id"}},{"kind":"Field","name":{"kind":"Name","value":"temperature"}}]}}]}}]} as unknown as DocumentNode<SeriesListQuery, SeriesListQueryVariables>;
export const OneSeriesDocument = {"kind":"Document","definitions":[{"kind":"OperationDefinition","operation":"query","name":{"kind":"Name","value":"OneSeries"},"variableDefinitions":[{"kind":"VariableDefinition","variable":{"kind":"Variable","name":{"kind":"Name","value":"id"}},"type":{"kind":"NonNullType","type":{"kind":"NamedType","name":{"kind":"Name","value":"ID"}}}}],"selectionSet":{"kind":"SelectionSet","selections":[{"kind":"Field","name":{"kind":"Name","value":"oneSeries"},"arguments":[{"kind":"Argument","name":{"kind":"Name","value":"id"},"value":{"kind":"Variable","name":{"kind":"Name","value":"id"}}}],"selectionSet":{"kind":"SelectionSet","selections":[{"kind":"FragmentSpread","name":{"kind":"Name","value":"SeriesDetail"}}]}}]}},{"kind":"FragmentDefinition","name":{"kind":"Name","value":"SeriesDetail"},"typeCondition":{"kind":"NamedType","name":{"kind":"Name","value":"Series"}},"selectionSet":{"kind":"SelectionSet","selections":[{"kind":"Field","name":{"kind":"Name","value":"id"}},{"kind":"Field","name":{"kind":"Name","value":"title"}},{"kind":"Field","name":{"kind":"Name","value":"status"}},{"kind":"Field","name":{"kind":"Name","value":"source"}},{"kind":"Field","name":{"kind":"Name","value":"method"}},{"kind":"Field","name":{"kind":"Name","value":"apparatus"}},{"kind":"Field","name":{"kind":"Name","value":"dataOrigin"}},{"kind":"Field","name":{"kind":"Name","value":"commonRelativeUncertainty"}},{"kind":"Field","name":{"kind":"Name","value":"createdAt"}},{"kind":"Field","name":{"kind":"Name","value":"lockVersion"}},{"kind":"Field","name":{"kind":"Name","value":"createdBy"},"selectionSet":{"kind":"SelectionSet","selections":[{"kind":"Field","name":{"kind":"Name","value":"id"}},{"kind":"Field","name":{"kind":"Name","value":"name"}}]}},{"kind":"Field","name":{"kind":"Name","value":"submittedBy"},"selectionSet":{"kind":"SelectionSet","selections":[{"kind":"Field","name":{"kind":"Name","value":"id"}},{"kind":"Field","name":{"kind":"Name","value":"name"}}]}},{"kind":"Field","name":{"kind":"Name","value":"sameDataAs"},"selectionSet":{"kind":"SelectionSet","selections":[{"kind":"Field","name":{"kind":"Name","value":"id"}},{"kind":"Field","name":{"kind":"Name","value":"title"}}]}},{"kind":"Field","name":{"kind":"Name","value":"pair"},"selectionSet":{"kind":"SelectionSet","selections":[{"kind":"Field","name":{"kind":"Name","value":"id"}},{"kind":"Field","name":{"kind":"Name","value":"substances"},"selectionSet":{"kind":"SelectionSet","selections":[{"kind":"Field","name":{"kind":"Name","value":"id"}},{"kind":"Field","name":{"kind":"Name","value":"name"}}]}}]}},{"kind":"Field","name":{"kind":"Name","value":"warnings"},"selectionSet":{"kind":"SelectionSet","selections":[{"kind":"Field","name":{"kind":"Name","value":"code"}},{"kind":"Field","name":{"kind":"Name","value":"message"}},{"kind":"Field","name":{"kind":"Name","value":"path"}}]}},{"kind":"Field","name":{"kind":"Name","value":"events"},"selectionSet":{"kind":"SelectionSet","selections":[{"kind":"Field","name":{"kind":"Name","value":"action"}},{"kind":"Field","name":{"kind":"Name","value":"status"}},{"kind":"Field","name":{"kind":"Name","value":"remark"}},{"kind":"Field","name":{"kind":"Name","value":"at"}},{"kind":"Field","name":{"kind":"Name","value":"person"},"selectionSet":{"kind":"SelectionSet","selections":[{"kind":"Field","name":{"kind":"Name","value":"id"}},{"kind":"Field","name":{"kind":"Name","value":"name"}}]}}]}},{"kind":"Field","name":{"kind":"Name","value":"points"},"selectionSet":{"kind":"SelectionSet","selections":[{"kind":"Field","name":{"kind":"Name","value":"id"}},{"kind":"Field","name":{"kind":"Name","value":"temperature"}},{"kind":"Field","name":{"kind":"Name","value":"pressure"}},{"kind":"Field","name":{"kind":"Name","value":"pressureOrigin"}},{"kind":"Field","name":{"kind":"Name","value":"diffusivity"}},{"kind":"Field","name":{"kind":"Name","value":"diffusivityUncertainty"}},{"kind":"Field","name":{"kind":"Name","value":"uncertaintyOrigin"}},{"kind":"Field","name":{"kind":"Name","value":"temperatureUncertainty"}},{"kind":"Field","name":{"kind":"Name","value":"pressureUncertainty"}},{"kind":"Field","name":{"kind":"Name","value":"moleFraction"}},{"kind":"Field","name":{"kind":"Name","value":"replicates"}}]}}]}}]} as unknown as DocumentNode<OneSeriesQuery, OneSeriesQueryVariables>;
export const SeriesSurroundingsDocument = {"kind":"Document","definitions":[{"kind":"OperationDefinition","operation":"query","name":{"kind":"Name","value":"SeriesSurroundings"},"variableDefinitions":[{"kind":"VariableDefinition","variable":{"kind":"Variable","name":{"kind":"Name","value":"pairId"}},"type":{"kind":"NonNullType","type":{"kind":"NamedType","name":{"kind":"Name","value":"ID"}}}},{"kind":"VariableDefinition","variable":{"kind":"Variable","name":{"kind":"Name","value":"temperatures"}},"type":{"kind":"NonNullType","type":{"kind":"NamedType","name":{"kind":"Name","value":"FloatColumn"}}}},{"kind":"VariableDefinition","variable":{"kind":"Variable","name":{"kind":"Name","value":"pressure"}},"type":{"kind":"NonNullType","type":{"kind":"NamedType","name":{"kind":"Name","value":"Float"}}}}],"selectionSet":{"kind":"SelectionSet","selections":[{"kind":"Field","name":{"kind":"Name","value":"pairById"},"arguments":[{"kind":"Argument","name":{"kind":"Name","value":"id"},"value":{"kind":"Variable","name":{"kind":"Name","value":"pairId"}}}],"selectionSet":{"kind":"SelectionSet","selections":[{"kind":"Field","name":{"kind":"Name","value":"id"}},{"kind":"Field","name":{"kind":"Name","value":"series"},"arguments":[{"kind":"Argument","name":{"kind":"Name","value":"first"},"value":{"kind":"IntValue","value":"100"}}],"selectionSet":{"kind":"SelectionSet","selections":[{"kind":"Field","name":{"kind":"Name","value":"edges"},"selectionSet":{"kind":"SelectionSet","selections":[{"kind":"Field","name":{"kind":"Name","value":"node"},"selectionSet":{"kind":"SelectionSet","selections":[{"kind":"Field","name":{"kind":"Name","value":"id"}}]}}]}}]}},{"kind":"Field","name":{"kind":"Name","value":"estimates"},"arguments":[{"kind":"Argument","name":{"kind":"Name","value":"temperatures"},"value":{"kind":"Variable","name":{"kind":"Name","value":"temperatures"}}},{"kind":"Argument","name":{"kind":"Name","value":"pressure"},"value":{"kind":"Variable","name":{"kind":"Name","value":"pressure"}}}],"selectionSet":{"kind":"SelectionSet","selections":[{"kind":"Field","name":{"kind":"Name","value":"label"}},{"kind":"Field","name":{"kind":"Name","value":"diffusivities"}}]}}]}}]}}]} as unknown as DocumentNode<SeriesSurroundingsQuery, SeriesSurroundingsQueryVariables>;
export const SubmitSeriesDocument = {"kind":"Document","definitions":[{"kind":"OperationDefinition","operation":"mutation","name":{"kind":"Name","value":"SubmitSeries"},"variableDefinitions":[{"kind":"VariableDefinition","variable":{"kind":"Variable","name":{"kind":"Name","value":"id"}},"type":{"kind":"NonNullType","type":{"kind":"NamedType","name":{"kind":"Name","value":"ID"}}}}],"selectionSet":{"kind":"SelectionSet","selections":[{"kind":"Field","name":{"kind":"Name","value":"submitSeries"},"arguments":[{"kind":"Argument","name":{"kind":"Name","value":"id"},"value":{"kind":"Variable","name":{"kind":"Name","value":"id"}}}],"selectionSet":{"kind":"SelectionSet","selections":[{"kind":"FragmentSpread","name":{"kind":"Name","value":"SeriesOutcome"}}]}}]}},{"kind":"FragmentDefinition","name":{"kind":"Name","value":"SeriesDetail"},"typeCondition":{"kind":"NamedType","name":{"kind":"Name","value":"Series"}},"selectionSet":{"kind":"SelectionSet","selections":[{"kind":"Field","name":{"kind":"Name","value":"id"}},{"kind":"Field","name":{"kind":"Name","value":"title"}},{"kind":"Field","name":{"kind":"Name","value":"status"}},{"kind":"Field","name":{"kind":"Name","value":"source"}},{"kind":"Field","name":{"kind":"Name","value":"method"}},{"kind":"Field","name":{"kind":"Name","value":"apparatus"}},{"kind":"Field","name":{"kind":"Name","value":"dataOrigin"}},{"kind":"Field","name":{"kind":"Name","value":"commonRelativeUncertainty"}},{"kind":"Field","name":{"kind":"Name","value":"createdAt"}},{"kind":"Field","name":{"kind":"Name","value":"lockVersion"}},{"kind":"Field","name":{"kind":"Name","value":"createdBy"},"selectionSet":{"kind":"SelectionSet","selections":[{"kind":"Field","name":{"kind":"Name","value":"id"}},{"kind":"Field","name":{"kind":"Name","value":"name"}}]}},{"kind":"Field","name":{"kind":"Name","value":"submittedBy"},"selectionSet":{"kind":"SelectionSet","selections":[{"kind":"Field","name":{"kind":"Name","value":"id"}},{"kind":"Field","name":{"kind":"Name","value":"name"}}]}},{"kind":"Field","name":{"kind":"Name","value":"sameDataAs"},"selectionSet":{"kind":"SelectionSet","selections":[{"kind":"Field","name":{"kind":"Name","value":"id"}},{"kind":"Field","name":{"kind":"Name","value":"title"}}]}},{"kind":"Field","name":{"kind":"Name","value":"pair"},"selectionSet":{"kind":"SelectionSet","selections":[{"kind":"Field","name":{"kind":"Name","value":"id"}},{"kind":"Field","name":{"kind":"Name","value":"substances"},"selectionSet":{"kind":"SelectionSet","selections":[{"kind":"Field","name":{"kind":"Name","value":"id"}},{"kind":"Field","name":{"kind":"Name","value":"name"}}]}}]}},{"kind":"Field","name":{"kind":"Name","value":"warnings"},"selectionSet":{"kind":"SelectionSet","selections":[{"kind":"Field","name":{"kind":"Name","value":"code"}},{"kind":"Field","name":{"kind":"Name","value":"message"}},{"kind":"Field","name":{"kind":"Name","value":"path"}}]}},{"kind":"Field","name":{"kind":"Name","value":"events"},"selectionSet":{"kind":"SelectionSet","selections":[{"kind":"Field","name":{"kind":"Name","value":"action"}},{"kind":"Field","name":{"kind":"Name","value":"status"}},{"kind":"Field","name":{"kind":"Name","value":"remark"}},{"kind":"Field","name":{"kind":"Name","value":"at"}},{"kind":"Field","name":{"kind":"Name","value":"person"},"selectionSet":{"kind":"SelectionSet","selections":[{"kind":"Field","name":{"kind":"Name","value":"id"}},{"kind":"Field","name":{"kind":"Name","value":"name"}}]}}]}},{"kind":"Field","name":{"kind":"Name","value":"points"},"selectionSet":{"kind":"SelectionSet","selections":[{"kind":"Field","name":{"kind":"Name","value":"id"}},{"kind":"Field","name":{"kind":"Name","value":"temperature"}},{"kind":"Field","name":{"kind":"Name","value":"pressure"}},{"kind":"Field","name":{"kind":"Name","value":"pressureOrigin"}},{"kind":"Field","name":{"kind":"Name","value":"diffusivity"}},{"kind":"Field","name":{"kind":"Name","value":"diffusivityUncertainty"}},{"kind":"Field","name":{"kind":"Name","value":"uncertaintyOrigin"}},{"kind":"Field","name":{"kind":"Name","value":"temperatureUncertainty"}},{"kind":"Field","name":{"kind":"Name","value":"pressureUncertainty"}},{"kind":"Field","name":{"kind":"Name","value":"moleFraction"}},{"kind":"Field","name":{"kind":"Name","value":"replicates"}}]}}]}},{"kind":"FragmentDefinition","name":{"kind":"Name","value":"SeriesOutcome"},"typeCondition":{"kind":"NamedType","name":{"kind":"Name","value":"SeriesPayload"}},"selectionSet":{"kind":"SelectionSet","selections":[{"kind":"Field","name":{"kind":"Name","value":"problems"},"selectionSet":{"kind":"SelectionSet","selections":[{"kind":"Field","name":{"kind":"Name","value":"code"}},{"kind":"Field","name":{"kind":"Name","value":"message"}},{"kind":"Field","name":{"kind":"Name","value":"path"}}]}},{"kind":"Field","name":{"kind":"Name","value":"series"},"selectionSet":{"kind":"SelectionSet","selections":[{"kind":"FragmentSpread","name":{"kind":"Name","value":"SeriesDetail"}}]}}]}}]} as unknown as DocumentNode<SubmitSeriesMutation, SubmitSeriesMutationVariables>;
export const AcceptSeriesDocument = {"kind":"Document","definitions":[{"kind":"OperationDefinition","operation":"mutation","name":{"kind":"Name","value":"AcceptSeries"},"variableDefinitions":[{"kind":"VariableDefinition","variable":{"kind":"Variable","name":{"kind":"Name","value":"id"}},"type":{"kind":"NonNullType","type":{"kind":"NamedType","name":{"kind":"Name","value":"ID"}}}}],"selectionSet":{"kind":"SelectionSet","selections":[{"kind":"Field","name":{"kind":"Name","value":"acceptSeries"},"arguments":[{"kind":"Argument","name":{"kind":"Name","value":"id"},"value":{"kind":"Variable","name":{"kind":"Name","value":"id"}}}],"selectionSet":{"kind":"SelectionSet","selections":[{"kind":"FragmentSpread","name":{"kind":"Name","value":"SeriesOutcome"}}]}}]}},{"kind":"FragmentDefinition","name":{"kind":"Name","value":"SeriesDetail"},"typeCondition":{"kind":"NamedType","name":{"kind":"Name","value":"Series"}},"selectionSet":{"kind":"SelectionSet","selections":[{"kind":"Field","name":{"kind":"Name","value":"id"}},{"kind":"Field","name":{"kind":"Name","value":"title"}},{"kind":"Field","name":{"kind":"Name","value":"status"}},{"kind":"Field","name":{"kind":"Name","value":"source"}},{"kind":"Field","name":{"kind":"Name","value":"method"}},{"kind":"Field","name":{"kind":"Name","value":"apparatus"}},{"kind":"Field","name":{"kind":"Name","value":"dataOrigin"}},{"kind":"Field","name":{"kind":"Name","value":"commonRelativeUncertainty"}},{"kind":"Field","name":{"kind":"Name","value":"createdAt"}},{"kind":"Field","name":{"kind":"Name","value":"lockVersion"}},{"kind":"Field","name":{"kind":"Name","value":"createdBy"},"selectionSet":{"kind":"SelectionSet","selections":[{"kind":"Field","name":{"kind":"Name","value":"id"}},{"kind":"Field","name":{"kind":"Name","value":"name"}}]}},{"kind":"Field","name":{"kind":"Name","value":"submittedBy"},"selectionSet":{"kind":"SelectionSet","selections":[{"kind":"Field","name":{"kind":"Name","value":"id"}},{"kind":"Field","name":{"kind":"Name","value":"name"}}]}},{"kind":"Field","name":{"kind":"Name","value":"sameDataAs"},"selectionSet":{"kind":"SelectionSet","selections":[{"kind":"Field","name":{"kind":"Name","value":"id"}},{"kind":"Field","name":{"kind":"Name","value":"title"}}]}},{"kind":"Field","name":{"kind":"Name","value":"pair"},"selectionSet":{"kind":"SelectionSet","selections":[{"kind":"Field","name":{"kind":"Name","value":"id"}},{"kind":"Field","name":{"kind":"Name","value":"substances"},"selectionSet":{"kind":"SelectionSet","selections":[{"kind":"Field","name":{"kind":"Name","value":"id"}},{"kind":"Field","name":{"kind":"Name","value":"name"}}]}}]}},{"kind":"Field","name":{"kind":"Name","value":"warnings"},"selectionSet":{"kind":"SelectionSet","selections":[{"kind":"Field","name":{"kind":"Name","value":"code"}},{"kind":"Field","name":{"kind":"Name","value":"message"}},{"kind":"Field","name":{"kind":"Name","value":"path"}}]}},{"kind":"Field","name":{"kind":"Name","value":"events"},"selectionSet":{"kind":"SelectionSet","selections":[{"kind":"Field","name":{"kind":"Name","value":"action"}},{"kind":"Field","name":{"kind":"Name","value":"status"}},{"kind":"Field","name":{"kind":"Name","value":"remark"}},{"kind":"Field","name":{"kind":"Name","value":"at"}},{"kind":"Field","name":{"kind":"Name","value":"person"},"selectionSet":{"kind":"SelectionSet","selections":[{"kind":"Field","name":{"kind":"Name","value":"id"}},{"kind":"Field","name":{"kind":"Name","value":"name"}}]}}]}},{"kind":"Field","name":{"kind":"Name","value":"points"},"selectionSet":{"kind":"SelectionSet","selections":[{"kind":"Field","name":{"kind":"Name","value":"id"}},{"kind":"Field","name":{"kind":"Name","value":"temperature"}},{"kind":"Field","name":{"kind":"Name","value":"pressure"}},{"kind":"Field","name":{"kind":"Name","value":"pressureOrigin"}},{"kind":"Field","name":{"kind":"Name","value":"diffusivity"}},{"kind":"Field","name":{"kind":"Name","value":"diffusivityUncertainty"}},{"kind":"Field","name":{"kind":"Name","value":"uncertaintyOrigin"}},{"kind":"Field","name":{"kind":"Name","value":"temperatureUncertainty"}},{"kind":"Field","name":{"kind":"Name","value":"pressureUncertainty"}},{"kind":"Field","name":{"kind":"Name","value":"moleFraction"}},{"kind":"Field","name":{"kind":"Name","value":"replicates"}}]}}]}},{"kind":"FragmentDefinition","name":{"kind":"Name","value":"SeriesOutcome"},"typeCondition":{"kind":"NamedType","name":{"kind":"Name","value":"SeriesPayload"}},"selectionSet":{"kind":"SelectionSet","selections":[{"kind":"Field","name":{"kind":"Name","value":"problems"},"selectionSet":{"kind":"SelectionSet","selections":[{"kind":"Field","name":{"kind":"Name","value":"code"}},{"kind":"Field","name":{"kind":"Name","value":"message"}},{"kind":"Field","name":{"kind":"Name","value":"path"}}]}},{"kind":"Field","name":{"kind":"Name","value":"series"},"selectionSet":{"kind":"SelectionSet","selections":[{"kind":"FragmentSpread","name":{"kind":"Name","value":"SeriesDetail"}}]}}]}}]} as unknown as DocumentNode<AcceptSeriesMutation, AcceptSeriesMutationVariables>;
export const ReturnSeriesDocument = {"kind":"Document","definitions":[{"kind":"OperationDefinition","operation":"mutation","name":{"kind":"Name","value":"ReturnSeries"},"variableDefinitions":[{"kind":"VariableDefinition","variable":{"kind":"Variable","name":{"kind":"Name","value":"id"}},"type":{"kind":"NonNullType","type":{"kind":"NamedType","name":{"kind":"Name","value":"ID"}}}},{"kind":"VariableDefinition","variable":{"kind":"Variable","name":{"kind":"Name","value":"remark"}},"type":{"kind":"NonNullType","type":{"kind":"NamedType","name":{"kind":"Name","value":"String"}}}}],"selectionSet":{"kind":"SelectionSet","selections":[{"kind":"Field","name":{"kind":"Name","value":"returnSeries"},"arguments":[{"kind":"Argument","name":{"kind":"Name","value":"id"},"value":{"kind":"Variable","name":{"kind":"Name","value":"id"}}},{"kind":"Argument","name":{"kind":"Name","value":"remark"},"value":{"kind":"Variable","name":{"kind":"Name","value":"remark"}}}],"selectionSet":{"kind":"SelectionSet","selections":[{"kind":"FragmentSpread","name":{"kind":"Name","value":"SeriesOutcome"}}]}}]}},{"kind":"FragmentDefinition","name":{"kind":"Name","value":"SeriesDetail"},"typeCondition":{"kind":"NamedType","name":{"kind":"Name","value":"Series"}},"selectionSet":{"kind":"SelectionSet","selections":[{"kind":"Field","name":{"kind":"Name","value":"id"}},{"kind":"Field","name":{"kind":"Name","value":"title"}},{"kind":"Field","name":{"kind":"Name","value":"status"}},{"kind":"Field","name":{"kind":"Name","value":"source"}},{"kind":"Field","name":{"kind":"Name","value":"method"}},{"kind":"Field","name":{"kind":"Name","value":"apparatus"}},{"kind":"Field","name":{"kind":"Name","value":"dataOrigin"}},{"kind":"Field","name":{"kind":"Name","value":"commonRelativeUncertainty"}},{"kind":"Field","name":{"kind":"Name","value":"createdAt"}},{"kind":"Field","name":{"kind":"Name","value":"lockVersion"}},{"kind":"Field","name":{"kind":"Name","value":"createdBy"},"selectionSet":{"kind":"SelectionSet","selections":[{"kind":"Field","name":{"kind":"Name","value":"id"}},{"kind":"Field","name":{"kind":"Name","value":"name"}}]}},{"kind":"Field","name":{"kind":"Name","value":"submittedBy"},"selectionSet":{"kind":"SelectionSet","selections":[{"kind":"Field","name":{"kind":"Name","value":"id"}},{"kind":"Field","name":{"kind":"Name","value":"name"}}]}},{"kind":"Field","name":{"kind":"Name","value":"sameDataAs"},"selectionSet":{"kind":"SelectionSet","selections":[{"kind":"Field","name":{"kind":"Name","value":"id"}},{"kind":"Field","name":{"kind":"Name","value":"title"}}]}},{"kind":"Field","name":{"kind":"Name","value":"pair"},"selectionSet":{"kind":"SelectionSet","selections":[{"kind":"Field","name":{"kind":"Name","value":"id"}},{"kind":"Field","name":{"kind":"Name","value":"substances"},"selectionSet":{"kind":"SelectionSet","selections":[{"kind":"Field","name":{"kind":"Name","value":"id"}},{"kind":"Field","name":{"kind":"Name","value":"name"}}]}}]}},{"kind":"Field","name":{"kind":"Name","value":"warnings"},"selectionSet":{"kind":"SelectionSet","selections":[{"kind":"Field","name":{"kind":"Name","value":"code"}},{"kind":"Field","name":{"kind":"Name","value":"message"}},{"kind":"Field","name":{"kind":"Name","value":"path"}}]}},{"kind":"Field","name":{"kind":"Name","value":"events"},"selectionSet":{"kind":"SelectionSet","selections":[{"kind":"Field","name":{"kind":"Name","value":"action"}},{"kind":"Field","name":{"kind":"Name","value":"status"}},{"kind":"Field","name":{"kind":"Name","value":"remark"}},{"kind":"Field","name":{"kind":"Name","value":"at"}},{"kind":"Field","name":{"kind":"Name","value":"person"},"selectionSet":{"kind":"SelectionSet","selections":[{"kind":"Field","name":{"kind":"Name","value":"id"}},{"kind":"Field","name":{"kind":"Name","value":"name"}}]}}]}},{"kind":"Field","name":{"kind":"Name","value":"points"},"selectionSet":{"kind":"SelectionSet","selections":[{"kind":"Field","name":{"kind":"Name","value":"id"}},{"kind":"Field","name":{"kind":"Name","value":"temperature"}},{"kind":"Field","name":{"kind":"Name","value":"pressure"}},{"kind":"Field","name":{"kind":"Name","value":"pressureOrigin"}},{"kind":"Field","name":{"kind":"Name","value":"diffusivity"}},{"kind":"Field","name":{"kind":"Name","value":"diffusivityUncertainty"}},{"kind":"Field","name":{"kind":"Name","value":"uncertaintyOrigin"}},{"kind":"Field","name":{"kind":"Name","value":"temperatureUncertainty"}},{"kind":"Field","name":{"kind":"Name","value":"pressureUncertainty"}},{"kind":"Field","name":{"kind":"Name","value":"moleFraction"}},{"kind":"Field","name":{"kind":"Name","value":"replicates"}}]}}]}},{"kind":"FragmentDefinition","name":{"kind":"Name","value":"SeriesOutcome"},"typeCondition":{"kind":"NamedType","name":{"kind":"Name","value":"SeriesPayload"}},"selectionSet":{"kind":"SelectionSet","selections":[{"kind":"Field","name":{"kind":"Name","value":"problems"},"selectionSet":{"kind":"SelectionSet","selections":[{"kind":"Field","name":{"kind":"Name","value":"code"}},{"kind":"Field","name":{"kind":"Name","value":"message"}},{"kind":"Field","name":{"kind":"Name","value":"path"}}]}},{"kind":"Field","name":{"kind":"Name","value":"series"},"selectionSet":{"kind":"SelectionSet","selections":[{"kind":"FragmentSpread","name":{"kind":"Name","value":"SeriesDetail"}}]}}]}}]} as unknown as DocumentNode<ReturnSeriesMutation, ReturnSeriesMutationVariables>;
export const RetireSeriesDocument = {"kind":"Document","definitions":[{"kind":"OperationDefinition","operation":"mutation","name":{"kind":"Name","value":"RetireSeries"},"variableDefinitions":[{"kind":"VariableDefinition","variable":{"kind":"Variable","name":{"kind":"Name","value":"id"}},"type":{"kind":"NonNullType","type":{"kind":"NamedType","name":{"kind":"Name","value":"ID"}}}},{"kind":"VariableDefinition","variable":{"kind":"Variable","name":{"kind":"Name","value":"remark"}},"type":{"kind":"NonNullType","type":{"kind":"NamedType","name":{"kind":"Name","value":"String"}}}}],"selectionSet":{"kind":"SelectionSet","selections":[{"kind":"Field","name":{"kind":"Name","value":"retireSeries"},"arguments":[{"kind":"Argument","name":{"kind":"Name","value":"id"},"value":{"kind":"Variable","name":{"kind":"Name","value":"id"}}},{"kind":"Argument","name":{"kind":"Name","value":"remark"},"value":{"kind":"Variable","name":{"kind":"Name","value":"remark"}}}],"selectionSet":{"kind":"SelectionSet","selections":[{"kind":"FragmentSpread","name":{"kind":"Name","value":"SeriesOutcome"}}]}}]}},{"kind":"FragmentDefinition","name":{"kind":"Name","value":"SeriesDetail"},"typeCondition":{"kind":"NamedType","name":{"kind":"Name","value":"Series"}},"selectionSet":{"kind":"SelectionSet","selections":[{"kind":"Field","name":{"kind":"Name","value":"id"}},{"kind":"Field","name":{"kind":"Name","value":"title"}},{"kind":"Field","name":{"kind":"Name","value":"status"}},{"kind":"Field","name":{"kind":"Name","value":"source"}},{"kind":"Field","name":{"kind":"Name","value":"method"}},{"kind":"Field","name":{"kind":"Name","value":"apparatus"}},{"kind":"Field","name":{"kind":"Name","value":"dataOrigin"}},{"kind":"Field","name":{"kind":"Name","value":"commonRelativeUncertainty"}},{"kind":"Field","name":{"kind":"Name","value":"createdAt"}},{"kind":"Field","name":{"kind":"Name","value":"lockVersion"}},{"kind":"Field","name":{"kind":"Name","value":"createdBy"},"selectionSet":{"kind":"SelectionSet","selections":[{"kind":"Field","name":{"kind":"Name","value":"id"}},{"kind":"Field","name":{"kind":"Name","value":"name"}}]}},{"kind":"Field","name":{"kind":"Name","value":"submittedBy"},"selectionSet":{"kind":"SelectionSet","selections":[{"kind":"Field","name":{"kind":"Name","value":"id"}},{"kind":"Field","name":{"kind":"Name","value":"name"}}]}},{"kind":"Field","name":{"kind":"Name","value":"sameDataAs"},"selectionSet":{"kind":"SelectionSet","selections":[{"kind":"Field","name":{"kind":"Name","value":"id"}},{"kind":"Field","name":{"kind":"Name","value":"title"}}]}},{"kind":"Field","name":{"kind":"Name","value":"pair"},"selectionSet":{"kind":"SelectionSet","selections":[{"kind":"Field","name":{"kind":"Name","value":"id"}},{"kind":"Field","name":{"kind":"Name","value":"substances"},"selectionSet":{"kind":"SelectionSet","selections":[{"kind":"Field","name":{"kind":"Name","value":"id"}},{"kind":"Field","name":{"kind":"Name","value":"name"}}]}}]}},{"kind":"Field","name":{"kind":"Name","value":"warnings"},"selectionSet":{"kind":"SelectionSet","selections":[{"kind":"Field","name":{"kind":"Name","value":"code"}},{"kind":"Field","name":{"kind":"Name","value":"message"}},{"kind":"Field","name":{"kind":"Name","value":"path"}}]}},{"kind":"Field","name":{"kind":"Name","value":"events"},"selectionSet":{"kind":"SelectionSet","selections":[{"kind":"Field","name":{"kind":"Name","value":"action"}},{"kind":"Field","name":{"kind":"Name","value":"status"}},{"kind":"Field","name":{"kind":"Name","value":"remark"}},{"kind":"Field","name":{"kind":"Name","value":"at"}},{"kind":"Field","name":{"kind":"Name","value":"person"},"selectionSet":{"kind":"SelectionSet","selections":[{"kind":"Field","name":{"kind":"Name","value":"id"}},{"kind":"Field","name":{"kind":"Name","value":"name"}}]}}]}},{"kind":"Field","name":{"kind":"Name","value":"points"},"selectionSet":{"kind":"SelectionSet","selections":[{"kind":"Field","name":{"kind":"Name","value":"id"}},{"kind":"Field","name":{"kind":"Name","value":"temperature"}},{"kind":"Field","name":{"kind":"Name","value":"pressure"}},{"kind":"Field","name":{"kind":"Name","value":"pressureOrigin"}},{"kind":"Field","name":{"kind":"Name","value":"diffusivity"}},{"kind":"Field","name":{"kind":"Name","value":"diffusivityUncertainty"}},{"kind":"Field","name":{"kind":"Name","value":"uncertaintyOrigin"}},{"kind":"Field","name":{"kind":"Name","value":"temperatureUncertainty"}},{"kind":"Field","name":{"kind":"Name","value":"pressureUncertainty"}},{"kind":"Field","name":{"kind":"Name","value":"moleFraction"}},{"kind":"Field","name":{"kind":"Name","value":"replicates"}}]}}]}},{"kind":"FragmentDefinition","name":{"kind":"Name","value":"SeriesOutcome"},"typeCondition":{"kind":"NamedType","name":{"kind":"Name","value":"SeriesPayload"}},"selectionSet":{"kind":"SelectionSet","selections":[{"kind":"Field","name":{"kind":"Name","value":"problems"},"selectionSet":{"kind":"SelectionSet","selections":[{"kind":"Field","name":{"kind":"Name","value":"code"}},{"kind":"Field","name":{"kind":"Name","value":"message"}},{"kind":"Field","name":{"kind":"Name","value":"path"}}]}},{"kind":"Field","name":{"kind":"Name","value":"series"},"selectionSet":{"kind":"SelectionSet","selections":[{"kind":"FragmentSpread","name":{"kind":"Name","value":"SeriesDetail"}}]}}]}}]} as unknown as DocumentNode<RetireSeriesMutation, RetireSeriesMutationVariables>;
export const UpdateSeriesDocument = {"kind":"Document","definitions":[{"kind":"OperationDefinition","operation":"mutation","name":{"kind":"Name","value":"UpdateSeries"},"variableDefinitions":[{"kind":"VariableDefinition","variable":{"kind":"Variable","name":{"kind":"Name","value":"input"}},"type":{"kind":"NonNullType","type":{"kind":"NamedType","name":{"kind":"Name","value":"UpdateSeriesInput"}}}}],"selectionSet":{"kind":"SelectionSet","selections":[{"kind":"Field","name":{"kind":"Name","value":"updateSeries"},"arguments":[{"kind":"Argument","name":{"kind":"Name","value":"input"},"value":{"kind":"Variable","name":{"kind":"Name","value":"input"}}}],"selectionSet":{"kind":"SelectionSet","selections":[{"kind":"FragmentSpread","name":{"kind":"Name","value":"SeriesOutcome"}}]}}]}},{"kind":"FragmentDefinition","name":{"kind":"Name","value":"SeriesDetail"},"typeCondition":{"kind":"NamedType","name":{"kind":"Name","value":"Series"}},"selectionSet":{"kind":"SelectionSet","selections":[{"kind":"Field","name":{"kind":"Name","value":"id"}},{"kind":"Field","name":{"kind":"Name","value":"title"}},{"kind":"Field","name":{"kind":"Name","value":"status"}},{"kind":"Field","name":{"kind":"Name","value":"source"}},{"kind":"Field","name":{"kind":"Name","value":"method"}},{"kind":"Field","name":{"kind":"Name","value":"apparatus"}},{"kind":"Field","name":{"kind":"Name","value":"dataOrigin"}},{"kind":"Field","name":{"kind":"Name","value":"commonRelativeUncertainty"}},{"kind":"Field","name":{"kind":"Name","value":"createdAt"}},{"kind":"Field","name":{"kind":"Name","value":"lockVersion"}},{"kind":"Field","name":{"kind":"Name","value":"createdBy"},"selectionSet":{"kind":"SelectionSet","selections":[{"kind":"Field","name":{"kind":"Name","value":"id"}},{"kind":"Field","name":{"kind":"Name","value":"name"}}]}},{"kind":"Field","name":{"kind":"Name","value":"submittedBy"},"selectionSet":{"kind":"SelectionSet","selections":[{"kind":"Field","name":{"kind":"Name","value":"id"}},{"kind":"Field","name":{"kind":"Name","value":"name"}}]}},{"kind":"Field","name":{"kind":"Name","value":"sameDataAs"},"selectionSet":{"kind":"SelectionSet","selections":[{"kind":"Field","name":{"kind":"Name","value":"id"}},{"kind":"Field","name":{"kind":"Name","value":"title"}}]}},{"kind":"Field","name":{"kind":"Name","value":"pair"},"selectionSet":{"kind":"SelectionSet","selections":[{"kind":"Field","name":{"kind":"Name","value":"id"}},{"kind":"Field","name":{"kind":"Name","value":"substances"},"selectionSet":{"kind":"SelectionSet","selections":[{"kind":"Field","name":{"kind":"Name","value":"id"}},{"kind":"Field","name":{"kind":"Name","value":"name"}}]}}]}},{"kind":"Field","name":{"kind":"Name","value":"warnings"},"selectionSet":{"kind":"SelectionSet","selections":[{"kind":"Field","name":{"kind":"Name","value":"code"}},{"kind":"Field","name":{"kind":"Name","value":"message"}},{"kind":"Field","name":{"kind":"Name","value":"path"}}]}},{"kind":"Field","name":{"kind":"Name","value":"events"},"selectionSet":{"kind":"SelectionSet","selections":[{"kind":"Field","name":{"kind":"Name","value":"action"}},{"kind":"Field","name":{"kind":"Name","value":"status"}},{"kind":"Field","name":{"kind":"Name","value":"remark"}},{"kind":"Field","name":{"kind":"Name","value":"at"}},{"kind":"Field","name":{"kind":"Name","value":"person"},"selectionSet":{"kind":"SelectionSet","selections":[{"kind":"Field","name":{"kind":"Name","value":"id"}},{"kind":"Field","name":{"kind":"Name","value":"name"}}]}}]}},{"kind":"Field","name":{"kind":"Name","value":"points"},"selectionSet":{"kind":"SelectionSet","selections":[{"kind":"Field","name":{"kind":"Name","value":"id"}},{"kind":"Field","name":{"kind":"Name","value":"temperature"}},{"kind":"Field","name":{"kind":"Name","value":"pressure"}},{"kind":"Field","name":{"kind":"Name","value":"pressureOrigin"}},{"kind":"Field","name":{"kind":"Name","value":"diffusivity"}},{"kind":"Field","name":{"kind":"Name","value":"diffusivityUncertainty"}},{"kind":"Field","name":{"kind":"Name","value":"uncertaintyOrigin"}},{"kind":"Field","name":{"kind":"Name","value":"temperatureUncertainty"}},{"kind":"Field","name":{"kind":"Name","value":"pressureUncertainty"}},{"kind":"Field","name":{"kind":"Name","value":"moleFraction"}},{"kind":"Field","name":{"kind":"Name","value":"replicates"}}]}}]}},{"kind":"FragmentDefinition","name":{"kind":"Name","value":"SeriesOutcome"},"typeCondition":{"kind":"NamedType","name":{"kind":"Name","value":"SeriesPayload"}},"selectionSet":{"kind":"SelectionSet","selections":[{"kind":"Field","name":{"kind":"Name","value":"problems"},"selectionSet":{"kind":"SelectionSet","selections":[{"kind":"Field","name":{"kind":"Name","value":"code"}},{"kind":"Field","name":{"kind":"Name","value":"message"}},{"kind":"Field","name":{"kind":"Name","value":"path"}}]}},{"kind":"Field","name":{"kind":"Name","value":"series"},"selectionSet":{"kind":"SelectionSet","selections":[{"kind":"FragmentSpread","name":{"kind":"Name","value":"SeriesDetail"}}]}}]}}]} as unknown as DocumentNode<UpdateSeriesMutation, UpdateSeriesMutationVariables>;
export const EvaluateSheetDocument = {"kind":"Document","definitions":[{"kind":"OperationDefinition","operation":"query","name":{"kind":"Name","value":"EvaluateSheet"},"variableDefinitions":[{"kind":"VariableDefinition","variable":{"kind":"Variable","name":{"kind":"Name","value":"code"}},"type":{"kind":"NonNullType","type":{"kind":"NamedType","name":{"kind":"Name","value":"String"}}}},{"kind":"VariableDefinition","variable":{"kind":"Variable","name":{"kind":"Name","value":"number"}},"type":{"kind":"NonNullType","type":{"kind":"NamedType","name":{"kind":"Name","value":"String"}}}},{"kind":"VariableDefinition","variable":{"kind":"Variable","name":{"kind":"Name","value":"temperature"}},"type":{"kind":"NonNullType","type":{"kind":"NamedType","name":{"kind":"Name","value":"FloatColumn"}}}},{"kind":"VariableDefinition","variable":{"kind":"Variable","name":{"kind":"Name","value":"pressure"}},"type":{"kind":"NonNullType","type":{"kind":"NamedType","name":{"kind":"Name","value":"FloatColumn"}}}},{"kind":"VariableDefinition","variable":{"kind":"Variable","name":{"kind":"Name","value":"kind"}},"type":{"kind":"NonNullType","type":{"kind":"NamedType","name":{"kind":"Name","value":"UncertaintyKind"}}}}],"selectionSet":{"kind":"SelectionSet","selections":[{"kind":"Field","name":{"kind":"Name","value":"dataSheet"},"arguments":[{"kind":"Argument","name":{"kind":"Name","value":"code"},"value":{"kind":"Variable","name":{"kind":"Name","value":"code"}}}],"selectionSet":{"kind":"SelectionSet","selections":[{"kind":"Field","name":{"kind":"Name","value":"id"}},{"kind":"Field","name":{"kind":"Name","value":"version"},"arguments":[{"kind":"Argument","name":{"kind":"Name","value":"number"},"value":{"kind":"Variable","name":{"kind":"Name","value":"number"}}}],"selectionSet":{"kind":"SelectionSet","selections":[{"kind":"Field","name":{"kind":"Name","value":"id"}},{"kind":"Field","name":{"kind":"Name","value":"correlation"},"selectionSet":{"kind":"SelectionSet","selections":[{"kind":"Field","name":{"kind":"Name","value":"evaluate"},"arguments":[{"kind":"Argument","name":{"kind":"Name","value":"temperatures"},"value":{"kind":"Variable","name":{"kind":"Name","value":"temperature"}}},{"kind":"Argument","name":{"kind":"Name","value":"pressures"},"value":{"kind":"Variable","name":{"kind":"Name","value":"pressure"}}},{"kind":"Argument","name":{"kind":"Name","value":"kind"},"value":{"kind":"Variable","name":{"kind":"Name","value":"kind"}}}],"selectionSet":{"kind":"SelectionSet","selections":[{"kind":"Field","name":{"kind":"Name","value":"diffusivities"}},{"kind":"Field","name":{"kind":"Name","value":"standardUncertainties"}},{"kind":"Field","name":{"kind":"Name","value":"expandedUncertainties"}},{"kind":"Field","name":{"kind":"Name","value":"coverageFactor"}},{"kind":"Field","name":{"kind":"Name","value":"outside"}}]}}]}}]}}]}}]}}]} as unknown as DocumentNode<EvaluateSheetQuery, EvaluateSheetQueryVariables>;
export const SheetVersionDocument = {"kind":"Document","definitions":[{"kind":"OperationDefinition","operation":"query","name":{"kind":"Name","value":"SheetVersion"},"variableDefinitions":[{"kind":"VariableDefinition","variable":{"kind":"Variable","name":{"kind":"Name","value":"code"}},"type":{"kind":"NonNullType","type":{"kind":"NamedType","name":{"kind":"Name","value":"String"}}}},{"kind":"VariableDefinition","variable":{"kind":"Variable","name":{"kind":"Name","value":"number"}},"type":{"kind":"NonNullType","type":{"kind":"NamedType","name":{"kind":"Name","value":"String"}}}}],"selectionSet":{"kind":"SelectionSet","selections":[{"kind":"Field","name":{"kind":"Name","value":"dataSheet"},"arguments":[{"kind":"Argument","name":{"kind":"Name","value":"code"},"value":{"kind":"Variable","name":{"kind":"Name","value":"code"}}}],"selectionSet":{"kind":"SelectionSet","selections":[{"kind":"Field","name":{"kind":"Name","value":"id"}},{"kind":"Field","name":{"kind":"Name","value":"code"}},{"kind":"Field","name":{"kind":"Name","value":"pair"},"selectionSet":{"kind":"SelectionSet","selections":[{"kind":"Field","name":{"kind":"Name","value":"id"}}]}},{"kind":"Field","name":{"kind":"Name","value":"current"},"selectionSet":{"kind":"SelectionSet","selections":[{"kind":"Field","name":{"kind":"Name","value":"id"}},{"kind":"Field","name":{"kind":"Name","value":"number"}}]}},{"kind":"Field","name":{"kind":"Name","value":"version"},"arguments":[{"kind":"Argument","name":{"kind":"Name","value":"number"},"value":{"kind":"Variable","name":{"kind":"Name","value":"number"}}}],"selectionSet":{"kind":"SelectionSet","selections":[{"kind":"FragmentSpread","name":{"kind":"Name","value":"SheetPage"}}]}}]}}]}},{"kind":"FragmentDefinition","name":{"kind":"Name","value":"Run"},"typeCondition":{"kind":"NamedType","name":{"kind":"Name","value":"TextRun"}},"selectionSet":{"kind":"SelectionSet","selections":[{"kind":"Field","name":{"kind":"Name","value":"text"}},{"kind":"Field","name":{"kind":"Name","value":"style"}}]}},{"kind":"FragmentDefinition","name":{"kind":"Name","value":"SheetText"},"typeCondition":{"kind":"NamedType","name":{"kind":"Name","value":"SheetContent"}},"selectionSet":{"kind":"SelectionSet","selections":[{"kind":"Field","name":{"kind":"Name","value":"title"}},{"kind":"Field","name":{"kind":"Name","value":"lead"},"selectionSet":{"kind":"SelectionSet","selections":[{"kind":"FragmentSpread","name":{"kind":"Name","value":"Run"}}]}},{"kind":"Field","name":{"kind":"Name","value":"summary"}},{"kind":"Field","name":{"kind":"Name","value":"substances"},"selectionSet":{"kind":"SelectionSet","selections":[{"kind":"Field","name":{"kind":"Name","value":"name"}},{"kind":"Field","name":{"kind":"Name","value":"formula"},"selectionSet":{"kind":"SelectionSet","selections":[{"kind":"FragmentSpread","name":{"kind":"Name","value":"Run"}}]}},{"kind":"Field","name":{"kind":"Name","value":"casNumber"}},{"kind":"Field","name":{"kind":"Name","value":"molarMass"}}]}},{"kind":"Field","name":{"kind":"Name","value":"definition"},"selectionSet":{"kind":"SelectionSet","selections":[{"kind":"FragmentSpread","name":{"kind":"Name","value":"Run"}}]}},{"kind":"Field","name":{"kind":"Name","value":"uncertainty"},"selectionSet":{"kind":"SelectionSet","selections":[{"kind":"Field","name":{"kind":"Name","value":"statement"},"selectionSet":{"kind":"SelectionSet","selections":[{"kind":"FragmentSpread","name":{"kind":"Name","value":"Run"}}]}},{"kind":"Field","name":{"kind":"Name","value":"notIncluded"},"selectionSet":{"kind":"SelectionSet","selections":[{"kind":"FragmentSpread","name":{"kind":"Name","value":"Run"}}]}}]}},{"kind":"Field","name":{"kind":"Name","value":"cautions"},"selectionSet":{"kind":"SelectionSet","selections":[{"kind":"FragmentSpread","name":{"kind":"Name","value":"Run"}}]}},{"kind":"Field","name":{"kind":"Name","value":"citation"},"selectionSet":{"kind":"SelectionSet","selections":[{"kind":"Field","name":{"kind":"Name","value":"runs"},"selectionSet":{"kind":"SelectionSet","selections":[{"kind":"FragmentSpread","name":{"kind":"Name","value":"Run"}}]}},{"kind":"Field","name":{"kind":"Name","value":"plain"}},{"kind":"Field","name":{"kind":"Name","value":"doi"}}]}},{"kind":"Field","name":{"kind":"Name","value":"versions"},"selectionSet":{"kind":"SelectionSet","selections":[{"kind":"Field","name":{"kind":"Name","value":"number"}},{"kind":"Field","name":{"kind":"Name","value":"status"}},{"kind":"Field","name":{"kind":"Name","value":"word"}},{"kind":"Field","name":{"kind":"Name","value":"date"}},{"kind":"Field","name":{"kind":"Name","value":"datePrinted"}},{"kind":"Field","name":{"kind":"Name","value":"change"}},{"kind":"Field","name":{"kind":"Name","value":"isThis"}}]}},{"kind":"Field","name":{"kind":"Name","value":"sections"},"selectionSet":{"kind":"SelectionSet","selections":[{"kind":"Field","name":{"kind":"Name","value":"id"}},{"kind":"Field","name":{"kind":"Name","value":"number"}},{"kind":"Field","name":{"kind":"Name","value":"title"}}]}},{"kind":"Field","name":{"kind":"Name","value":"remarks"},"selectionSet":{"kind":"SelectionSet","selections":[{"kind":"Field","name":{"kind":"Name","value":"section"}},{"kind":"Field","name":{"kind":"Name","value":"text"}}]}},{"kind":"Field","name":{"kind":"Name","value":"margin"},"selectionSet":{"kind":"SelectionSet","selections":[{"kind":"Field","name":{"kind":"Name","value":"entries"},"selectionSet":{"kind":"SelectionSet","selections":[{"kind":"Field","name":{"kind":"Name","value":"label"},"selectionSet":{"kind":"SelectionSet","selections":[{"kind":"FragmentSpread","name":{"kind":"Name","value":"Run"}}]}},{"kind":"Field","name":{"kind":"Name","value":"value"}}]}},{"kind":"Field","name":{"kind":"Name","value":"fit"},"selectionSet":{"kind":"SelectionSet","selections":[{"kind":"FragmentSpread","name":{"kind":"Name","value":"Run"}}]}},{"kind":"Field","name":{"kind":"Name","value":"figures"},"selectionSet":{"kind":"SelectionSet","selections":[{"kind":"FragmentSpread","name":{"kind":"Name","value":"Run"}}]}},{"kind":"Field","name":{"kind":"Name","value":"series"},"selectionSet":{"kind":"SelectionSet","selections":[{"kind":"FragmentSpread","name":{"kind":"Name","value":"Run"}}]}}]}}]}},{"kind":"FragmentDefinition","name":{"kind":"Name","value":"FiguresData"},"typeCondition":{"kind":"NamedType","name":{"kind":"Name","value":"SheetFigures"}},"selectionSet":{"kind":"SelectionSet","selections":[{"kind":"Field","name":{"kind":"Name","value":"pressure"}},{"kind":"Field","name":{"kind":"Name","value":"temperatureAxis"},"selectionSet":{"kind":"SelectionSet","selections":[{"kind":"Field","name":{"kind":"Name","value":"minimum"}},{"kind":"Field","name":{"kind":"Name","value":"maximum"}}]}},{"kind":"Field","name":{"kind":"Name","value":"diffusivityAxis"},"selectionSet":{"kind":"SelectionSet","selections":[{"kind":"Field","name":{"kind":"Name","value":"minimum"}},{"kind":"Field","name":{"kind":"Name","value":"maximum"}}]}},{"kind":"Field","name":{"kind":"Name","value":"deviationAxis"},"selectionSet":{"kind":"SelectionSet","selections":[{"kind":"Field","name":{"kind":"Name","value":"minimum"}},{"kind":"Field","name":{"kind":"Name","value":"maximum"}},{"kind":"Field","name":{"kind":"Name","value":"ticks"}}]}},{"kind":"Field","name":{"kind":"Name","value":"curve"},"selectionSet":{"kind":"SelectionSet","selections":[{"kind":"Field","name":{"kind":"Name","value":"temperatures"}},{"kind":"Field","name":{"kind":"Name","value":"diffusivities"}},{"kind":"Field","name":{"kind":"Name","value":"relativeExpandedUncertainties"}},{"kind":"Field","name":{"kind":"Name","value":"relativeNewLaboratory"}},{"kind":"Field","name":{"kind":"Name","value":"firstInside"}},{"kind":"Field","name":{"kind":"Name","value":"lastInside"}}]}},{"kind":"Field","name":{"kind":"Name","value":"series"},"selectionSet":{"kind":"SelectionSet","selections":[{"kind":"Field","name":{"kind":"Name","value":"key"}},{"kind":"Field","name":{"kind":"Name","value":"mark"}},{"kind":"Field","name":{"kind":"Name","value":"title"}},{"kind":"Field","name":{"kind":"Name","value":"used"}},{"kind":"Field","name":{"kind":"Name","value":"temperatures"}},{"kind":"Field","name":{"kind":"Name","value":"reducedDiffusivities"}},{"kind":"Field","name":{"kind":"Name","value":"relativeUncertainties"}},{"kind":"Field","name":{"kind":"Name","value":"deviations"}},{"kind":"Field","name":{"kind":"Name","value":"leftOut"}}]}},{"kind":"Field","name":{"kind":"Name","value":"estimates"},"selectionSet":{"kind":"SelectionSet","selections":[{"kind":"Field","name":{"kind":"Name","value":"method"}},{"kind":"Field","name":{"kind":"Name","value":"temperatures"}},{"kind":"Field","name":{"kind":"Name","value":"deviations"}}]}},{"kind":"Field","name":{"kind":"Name","value":"diffusivityCaption"},"selectionSet":{"kind":"SelectionSet","selections":[{"kind":"FragmentSpread","name":{"kind":"Name","value":"Run"}}]}},{"kind":"Field","name":{"kind":"Name","value":"deviationCaption"},"selectionSet":{"kind":"SelectionSet","selections":[{"kind":"FragmentSpread","name":{"kind":"Name","value":"Run"}}]}}]}},{"kind":"FragmentDefinition","name":{"kind":"Name","value":"SheetSeriesRow"},"typeCondition":{"kind":"NamedType","name":{"kind":"Name","value":"SheetSeries"}},"selectionSet":{"kind":"SelectionSet","selections":[{"kind":"Field","name":{"kind":"Name","value":"key"}},{"kind":"Field","name":{"kind":"Name","value":"mark"}},{"kind":"Field","name":{"kind":"Name","value":"title"}},{"kind":"Field","name":{"kind":"Name","value":"source"}},{"kind":"Field","name":{"kind":"Name","value":"method"}},{"kind":"Field","name":{"kind":"Name","value":"pointCount"}},{"kind":"Field","name":{"kind":"Name","value":"weightedPointCount"}},{"kind":"Field","name":{"kind":"Name","value":"temperatureMinimum"}},{"kind":"Field","name":{"kind":"Name","value":"temperatureMaximum"}},{"kind":"Field","name":{"kind":"Name","value":"relativeUncertainty"}},{"kind":"Field","name":{"kind":"Name","value":"uncertaintyAssigned"}},{"kind":"Field","name":{"kind":"Name","value":"offset"}},{"kind":"Field","name":{"kind":"Name","value":"offsetStandardUncertainty"}},{"kind":"Field","name":{"kind":"Name","value":"reason"}}]}},{"kind":"FragmentDefinition","name":{"kind":"Name","value":"SheetNumbers"},"typeCondition":{"kind":"NamedType","name":{"kind":"Name","value":"SheetContent"}},"selectionSet":{"kind":"SelectionSet","selections":[{"kind":"Field","name":{"kind":"Name","value":"correlation"},"selectionSet":{"kind":"SelectionSet","selections":[{"kind":"Field","name":{"kind":"Name","value":"form"}},{"kind":"Field","name":{"kind":"Name","value":"equation"},"selectionSet":{"kind":"SelectionSet","selections":[{"kind":"Field","name":{"kind":"Name","value":"runs"},"selectionSet":{"kind":"SelectionSet","selections":[{"kind":"FragmentSpread","name":{"kind":"Name","value":"Run"}}]}},{"kind":"Field","name":{"kind":"Name","value":"numerator"},"selectionSet":{"kind":"SelectionSet","selections":[{"kind":"FragmentSpread","name":{"kind":"Name","value":"Run"}}]}},{"kind":"Field","name":{"kind":"Name","value":"denominator"},"selectionSet":{"kind":"SelectionSet","selections":[{"kind":"FragmentSpread","name":{"kind":"Name","value":"Run"}}]}},{"kind":"Field","name":{"kind":"Name","value":"bracketed"}},{"kind":"Field","name":{"kind":"Name","value":"exponent"},"selectionSet":{"kind":"SelectionSet","selections":[{"kind":"FragmentSpread","name":{"kind":"Name","value":"Run"}}]}}]}},{"kind":"Field","name":{"kind":"Name","value":"spoken"}},{"kind":"Field","name":{"kind":"Name","value":"expression"}},{"kind":"Field","name":{"kind":"Name","value":"parameters"},"selectionSet":{"kind":"SelectionSet","selections":[{"kind":"Field","name":{"kind":"Name","value":"symbol"}},{"kind":"Field","name":{"kind":"Name","value":"label"},"selectionSet":{"kind":"SelectionSet","selections":[{"kind":"FragmentSpread","name":{"kind":"Name","value":"Run"}}]}},{"kind":"Field","name":{"kind":"Name","value":"value"}},{"kind":"Field","name":{"kind":"Name","value":"standardUncertainty"}},{"kind":"Field","name":{"kind":"Name","value":"unit"}},{"kind":"Field","name":{"kind":"Name","value":"printed"}},{"kind":"Field","name":{"kind":"Name","value":"note"}}]}},{"kind":"Field","name":{"kind":"Name","value":"coefficients"},"selectionSet":{"kind":"SelectionSet","selections":[{"kind":"Field","name":{"kind":"Name","value":"label"},"selectionSet":{"kind":"SelectionSet","selections":[{"kind":"FragmentSpread","name":{"kind":"Name","value":"Run"}}]}},{"kind":"Field","name":{"kind":"Name","value":"printed"}}]}},{"kind":"Field","name":{"kind":"Name","value":"coverageFactor"}}]}},{"kind":"Field","name":{"kind":"Name","value":"range"},"selectionSet":{"kind":"SelectionSet","selections":[{"kind":"Field","name":{"kind":"Name","value":"temperatureMinimum"}},{"kind":"Field","name":{"kind":"Name","value":"temperatureMaximum"}},{"kind":"Field","name":{"kind":"Name","value":"pressureMinimum"}},{"kind":"Field","name":{"kind":"Name","value":"pressureMaximum"}},{"kind":"Field","name":{"kind":"Name","value":"pressureBasis"}},{"kind":"Field","name":{"kind":"Name","value":"sentence"},"selectionSet":{"kind":"SelectionSet","selections":[{"kind":"FragmentSpread","name":{"kind":"Name","value":"Run"}}]}}]}},{"kind":"Field","name":{"kind":"Name","value":"figures"},"selectionSet":{"kind":"SelectionSet","selections":[{"kind":"FragmentSpread","name":{"kind":"Name","value":"FiguresData"}}]}},{"kind":"Field","name":{"kind":"Name","value":"recommended"},"selectionSet":{"kind":"SelectionSet","selections":[{"kind":"Field","name":{"kind":"Name","value":"pressure"}},{"kind":"Field","name":{"kind":"Name","value":"temperatures"}},{"kind":"Field","name":{"kind":"Name","value":"diffusivities"}},{"kind":"Field","name":{"kind":"Name","value":"standardUncertainties"}},{"kind":"Field","name":{"kind":"Name","value":"expandedUncertainties"}},{"kind":"Field","name":{"kind":"Name","value":"newLaboratoryHalfWidths"}},{"kind":"Field","name":{"kind":"Name","value":"referenceRow"}},{"kind":"Field","name":{"kind":"Name","value":"note"},"selectionSet":{"kind":"SelectionSet","selections":[{"kind":"FragmentSpread","name":{"kind":"Name","value":"Run"}}]}}]}},{"kind":"Field","name":{"kind":"Name","value":"seriesUsed"},"selectionSet":{"kind":"SelectionSet","selections":[{"kind":"FragmentSpread","name":{"kind":"Name","value":"SheetSeriesRow"}}]}},{"kind":"Field","name":{"kind":"Name","value":"seriesLeftOut"},"selectionSet":{"kind":"SelectionSet","selections":[{"kind":"FragmentSpread","name":{"kind":"Name","value":"SheetSeriesRow"}}]}},{"kind":"Field","name":{"kind":"Name","value":"pointsLeftOut"},"selectionSet":{"kind":"SelectionSet","selections":[{"kind":"Field","name":{"kind":"Name","value":"seriesKey"}},{"kind":"Field","name":{"kind":"Name","value":"temperature"}},{"kind":"Field","name":{"kind":"Name","value":"pressure"}},{"kind":"Field","name":{"kind":"Name","value":"diffusivity"}},{"kind":"Field","name":{"kind":"Name","value":"deviation"}},{"kind":"Field","name":{"kind":"Name","value":"reason"}}]}},{"kind":"Field","name":{"kind":"Name","value":"estimates"},"selectionSet":{"kind":"SelectionSet","selections":[{"kind":"Field","name":{"kind":"Name","value":"temperatures"}},{"kind":"Field","name":{"kind":"Name","value":"pressure"}},{"kind":"Field","name":{"kind":"Name","value":"methods"},"selectionSet":{"kind":"SelectionSet","selections":[{"kind":"Field","name":{"kind":"Name","value":"method"}},{"kind":"Field","name":{"kind":"Name","value":"diffusivities"}},{"kind":"Field","name":{"kind":"Name","value":"deviations"}},{"kind":"Field","name":{"kind":"Name","value":"usualMeanError"}},{"kind":"Field","name":{"kind":"Name","value":"source"}}]}},{"kind":"Field","name":{"kind":"Name","value":"note"},"selectionSet":{"kind":"SelectionSet","selections":[{"kind":"FragmentSpread","name":{"kind":"Name","value":"Run"}}]}}]}}]}},{"kind":"FragmentDefinition","name":{"kind":"Name","value":"SheetPage"},"typeCondition":{"kind":"NamedType","name":{"kind":"Name","value":"DataSheetVersion"}},"selectionSet":{"kind":"SelectionSet","selections":[{"kind":"Field","name":{"kind":"Name","value":"id"}},{"kind":"Field","name":{"kind":"Name","value":"number"}},{"kind":"Field","name":{"kind":"Name","value":"status"}},{"kind":"Field","name":{"kind":"Name","value":"releasedAt"}},{"kind":"Field","name":{"kind":"Name","value":"withdrawnAt"}},{"kind":"Field","name":{"kind":"Name","value":"withdrawalReason"}},{"kind":"Field","name":{"kind":"Name","value":"contentHash"}},{"kind":"Field","name":{"kind":"Name","value":"doi"}},{"kind":"Field","name":{"kind":"Name","value":"supersededBy"},"selectionSet":{"kind":"SelectionSet","selections":[{"kind":"Field","name":{"kind":"Name","value":"id"}},{"kind":"Field","name":{"kind":"Name","value":"number"}},{"kind":"Field","name":{"kind":"Name","value":"releasedAt"}},{"kind":"Field","name":{"kind":"Name","value":"changeNote"}}]}},{"kind":"Field","name":{"kind":"Name","value":"fit"},"selectionSet":{"kind":"SelectionSet","selections":[{"kind":"Field","name":{"kind":"Name","value":"id"}},{"kind":"Field","name":{"kind":"Name","value":"statistics"},"selectionSet":{"kind":"SelectionSet","selections":[{"kind":"Field","name":{"kind":"Name","value":"betweenSeriesDeviation"}}]}}]}},{"kind":"Field","name":{"kind":"Name","value":"content"},"selectionSet":{"kind":"SelectionSet","selections":[{"kind":"FragmentSpread","name":{"kind":"Name","value":"SheetText"}},{"kind":"FragmentSpread","name":{"kind":"Name","value":"SheetNumbers"}}]}}]}}]} as unknown as DocumentNode<SheetVersionQuery, SheetVersionQueryVariables>;
export const CurrentSheetDocument = {"kind":"Document","definitions":[{"kind":"OperationDefinition","operation":"query","name":{"kind":"Name","value":"CurrentSheet"},"variableDefinitions":[{"kind":"VariableDefinition","variable":{"kind":"Variable","name":{"kind":"Name","value":"code"}},"type":{"kind":"NonNullType","type":{"kind":"NamedType","name":{"kind":"Name","value":"String"}}}}],"selectionSet":{"kind":"SelectionSet","selections":[{"kind":"Field","name":{"kind":"Name","value":"dataSheet"},"arguments":[{"kind":"Argument","name":{"kind":"Name","value":"code"},"value":{"kind":"Variable","name":{"kind":"Name","value":"code"}}}],"selectionSet":{"kind":"SelectionSet","selections":[{"kind":"Field","name":{"kind":"Name","value":"id"}},{"kind":"Field","name":{"kind":"Name","value":"code"}},{"kind":"Field","name":{"kind":"Name","value":"pair"},"selectionSet":{"kind":"SelectionSet","selections":[{"kind":"Field","name":{"kind":"Name","value":"id"}}]}},{"kind":"Field","name":{"kind":"Name","value":"current"},"selectionSet":{"kind":"SelectionSet","selections":[{"kind":"Field","name":{"kind":"Name","value":"id"}},{"kind":"Field","name":{"kind":"Name","value":"number"}}]}},{"kind":"Field","name":{"kind":"Name","value":"versions"},"selectionSet":{"kind":"SelectionSet","selections":[{"kind":"Field","name":{"kind":"Name","value":"id"}},{"kind":"Field","name":{"kind":"Name","value":"number"}},{"kind":"Field","name":{"kind":"Name","value":"status"}}]}}]}}]}}]} as unknown as DocumentNode<CurrentSheetQuery, CurrentSheetQueryVariables>;
export const SubstanceListDocument = {"kind":"Document","definitions":[{"kind":"OperationDefinition","operation":"query","name":{"kind":"Name","value":"SubstanceList"},"variableDefinitions":[{"kind":"VariableDefinition","variable":{"kind":"Variable","name":{"kind":"Name","value":"search"}},"type":{"kind":"NamedType","name":{"kind":"Name","value":"String"}}},{"kind":"VariableDefinition","variable":{"kind":"Variable","name":{"kind":"Name","value":"after"}},"type":{"kind":"NamedType","name":{"kind":"Name","value":"String"}}}],"selectionSet":{"kind":"SelectionSet","selections":[{"kind":"Field","name":{"kind":"Name","value":"substances"},"arguments":[{"kind":"Argument","name":{"kind":"Name","value":"search"},"value":{"kind":"Variable","name":{"kind":"Name","value":"search"}}},{"kind":"Argument","name":{"kind":"Name","value":"first"},"value":{"kind":"IntValue","value":"100"}},{"kind":"Argument","name":{"kind":"Name","value":"after"},"value":{"kind":"Variable","name":{"kind":"Name","value":"after"}}}],"selectionSet":{"kind":"SelectionSet","selections":[{"kind":"Field","name":{"kind":"Name","value":"totalCount"}},{"kind":"Field","name":{"kind":"Name","value":"pageInfo"},"selectionSet":{"kind":"SelectionSet","selections":[{"kind":"Field","name":{"kind":"Name","value":"hasNextPage"}},{"kind":"Field","name":{"kind":"Name","value":"endCursor"}}]}},{"kind":"Field","name":{"kind":"Name","value":"edges"},"selectionSet":{"kind":"SelectionSet","selections":[{"kind":"Field","name":{"kind":"Name","value":"node"},"selectionSet":{"kind":"SelectionSet","selections":[{"kind":"Field","name":{"kind":"Name","value":"id"}},{"kind":"Field","name":{"kind":"Name","value":"name"}},{"kind":"Field","name":{"kind":"Name","value":"formula"}},{"kind":"Field","name":{"kind":"Name","value":"casNumber"}},{"kind":"Field","name":{"kind":"Name","value":"molarMass"}},{"kind":"Field","name":{"kind":"Name","value":"synonyms"}}]}}]}}]}}]}}]} as unknown as DocumentNode<SubstanceListQuery, SubstanceListQueryVariables>;
export const SubstanceDetailDocument = {"kind":"Document","definitions":[{"kind":"OperationDefinition","operation":"query","name":{"kind":"Name","value":"SubstanceDetail"},"variableDefinitions":[{"kind":"VariableDefinition","variable":{"kind":"Variable","name":{"kind":"Name","value":"id"}},"type":{"kind":"NonNullType","type":{"kind":"NamedType","name":{"kind":"Name","value":"ID"}}}}],"selectionSet":{"kind":"SelectionSet","selections":[{"kind":"Field","name":{"kind":"Name","value":"substance"},"arguments":[{"kind":"Argument","name":{"kind":"Name","value":"ref"},"value":{"kind":"ObjectValue","fields":[{"kind":"ObjectField","name":{"kind":"Name","value":"id"},"value":{"kind":"Variable","name":{"kind":"Name","value":"id"}}}]}}],"selectionSet":{"kind":"SelectionSet","selections":[{"kind":"FragmentSpread","name":{"kind":"Name","value":"SubstanceFields"}}]}}]}},{"kind":"FragmentDefinition","name":{"kind":"Name","value":"SubstanceFields"},"typeCondition":{"kind":"NamedType","name":{"kind":"Name","value":"Substance"}},"selectionSet":{"kind":"SelectionSet","selections":[{"kind":"Field","name":{"kind":"Name","value":"id"}},{"kind":"Field","name":{"kind":"Name","value":"name"}},{"kind":"Field","name":{"kind":"Name","value":"formula"}},{"kind":"Field","name":{"kind":"Name","value":"casNumber"}},{"kind":"Field","name":{"kind":"Name","value":"molarMass"}},{"kind":"Field","name":{"kind":"Name","value":"synonyms"}},{"kind":"Field","name":{"kind":"Name","value":"inchi"}},{"kind":"Field","name":{"kind":"Name","value":"lockVersion"}},{"kind":"Field","name":{"kind":"Name","value":"composition"},"selectionSet":{"kind":"SelectionSet","selections":[{"kind":"Field","name":{"kind":"Name","value":"casNumber"}},{"kind":"Field","name":{"kind":"Name","value":"moleFraction"}}]}},{"kind":"Field","name":{"kind":"Name","value":"cautions"},"selectionSet":{"kind":"SelectionSet","selections":[{"kind":"Field","name":{"kind":"Name","value":"text"}},{"kind":"Field","name":{"kind":"Name","value":"source"}}]}},{"kind":"Field","name":{"kind":"Name","value":"constants"},"selectionSet":{"kind":"SelectionSet","selections":[{"kind":"Field","name":{"kind":"Name","value":"kind"}},{"kind":"Field","name":{"kind":"Name","value":"label"}},{"kind":"Field","name":{"kind":"Name","value":"symbol"}},{"kind":"Field","name":{"kind":"Name","value":"value"}},{"kind":"Field","name":{"kind":"Name","value":"form"}},{"kind":"Field","name":{"kind":"Name","value":"coefficients"},"selectionSet":{"kind":"SelectionSet","selections":[{"kind":"Field","name":{"kind":"Name","value":"symbol"}},{"kind":"Field","name":{"kind":"Name","value":"value"}}]}},{"kind":"Field","name":{"kind":"Name","value":"unit"}},{"kind":"Field","name":{"kind":"Name","value":"temperatureMinimum"}},{"kind":"Field","name":{"kind":"Name","value":"temperatureMaximum"}},{"kind":"Field","name":{"kind":"Name","value":"relativeUncertainty"}},{"kind":"Field","name":{"kind":"Name","value":"source"}},{"kind":"Field","name":{"kind":"Name","value":"note"}}]}}]}}]} as unknown as DocumentNode<SubstanceDetailQuery, SubstanceDetailQueryVariables>;
export const SheetsOfSubstanceDocument = {"kind":"Document","definitions":[{"kind":"OperationDefinition","operation":"query","name":{"kind":"Name","value":"SheetsOfSubstance"},"variableDefinitions":[{"kind":"VariableDefinition","variable":{"kind":"Variable","name":{"kind":"Name","value":"name"}},"type":{"kind":"NonNullType","type":{"kind":"NamedType","name":{"kind":"Name","value":"String"}}}}],"selectionSet":{"kind":"SelectionSet","selections":[{"kind":"Field","name":{"kind":"Name","value":"dataSheets"},"arguments":[{"kind":"Argument","name":{"kind":"Name","value":"search"},"value":{"kind":"Variable","name":{"kind":"Name","value":"name"}}},{"kind":"Argument","name":{"kind":"Name","value":"first"},"value":{"kind":"IntValue","value":"100"}}],"selectionSet":{"kind":"SelectionSet","selections":[{"kind":"Field","name":{"kind":"Name","value":"edges"},"selectionSet":{"kind":"SelectionSet","selections":[{"kind":"Field","name":{"kind":"Name","value":"node"},"selectionSet":{"kind":"SelectionSet","selections":[{"kind":"Field","name":{"kind":"Name","value":"id"}},{"kind":"Field","name":{"kind":"Name","value":"code"}},{"kind":"Field","name":{"kind":"Name","value":"pair"},"selectionSet":{"kind":"SelectionSet","selections":[{"kind":"Field","name":{"kind":"Name","value":"id"}},{"kind":"Field","name":{"kind":"Name","value":"substances"},"selectionSet":{"kind":"SelectionSet","selections":[{"kind":"Field","name":{"kind":"Name","value":"id"}},{"kind":"Field","name":{"kind":"Name","value":"name"}}]}}]}},{"kind":"Field","name":{"kind":"Name","value":"current"},"selectionSet":{"kind":"SelectionSet","selections":[{"kind":"Field","name":{"kind":"Name","value":"id"}},{"kind":"Field","name":{"kind":"Name","value":"number"}}]}}]}}]}}]}}]}}]} as unknown as DocumentNode<SheetsOfSubstanceQuery, SheetsOfSubstanceQueryVariables>;
export const CreateSubstanceDocument = {"kind":"Document","definitions":[{"kind":"OperationDefinition","operation":"mutation","name":{"kind":"Name","value":"CreateSubstance"},"variableDefinitions":[{"kind":"VariableDefinition","variable":{"kind":"Variable","name":{"kind":"Name","value":"input"}},"type":{"kind":"NonNullType","type":{"kind":"NamedType","name":{"kind":"Name","value":"SubstanceInput"}}}}],"selectionSet":{"kind":"SelectionSet","selections":[{"kind":"Field","name":{"kind":"Name","value":"createSubstance"},"arguments":[{"kind":"Argument","name":{"kind":"Name","value":"input"},"value":{"kind":"Variable","name":{"kind":"Name","value":"input"}}}],"selectionSet":{"kind":"SelectionSet","selections":[{"kind":"Field","name":{"kind":"Name","value":"substance"},"selectionSet":{"kind":"SelectionSet","selections":[{"kind":"FragmentSpread","name":{"kind":"Name","value":"SubstanceFields"}}]}},{"kind":"Field","name":{"kind":"Name","value":"problems"},"selectionSet":{"kind":"SelectionSet","selections":[{"kind":"Field","name":{"kind":"Name","value":"code"}},{"kind":"Field","name":{"kind":"Name","value":"message"}},{"kind":"Field","name":{"kind":"Name","value":"path"}}]}}]}}]}},{"kind":"FragmentDefinition","name":{"kind":"Name","value":"SubstanceFields"},"typeCondition":{"kind":"NamedType","name":{"kind":"Name","value":"Substance"}},"selectionSet":{"kind":"SelectionSet","selections":[{"kind":"Field","name":{"kind":"Name","value":"id"}},{"kind":"Field","name":{"kind":"Name","value":"name"}},{"kind":"Field","name":{"kind":"Name","value":"formula"}},{"kind":"Field","name":{"kind":"Name","value":"casNumber"}},{"kind":"Field","name":{"kind":"Name","value":"molarMass"}},{"kind":"Field","name":{"kind":"Name","value":"synonyms"}},{"kind":"Field","name":{"kind":"Name","value":"inchi"}},{"kind":"Field","name":{"kind":"Name","value":"lockVersion"}},{"kind":"Field","name":{"kind":"Name","value":"composition"},"selectionSet":{"kind":"SelectionSet","selections":[{"kind":"Field","name":{"kind":"Name","value":"casNumber"}},{"kind":"Field","name":{"kind":"Name","value":"moleFraction"}}]}},{"kind":"Field","name":{"kind":"Name","value":"cautions"},"selectionSet":{"kind":"SelectionSet","selections":[{"kind":"Field","name":{"kind":"Name","value":"text"}},{"kind":"Field","name":{"kind":"Name","value":"source"}}]}},{"kind":"Field","name":{"kind":"Name","value":"constants"},"selectionSet":{"kind":"SelectionSet","selections":[{"kind":"Field","name":{"kind":"Name","value":"kind"}},{"kind":"Field","name":{"kind":"Name","value":"label"}},{"kind":"Field","name":{"kind":"Name","value":"symbol"}},{"kind":"Field","name":{"kind":"Name","value":"value"}},{"kind":"Field","name":{"kind":"Name","value":"form"}},{"kind":"Field","name":{"kind":"Name","value":"coefficients"},"selectionSet":{"kind":"SelectionSet","selections":[{"kind":"Field","name":{"kind":"Name","value":"symbol"}},{"kind":"Field","name":{"kind":"Name","value":"value"}}]}},{"kind":"Field","name":{"kind":"Name","value":"unit"}},{"kind":"Field","name":{"kind":"Name","value":"temperatureMinimum"}},{"kind":"Field","name":{"kind":"Name","value":"temperatureMaximum"}},{"kind":"Field","name":{"kind":"Name","value":"relativeUncertainty"}},{"kind":"Field","name":{"kind":"Name","value":"source"}},{"kind":"Field","name":{"kind":"Name","value":"note"}}]}}]}}]} as unknown as DocumentNode<CreateSubstanceMutation, CreateSubstanceMutationVariables>;
export const UpdateSubstanceDocument = {"kind":"Document","definitions":[{"kind":"OperationDefinition","operation":"mutation","name":{"kind":"Name","value":"UpdateSubstance"},"variableDefinitions":[{"kind":"VariableDefinition","variable":{"kind":"Variable","name":{"kind":"Name","value":"input"}},"type":{"kind":"NonNullType","type":{"kind":"NamedType","name":{"kind":"Name","value":"UpdateSubstanceInput"}}}}],"selectionSet":{"kind":"SelectionSet","selections":[{"kind":"Field","name":{"kind":"Name","value":"updateSubstance"},"arguments":[{"kind":"Argument","name":{"kind":"Name","value":"input"},"value":{"kind":"Variable","name":{"kind":"Name","value":"input"}}}],"selectionSet":{"kind":"SelectionSet","selections":[{"kind":"Field","name":{"kind":"Name","value":"substance"},"selectionSet":{"kind":"SelectionSet","selections":[{"kind":"FragmentSpread","name":{"kind":"Name","value":"SubstanceFields"}}]}},{"kind":"Field","name":{"kind":"Name","value":"problems"},"selectionSet":{"kind":"SelectionSet","selections":[{"kind":"Field","name":{"kind":"Name","value":"code"}},{"kind":"Field","name":{"kind":"Name","value":"message"}},{"kind":"Field","name":{"kind":"Name","value":"path"}}]}}]}}]}},{"kind":"FragmentDefinition","name":{"kind":"Name","value":"SubstanceFields"},"typeCondition":{"kind":"NamedType","name":{"kind":"Name","value":"Substance"}},"selectionSet":{"kind":"SelectionSet","selections":[{"kind":"Field","name":{"kind":"Name","value":"id"}},{"kind":"Field","name":{"kind":"Name","value":"name"}},{"kind":"Field","name":{"kind":"Name","value":"formula"}},{"kind":"Field","name":{"kind":"Name","value":"casNumber"}},{"kind":"Field","name":{"kind":"Name","value":"molarMass"}},{"kind":"Field","name":{"kind":"Name","value":"synonyms"}},{"kind":"Field","name":{"kind":"Name","value":"inchi"}},{"kind":"Field","name":{"kind":"Name","value":"lockVersion"}},{"kind":"Field","name":{"kind":"Name","value":"composition"},"selectionSet":{"kind":"SelectionSet","selections":[{"kind":"Field","name":{"kind":"Name","value":"casNumber"}},{"kind":"Field","name":{"kind":"Name","value":"moleFraction"}}]}},{"kind":"Field","name":{"kind":"Name","value":"cautions"},"selectionSet":{"kind":"SelectionSet","selections":[{"kind":"Field","name":{"kind":"Name","value":"text"}},{"kind":"Field","name":{"kind":"Name","value":"source"}}]}},{"kind":"Field","name":{"kind":"Name","value":"constants"},"selectionSet":{"kind":"SelectionSet","selections":[{"kind":"Field","name":{"kind":"Name","value":"kind"}},{"kind":"Field","name":{"kind":"Name","value":"label"}},{"kind":"Field","name":{"kind":"Name","value":"symbol"}},{"kind":"Field","name":{"kind":"Name","value":"value"}},{"kind":"Field","name":{"kind":"Name","value":"form"}},{"kind":"Field","name":{"kind":"Name","value":"coefficients"},"selectionSet":{"kind":"SelectionSet","selections":[{"kind":"Field","name":{"kind":"Name","value":"symbol"}},{"kind":"Field","name":{"kind":"Name","value":"value"}}]}},{"kind":"Field","name":{"kind":"Name","value":"unit"}},{"kind":"Field","name":{"kind":"Name","value":"temperatureMinimum"}},{"kind":"Field","name":{"kind":"Name","value":"temperatureMaximum"}},{"kind":"Field","name":{"kind":"Name","value":"relativeUncertainty"}},{"kind":"Field","name":{"kind":"Name","value":"source"}},{"kind":"Field","name":{"kind":"Name","value":"note"}}]}}]}}]} as unknown as DocumentNode<UpdateSubstanceMutation, UpdateSubstanceMutationVariables>;