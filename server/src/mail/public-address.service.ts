import { type Server } from 'node:http';
import { Inject, Injectable } from '@nestjs/common';
import { HttpAdapterHost } from '@nestjs/core';
import { ENV } from '../config/config.module.js';
import { type Env } from '../config/env.js';

/** The address at which readers find this server: as set, else where it listens. */
@Injectable()
export class PublicAddressService {
  constructor(
    @Inject(ENV) private readonly env: Env,
    private readonly adapter: HttpAdapterHost,
  ) {}

  /** @returns such as `https://sheets.example`, without a slash at the end */
  get origin(): string {
    if (this.env.PUBLIC_URL) return this.env.PUBLIC_URL.replace(/\/+$/, '');
    const bound = (this.adapter.httpAdapter.getHttpServer() as Server).address();
    const port = typeof bound === 'object' && bound ? bound.port : this.env.PORT;
    return `http://${this.env.HOST.includes(':') ? `[${this.env.HOST}]` : this.env.HOST}:${port}`;
  }

  /** @param path from the root, beginning with a slash */
  linkTo(path: string): string {
    return `${this.origin}${path}`;
  }
}
