import { type NestFastifyApplication } from '@nestjs/platform-fastify';
import { getDataSourceToken } from '@nestjs/typeorm';
import request from 'supertest';
import { type DataSource } from 'typeorm';
import { PasswordsService } from '../src/auth/passwords.service.js';
import { type RoleName } from '../src/common/viewer.js';
import { startTestApp, type TestApp } from './app.js';

export const PASSWORD = 'plum-violet-anchor-47';

export interface SignedIn {
  readonly accessToken: string;
  readonly refreshCookie: string;
  readonly deviceCookie: string;
  readonly personId: string;
}

/** Data is as untyped as supertest's bodies; tests assert on it. */
interface GraphQLAnswer {
  readonly data: request.Response['body'];
  readonly errors?: { extensions: { code: string } }[];
}

/** The whole server with what tests of accounts, mail and jobs need at hand. */
export class RunningServer {
  private constructor(
    private readonly testApp: TestApp,
    readonly dataSource: DataSource,
    private readonly passwordHash: string,
  ) {}

  static async start(settings: Record<string, string> = {}): Promise<RunningServer> {
    const testApp = await startTestApp({ LOG_LEVEL: 'silent', ...settings });
    const passwordHash = await testApp.app.get(PasswordsService, { strict: false }).hash(PASSWORD);
    const dataSource = testApp.app.get<DataSource>(getDataSourceToken(), { strict: false });
    return new RunningServer(testApp, dataSource, passwordHash);
  }

  stop(): Promise<void> {
    return this.testApp.close();
  }

  get app(): NestFastifyApplication {
    return this.testApp.app;
  }

  get dataDir(): string {
    return this.testApp.env.DIFFOLIO_DATA_DIR;
  }

  get http() {
    return request(this.app.getHttpServer());
  }

  /** @returns the id of a new person whose password is `PASSWORD` */
  async addPerson(email: string, ...roles: RoleName[]): Promise<string> {
    const [row] = await this.sql<{ id: string }>(
      'INSERT INTO people (email, name, roles, password_hash) VALUES ($1, $2, $3, $4) RETURNING id',
      [email, email.split('@')[0], roles, this.passwordHash],
    );
    return row!.id;
  }

  async signIn(email: string, password = PASSWORD): Promise<SignedIn> {
    const answer = await this.http.post('/api/auth/sign-in').send({ email, password });
    if (answer.status !== 200) throw new Error(`sign-in answered ${answer.status}: ${answer.text}`);
    return {
      accessToken: answer.body.accessToken,
      refreshCookie: cookieOf(answer, '__Host-diffolio-refresh')!,
      deviceCookie: cookieOf(answer, '__Host-diffolio-device')!,
      personId: answer.body.person.id,
    };
  }

  /** Asks over GraphQL, with an access token or an API key. */
  async ask(query: string, variables: object = {}, bearer?: string) {
    const post = this.http.post('/graphql').send({ query, variables });
    if (bearer !== undefined) void post.set('Authorization', `Bearer ${bearer}`);
    const answer = await post;
    return answer.body as GraphQLAnswer;
  }

  sql<Row>(text: string, values: unknown[] = []): Promise<Row[]> {
    return this.dataSource.query(text, values);
  }

  /** Waits until `read` finds something; jobs run within a second. */
  async eventually<T>(read: () => Promise<T | undefined>, milliseconds = 10_000): Promise<T> {
    const deadline = Date.now() + milliseconds;
    for (;;) {
      const found = await read();
      if (found !== undefined) return found;
      if (Date.now() > deadline) throw new Error('it did not happen in time');
      await new Promise((resolve) => setTimeout(resolve, 50));
    }
  }
}

/** `name=value` of a cookie that the answer sets, as a browser would send it back. */
export function cookieOf(answer: request.Response, name: string): string | undefined {
  return setCookies(answer)
    .find((cookie) => cookie.startsWith(`${name}=`))
    ?.split(';')[0];
}

export function setCookies(answer: request.Response): string[] {
  return (answer.headers['set-cookie'] as unknown as string[] | undefined) ?? [];
}

/** The code of the only error, or undefined. */
export function codeOf(answer: { errors?: { extensions: { code: string } }[] }): string | undefined {
  return answer.errors?.[0]?.extensions.code;
}
