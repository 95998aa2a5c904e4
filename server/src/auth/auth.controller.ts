import {
  Body,
  Controller,
  GoneException,
  Header,
  HttpCode,
  Post,
  Req,
  Res,
  UnprocessableEntityException,
} from '@nestjs/common';
import { type FastifyReply, type FastifyRequest } from 'fastify';
import { AnyoneMay } from '../common/access.decorators.js';
import { ApiError } from '../common/api-error.js';
import { type Problem } from '../common/problem.js';
import { WithoutBearer } from './access.guard.js';
import { AccountTokensService, type TokenHolder } from './account-tokens.service.js';
import { AccountsService, type LinkOutcome } from './accounts.service.js';
import {
  AcceptInvitationBody,
  EmailBody,
  FirstAdministratorBody,
  ResetPasswordBody,
  SignInBody,
  TokenBody,
  readBody,
} from './auth.bodies.js';
import { clearRefreshToken, deviceTokenOf, refreshTokenOf } from './auth-cookies.js';
import { FirstAdministratorService } from './first-administrator.service.js';
import { type SessionAnswer, SessionAnswersService } from './session-answers.service.js';
import { SessionsService } from './sessions.service.js';
import { SignInService } from './sign-in.service.js';
import { POLICIES, addressOf } from './throttle-rules.js';
import { ThrottleService, TooManyAttempts } from './throttle.service.js';

/** Getting in, staying in, getting out. Cookies count here and nowhere else. */
@Controller('api/auth')
@AnyoneMay()
@WithoutBearer()
export class AuthController {
  constructor(
    private readonly signIns: SignInService,
    private readonly sessions: SessionsService,
    private readonly answers: SessionAnswersService,
    private readonly accounts: AccountsService,
    private readonly tokens: AccountTokensService,
    private readonly firstAdministrator: FirstAdministratorService,
    private readonly throttle: ThrottleService,
  ) {}

  @Post('sign-in')
  @HttpCode(200)
  @Header('Cache-Control', 'no-store')
  async signIn(
    @Body() body: unknown,
    @Req() request: FastifyRequest,
    @Res({ passthrough: true }) reply: FastifyReply,
  ): Promise<SessionAnswer> {
    const attempt = { ...readBody(SignInBody, body), address: request.ip, deviceToken: deviceTokenOf(request) };
    const session = await sayingWhen(reply, () => this.signIns.signIn(attempt));
    if (!session) throw new ApiError('UNAUTHENTICATED', 'E-mail and password do not belong together.');
    return this.answers.begin(session, request, reply);
  }

  @Post('refresh')
  @HttpCode(200)
  @Header('Cache-Control', 'no-store')
  async refresh(
    @Req() request: FastifyRequest,
    @Res({ passthrough: true }) reply: FastifyReply,
  ): Promise<SessionAnswer> {
    const token = refreshTokenOf(request);
    const session = token === undefined ? null : await this.sessions.rotate(token);
    if (!session) {
      if (token !== undefined) clearRefreshToken(reply);
      throw new ApiError('UNAUTHENTICATED', 'There is no session to continue. Sign in again.');
    }
    return this.answers.carryOn(session, reply);
  }

  @Post('sign-out')
  @HttpCode(204)
  @Header('Cache-Control', 'no-store')
  async signOut(@Req() request: FastifyRequest, @Res({ passthrough: true }) reply: FastifyReply): Promise<void> {
    const token = refreshTokenOf(request);
    if (token !== undefined) await this.sessions.endByToken(token);
    clearRefreshToken(reply);
  }

  /** What an invitation offers, for the page that its link opens; the invitation stays good. */
  @Post('invitation')
  @HttpCode(200)
  @Header('Cache-Control', 'no-store')
  async invitation(@Body() body: unknown): Promise<Omit<TokenHolder, 'personId' | 'name'>> {
    const holder = await this.tokens.holderOf(readBody(TokenBody, body).token, 'INVITATION');
    if (!holder) throw linkIsGone();
    const { email, roles, invitedBy, expiresAt } = holder;
    return { email, roles, invitedBy, expiresAt };
  }

  @Post('accept-invitation')
  @HttpCode(200)
  @Header('Cache-Control', 'no-store')
  async acceptInvitation(
    @Body() body: unknown,
    @Req() request: FastifyRequest,
    @Res({ passthrough: true }) reply: FastifyReply,
  ): Promise<SessionAnswer> {
    const { token, name, password } = readBody(AcceptInvitationBody, body);
    const personId = personOf(await this.accounts.acceptInvitation(token, name, password));
    return this.answers.begin(await this.sessions.open(personId), request, reply);
  }

  @Post('first-administrator')
  @HttpCode(200)
  @Header('Cache-Control', 'no-store')
  async createFirstAdministrator(
    @Body() body: unknown,
    @Req() request: FastifyRequest,
    @Res({ passthrough: true }) reply: FastifyReply,
  ): Promise<SessionAnswer> {
    const { token, ...person } = readBody(FirstAdministratorBody, body);
    const personId = personOf(await this.firstAdministrator.create(token, person));
    return this.answers.begin(await this.sessions.open(personId), request, reply);
  }

  /** The same answer, as fast, whether or not there is such an account. */
  @Post('request-password-reset')
  @HttpCode(202)
  @Header('Cache-Control', 'no-store')
  async requestPasswordReset(
    @Body() body: unknown,
    @Req() request: FastifyRequest,
    @Res({ passthrough: true }) reply: FastifyReply,
  ): Promise<void> {
    const { email } = readBody(EmailBody, body);
    const throttle = { key: `reset-from:${addressOf(request.ip)}`, policy: POLICIES.address };
    await sayingWhen(reply, () => this.throttle.count([throttle]));
    await this.accounts.requestPasswordReset(email);
  }

  @Post('reset-password')
  @HttpCode(204)
  @Header('Cache-Control', 'no-store')
  async resetPassword(@Body() body: unknown, @Res({ passthrough: true }) reply: FastifyReply): Promise<void> {
    const { token, password } = readBody(ResetPasswordBody, body);
    personOf(await this.accounts.resetPassword(token, password));
    clearRefreshToken(reply);
  }
}

/** Puts `Retry-After` beside a refusal that passes. */
export async function sayingWhen<T>(reply: FastifyReply, attempt: () => Promise<T>): Promise<T> {
  try {
    return await attempt();
  } catch (error) {
    if (error instanceof TooManyAttempts) void reply.header('Retry-After', error.retryAfterSeconds);
    throw error;
  }
}

function linkIsGone(): GoneException {
  return new GoneException('This link has been used, has been replaced by a newer one, or is too old.');
}

/** Problems of a form sent over HTTP: 422, with the same `problems` as in GraphQL. */
export function refusal(problems: readonly Problem[]): UnprocessableEntityException {
  return new UnprocessableEntityException({ message: problems.map(({ message }) => message).join(' '), problems });
}

function personOf(outcome: LinkOutcome): string {
  if (!outcome) throw linkIsGone();
  if (!outcome.ok) throw refusal(outcome.problems);
  return outcome.value.personId;
}
