import { Inject, Injectable, type OnApplicationShutdown, type OnModuleInit } from '@nestjs/common';
import { createTransport, type Transporter } from 'nodemailer';
import { type EntityManager } from 'typeorm';
import { ENV } from '../config/config.module.js';
import { type Env } from '../config/env.js';
import { jobQueue } from '../jobs/job-queue.js';
import { JobsService } from '../jobs/jobs.service.js';
import { type Letter, renderLetter } from './letters.js';
import { MailCaptureService } from './mail-capture.service.js';

const SMTP_TIMEOUT_MS = 10_000;
const ONCE_IN_SECONDS = 24 * 3600;

/** Retried for about two days: 30 s, 1 min, 2 min, … */
const MAIL = jobQueue<Letter>('mail.send', { expireInSeconds: 30, retryLimit: 12, retryDelaySeconds: 30 });

/** Letters go out after the commit of what they tell about, through the job queue. */
@Injectable()
export class MailService implements OnModuleInit, OnApplicationShutdown {
  private transport: Transporter | undefined;

  constructor(
    @Inject(ENV) private readonly env: Env,
    private readonly jobs: JobsService,
    private readonly capture: MailCaptureService,
  ) {}

  async onModuleInit(): Promise<void> {
    const url = this.env.SMTP_URL ?? (await this.capture.listen());
    const timeouts = {
      connectionTimeout: SMTP_TIMEOUT_MS,
      greetingTimeout: SMTP_TIMEOUT_MS,
      socketTimeout: SMTP_TIMEOUT_MS,
    };
    this.transport = createTransport({ url, ...timeouts, disableFileAccess: true, disableUrlAccess: true });
    await this.jobs.work(MAIL, ({ id, data }) => this.deliver(data, id));
  }

  /**
   * Sends a letter once the caller's transaction commits.
   *
   * @param letter    with `dedupeKey`, one letter with that key is sent a day, however often it is asked for
   * @throws {RangeError} for an address that is none
   */
  async enqueue(manager: EntityManager, { dedupeKey, ...letter }: Letter & { dedupeKey?: string }): Promise<void> {
    renderLetter(letter);
    const once = dedupeKey === undefined ? {} : { key: dedupeKey, onceInSeconds: ONCE_IN_SECONDS };
    await this.jobs.send(manager, MAIL, letter, once);
  }

  /**
   * Hands a letter to the mail server now; for job handlers.
   *
   * @param jobId makes the Message-ID, which stays the same when the job runs again, so that a mail reader drops the double
   */
  async deliver(letter: Letter, jobId: string): Promise<void> {
    if (!this.transport) throw new Error('mail is not ready yet');
    const host = /@([^\s>]+)>?\s*$/.exec(this.env.MAIL_FROM)?.[1] ?? 'localhost.invalid';
    await this.transport.sendMail({
      from: this.env.MAIL_FROM,
      ...renderLetter(letter),
      messageId: `<${jobId}@${host}>`,
      headers: { 'Auto-Submitted': 'auto-generated' },
    });
  }

  onApplicationShutdown(): void {
    this.transport?.close();
  }
}
