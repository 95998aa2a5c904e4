import { mkdir } from 'node:fs/promises';
import path from 'node:path';
import { type Readable } from 'node:stream';
import {
  CreateBucketCommand,
  DeleteObjectCommand,
  GetObjectCommand,
  HeadBucketCommand,
  HeadObjectCommand,
  NoSuchKey,
  NotFound,
  PutObjectCommand,
  S3Client,
} from '@aws-sdk/client-s3';
import { Inject, Injectable, type OnApplicationShutdown, type OnModuleInit } from '@nestjs/common';
import S3rver from 's3rver';
import { ENV } from '../config/config.module.js';
import { type Env } from '../config/env.js';

const LOCAL_KEY = 'S3RVER';

export interface StoredFile {
  readonly sizeBytes: number;
  readonly mediaType: string;
}

/** Files by key, in an S3 store; where none is set, in one that runs inside this process on the data folder. */
@Injectable()
export class StorageService implements OnModuleInit, OnApplicationShutdown {
  private client: S3Client;
  private local: S3rver | undefined;

  constructor(@Inject(ENV) private readonly env: Env) {}

  async onModuleInit(): Promise<void> {
    const endpoint = this.env.S3_ENDPOINT ?? (await this.startLocalStore());
    const credentials = this.local
      ? { accessKeyId: LOCAL_KEY, secretAccessKey: LOCAL_KEY }
      : { accessKeyId: this.env.S3_ACCESS_KEY_ID, secretAccessKey: this.env.S3_SECRET_ACCESS_KEY };
    this.client = new S3Client({
      endpoint,
      region: this.env.S3_REGION,
      forcePathStyle: true,
      credentials,
      // The SDK's default trailing checksums would be stored as part of a streamed file by stores that do not know them.
      requestChecksumCalculation: 'WHEN_REQUIRED',
      responseChecksumValidation: 'WHEN_REQUIRED',
    });
    if (!this.local) await this.ensureBucket();
  }

  /** Stores a file whole; a file with that key is replaced. */
  async put(key: string, body: Buffer, mediaType: string): Promise<void> {
    await this.client.send(new PutObjectCommand({ ...this.at(key), Body: body, ContentType: mediaType }));
  }

  /** Stores a stream of known length; a file with that key is replaced. */
  async putStream(key: string, body: Readable, sizeBytes: number, mediaType: string): Promise<void> {
    const input = { ...this.at(key), Body: body, ContentLength: sizeBytes, ContentType: mediaType };
    await this.client.send(new PutObjectCommand(input));
  }

  /** The file's bytes as a stream; null when there is none. */
  async get(key: string): Promise<Readable | null> {
    const found = await orNull(() => this.client.send(new GetObjectCommand(this.at(key))));
    return found ? (found.Body as Readable) : null;
  }

  async head(key: string): Promise<StoredFile | null> {
    const found = await orNull(() => this.client.send(new HeadObjectCommand(this.at(key))));
    if (!found) return null;
    return { sizeBytes: found.ContentLength ?? 0, mediaType: found.ContentType ?? 'application/octet-stream' };
  }

  async exists(key: string): Promise<boolean> {
    return (await this.head(key)) !== null;
  }

  /** Takes a file away; one that is not there is no error. */
  async remove(key: string): Promise<void> {
    await this.client.send(new DeleteObjectCommand(this.at(key)));
  }

  /** @throws when the store does not answer; for the readiness check */
  async ping(): Promise<void> {
    await this.client.send(new HeadBucketCommand({ Bucket: this.env.S3_BUCKET }));
  }

  async onApplicationShutdown(): Promise<void> {
    this.client.destroy();
    await this.local?.close();
  }

  private at(key: string): { Bucket: string; Key: string } {
    return { Bucket: this.env.S3_BUCKET, Key: key };
  }

  private async startLocalStore(): Promise<string> {
    const directory = path.resolve(this.env.DIFFOLIO_DATA_DIR, 'files');
    await mkdir(directory, { recursive: true, mode: 0o700 });
    const configureBuckets = [{ name: this.env.S3_BUCKET }];
    this.local = new S3rver({ address: '127.0.0.1', port: 0, silent: true, directory, configureBuckets });
    const { port } = await this.local.run();
    return `http://127.0.0.1:${port}`;
  }

  private async ensureBucket(): Promise<void> {
    const bucket = { Bucket: this.env.S3_BUCKET };
    const found = await orNull(() => this.client.send(new HeadBucketCommand(bucket)));
    if (!found) await this.client.send(new CreateBucketCommand(bucket));
  }
}

async function orNull<T>(ask: () => Promise<T>): Promise<T | null> {
  try {
    return await ask();
  } catch (error) {
    if (error instanceof NoSuchKey || error instanceof NotFound) return null;
    throw error;
  }
}
