import { Body, Controller, Delete, Get, Header, HttpCode, Param, Post, Req, Res } from '@nestjs/common';
import { type FastifyReply, type FastifyRequest } from 'fastify';
import { SignedInMay } from '../common/access.decorators.js';
import { ApiError } from '../common/api-error.js';
import { isId } from '../common/graphql/node.js';
import { CurrentViewer, type Viewer } from '../common/viewer.js';
import { AccountsService } from './accounts.service.js';
import { ChangePasswordBody, readBody } from './auth.bodies.js';
import { refusal, sayingWhen } from './auth.controller.js';
import { refreshTokenOf } from './auth-cookies.js';
import { type SessionEntry, SessionsService } from './sessions.service.js';

/** A person's own password and sessions. The refresh cookie only tells which session is the one that asks. */
@Controller('api/auth')
@SignedInMay()
export class OwnAccountController {
  constructor(
    private readonly accounts: AccountsService,
    private readonly sessions: SessionsService,
  ) {}

  /** Ends all other sessions. */
  @Post('change-password')
  @HttpCode(204)
  @Header('Cache-Control', 'no-store')
  async changePassword(
    @CurrentViewer() viewer: Viewer,
    @Body() body: unknown,
    @Req() request: FastifyRequest,
    @Res({ passthrough: true }) reply: FastifyReply,
  ): Promise<void> {
    const { currentPassword, password } = readBody(ChangePasswordBody, body);
    const kept = await this.currentSession(request);
    const outcome = await sayingWhen(reply, () =>
      this.accounts.changePassword(viewer.id, currentPassword, password, kept),
    );
    if (!outcome.ok) throw refusal(outcome.problems);
  }

  @Get('sessions')
  @Header('Cache-Control', 'no-store')
  async list(
    @CurrentViewer() viewer: Viewer,
    @Req() request: FastifyRequest,
  ): Promise<(SessionEntry & { current: boolean })[]> {
    const current = await this.currentSession(request);
    const sessions = await this.sessions.ofPerson(viewer.id);
    return sessions.map((session) => ({ ...session, current: session.id === current }));
  }

  @Delete('sessions/:id')
  @HttpCode(204)
  async end(@CurrentViewer() viewer: Viewer, @Param('id') id: string): Promise<void> {
    const ended = isId(id) && (await this.sessions.end(viewer.id, id));
    if (!ended) throw new ApiError('NOT_FOUND', 'You have no such session.');
  }

  private async currentSession(request: FastifyRequest): Promise<string | null> {
    const token = refreshTokenOf(request);
    return token === undefined ? null : this.sessions.idOf(token);
  }
}
