import { seedLibrary } from '../seeds/seed-library.js';
import { type Problem } from '../src/common/problem.js';
import { type RoleName } from '../src/common/viewer.js';
import { codeOf, PASSWORD, RunningServer } from './running-server.js';

export { PASSWORD };

/** Somebody who uses the API: a visitor, or a person signed in. */
export class Actor {
  constructor(
    readonly server: RunningServer,
    readonly id: string,
    readonly email: string,
    readonly token: string | undefined,
  ) {}

  /** @returns the data of the answer; a GraphQL error fails the test */
  async ask(query: string, variables: object = {}) {
    const { data, errors } = await this.server.ask(query, variables, this.token);
    if (errors) throw new Error(JSON.stringify(errors));
    return data!;
  }

  /** @returns the code of the GraphQL error, or undefined where there is none */
  async codeOf(query: string, variables: object = {}): Promise<string | undefined> {
    return codeOf(await this.server.ask(query, variables, this.token));
  }
}

/** A group's server with the starter library, and its people. */
export class Group {
  private constructor(readonly server: RunningServer) {}

  static async start(): Promise<Group> {
    const server = await RunningServer.start();
    await seedLibrary(server.dataSource);
    return new Group(server);
  }

  stop(): Promise<void> {
    return this.server.stop();
  }

  get visitor(): Actor {
    return new Actor(this.server, '', '', undefined);
  }

  /** A new person with these roles, signed in. */
  async join(name: string, ...roles: RoleName[]): Promise<Actor> {
    const email = `${name}@group.example`;
    const id = await this.server.addPerson(email, ...roles);
    const { accessToken } = await this.server.signIn(email);
    return new Actor(this.server, id, email, accessToken);
  }
}

export type Point = readonly [temperature: number, diffusivity: number, pressure?: number];

/** Points at 101 325 Pa, unless they say otherwise, with u(D) of 2 %. */
export function pointsOf(points: readonly Point[]) {
  return points.map(([temperature, diffusivity, pressure = 101_325]) => ({
    temperature,
    pressure,
    diffusivity,
    diffusivityUncertainty: 0.02 * diffusivity,
  }));
}

/** Invented, on a power law of argon and helium with n = 1.7, give or take 1 %. */
export const INVENTED_POINTS: readonly Point[] = [
  [280, 6.63e-5],
  [320, 8.24e-5],
  [360, 1.012e-4],
  [400, 1.2e-4],
  [440, 1.424e-4],
];

export const SERIES_INPUT = {
  a: { name: 'argon' },
  b: { name: 'helium' },
  title: 'Invented series',
  source: 'Notebook of an invented laboratory',
  method: 'Loschmidt tube',
  points: pointsOf(INVENTED_POINTS),
};

const PROBLEMS = 'problems { code message path }';

export const CREATE_SERIES = `mutation ($input: CreateSeriesInput!) { createSeries(input: $input) {
  series { id status lockVersion title pair { id } warnings { code message path } } ${PROBLEMS} } }`;
export const UPDATE_SERIES = `mutation ($input: UpdateSeriesInput!) { updateSeries(input: $input) {
  series { id status lockVersion title } ${PROBLEMS} } }`;
export const SUBMIT_SERIES = `mutation ($id: ID!) { submitSeries(id: $id) { series { id status } ${PROBLEMS} } }`;
export const ACCEPT_SERIES = `mutation ($id: ID!) { acceptSeries(id: $id) { series { id status } ${PROBLEMS} } }`;
export const RETURN_SERIES = `mutation ($id: ID!, $remark: String!) { returnSeries(id: $id, remark: $remark) {
  series { id status } ${PROBLEMS} } }`;
export const RETIRE_SERIES = `mutation ($id: ID!, $remark: String!) { retireSeries(id: $id, remark: $remark) {
  series { id status } ${PROBLEMS} } }`;
export const FIT = `mutation ($input: FitCorrelationInput!) { fitCorrelation(input: $input) {
  fit { id warnings { code message path } statistics { pointCount seriesCount betweenSeriesDeviation betweenSeriesOrigin }
    correlation { form parameters { symbol value standardUncertainty unit } covariance } series { id }
    excludedPoints { reason point { id } series { id } } } ${PROBLEMS} } }`;
export const DRAFT = `mutation ($input: DraftDataSheetInput!) { draftDataSheet(input: $input) {
  version { id number status lockVersion sheet { id code } } ${PROBLEMS} } }`;
