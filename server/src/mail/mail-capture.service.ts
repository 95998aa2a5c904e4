import { randomBytes } from 'node:crypto';
import { mkdir, readdir, readFile, rename, writeFile } from 'node:fs/promises';
import { type AddressInfo } from 'node:net';
import path from 'node:path';
import { buffer } from 'node:stream/consumers';
import { Inject, Injectable, type OnApplicationShutdown } from '@nestjs/common';
import { SMTPServer, type SMTPServerDataStream } from 'smtp-server';
import { ENV } from '../config/config.module.js';
import { type Env } from '../config/env.js';
import { type CapturedMail, readCapturedMail } from './captured-mail.js';

const LARGEST_MESSAGE_BYTES = 5 * 1024 * 1024;
const NEWEST_SHOWN = 200;
const ID = /^\d{8}T\d{9}Z-[0-9a-f]{8}$/;

export interface CapturedMailEntry extends CapturedMail {
  readonly id: string;
}

/** Stands in for a mail server where none is set: it takes every message and keeps it as a file in the data folder. */
@Injectable()
export class MailCaptureService implements OnApplicationShutdown {
  private readonly folder: string;
  private server: SMTPServer | undefined;

  constructor(@Inject(ENV) private readonly env: Env) {
    this.folder = path.join(env.DIFFOLIO_DATA_DIR, 'mail');
  }

  /** Whether mail is captured here instead of being sent. */
  get isUsed(): boolean {
    return this.env.SMTP_URL === undefined;
  }

  /** Starts taking mail on a free loopback port. @returns its SMTP address */
  async listen(): Promise<string> {
    await mkdir(this.folder, { recursive: true, mode: 0o700 });
    const server = new SMTPServer({
      disabledCommands: ['AUTH', 'STARTTLS'],
      size: LARGEST_MESSAGE_BYTES,
      onData: (stream, _session, done) => {
        this.keep(stream).then(() => done(), done);
      },
    });
    // A client that breaks off is no reason to stop.
    server.on('error', () => undefined);
    await new Promise<void>((resolve, reject) => {
      server.server.once('error', reject);
      server.listen(0, '127.0.0.1', resolve);
    });
    this.server = server;
    return `smtp://127.0.0.1:${(server.server.address() as AddressInfo).port}`;
  }

  /** The newest captured messages, the newest first. */
  async list(): Promise<CapturedMailEntry[]> {
    const names = await readdir(this.folder).catch(() => []);
    const ids = names.filter((name) => name.endsWith('.eml')).map((name) => name.slice(0, -'.eml'.length));
    const newest = ids
      .filter((id) => ID.test(id))
      .sort()
      .reverse()
      .slice(0, NEWEST_SHOWN);
    return Promise.all(newest.map((id) => this.read(id)));
  }

  async find(id: string): Promise<CapturedMailEntry | null> {
    if (!ID.test(id)) return null;
    return this.read(id).catch(() => null);
  }

  async onApplicationShutdown(): Promise<void> {
    const server = this.server;
    if (server) await new Promise<void>((resolve) => server.close(() => resolve()));
  }

  private async read(id: string): Promise<CapturedMailEntry> {
    return { id, ...readCapturedMail(await readFile(path.join(this.folder, `${id}.eml`), 'latin1')) };
  }

  private async keep(stream: SMTPServerDataStream): Promise<void> {
    const message = await buffer(stream);
    if (stream.sizeExceeded) throw new Error('the message is too large');
    const id = `${new Date().toISOString().replace(/[-:.]/g, '')}-${randomBytes(4).toString('hex')}`;
    // Renamed into place, so that a reader never sees half a message.
    const target = path.join(this.folder, `${id}.eml`);
    await writeFile(`${target}.part`, message, { mode: 0o600 });
    await rename(`${target}.part`, target);
  }
}