export const UPDATE_DRAFT = `mutation ($input: UpdateDraftInput!) { updateDraft(input: $input) {
  version { id number status summary lockVersion } ${PROBLEMS} } }`;
export const SUBMIT_VERSION = `mutation ($id: ID!) { submitForReview(versionId: $id) {
  version { id status lockVersion } ${PROBLEMS} } }`;
export const REVIEW = `mutation ($input: RecordReviewInput!) { recordReview(input: $input) {
  version { id status reviewedBy { id } } ${PROBLEMS} } }`;
export const RELEASE = `mutation ($id: ID!, $password: String!) { releaseDataSheet(versionId: $id, password: $password) {
  version { id number status contentHash previousHash doi releasedAt releasedBy { id } sheet { id code } } ${PROBLEMS} } }`;
export const WITHDRAW = `mutation ($id: ID!, $reason: String!, $password: String!) {
  withdrawDataSheet(versionId: $id, reason: $reason, password: $password) {
    version { id status withdrawnAt withdrawalReason } ${PROBLEMS} } }`;

/** What a builder made: its id, and whatever else its mutation asks for. */
export type Made = NonNullable<Awaited<ReturnType<RunningServer['ask']>>['data']>;

interface Payload {
  readonly problems: readonly Problem[];
  /** Null where problems refused it */
  readonly made: unknown;
}

/** What the only mutation of an answer gave. */
function payloadOf(data: Made): Payload {
  const { problems, ...rest } = Object.values(data)[0] as Payload & Record<string, unknown>;
  return { problems, made: Object.values(rest)[0] };
}

/** Runs a mutation that must succeed. @returns the object of its payload */
export async function done(actor: Actor, mutation: string, variables: object): Promise<Made> {
  const { problems, made } = payloadOf(await actor.ask(mutation, variables));
  if (problems.length > 0 || made === null) throw new Error(JSON.stringify(problems));
  return made as Made;
}

/** Runs a mutation that must be refused with problems. @returns `CODE path` of each */
export async function problemsOf(actor: Actor, mutation: string, variables: object): Promise<string[]> {
  const { problems, made } = payloadOf(await actor.ask(mutation, variables));
  if (made !== null) throw new Error('the mutation gave an object where problems were expected');
  return problems.map(({ code, path }) => (path ? `${code} ${path}` : code));
}

/** The people who carry a sheet through, nobody acting twice where two are asked for. */
export interface Crew {
  readonly researcher: Actor;
  readonly editor: Actor;
  readonly reviewer: Actor;
}

export async function crewOf(group: Group): Promise<Crew> {
  return {
    researcher: await group.join('researcher', 'RESEARCHER'),
    editor: await group.join('editor', 'EDITOR'),
    reviewer: await group.join('reviewer', 'EDITOR'),
  };
}

export const draftSeries = (researcher: Actor, input: object = {}): Promise<Made> =>
  done(researcher, CREATE_SERIES, { input: { ...SERIES_INPUT, ...input } });

export async function submittedSeries(researcher: Actor, input: object = {}): Promise<Made> {
  const series = await draftSeries(researcher, input);
  await done(researcher, SUBMIT_SERIES, { id: series.id });
  return series;
}

export async function acceptedSeries({ researcher, editor }: Crew, input: object = {}): Promise<Made> {
  const series = await submittedSeries(researcher, input);
  await done(editor, ACCEPT_SERIES, { id: series.id });
  return series;
}

export const fitted = (actor: Actor, pairId: string, input: object = {}): Promise<Made> =>
  done(actor, FIT, { input: { pairId, form: 'POWER_LAW', ...input } });

export const drafted = (editor: Actor, fitId: string, input: object = {}): Promise<Made> =>
  done(editor, DRAFT, { input: { fitId, summary: 'Invented for a test.', changeNote: 'Invented.', ...input } });

export async function inReview(editor: Actor, fitId: string): Promise<Made> {
  const version = await drafted(editor, fitId);
  return done(editor, SUBMIT_VERSION, { id: version.id });
}

export async function approved({ editor, reviewer }: Crew, fitId: string): Promise<Made> {
  const version = await inReview(editor, fitId);
  return done(reviewer, REVIEW, { input: { versionId: version.id, verdict: 'APPROVE', remark: 'It holds.' } });
}

export async function released(crew: Crew, fitId: string): Promise<Made> {
  const version = await approved(crew, fitId);
  return done(crew.reviewer, RELEASE, { id: version.id, password: PASSWORD });
}
