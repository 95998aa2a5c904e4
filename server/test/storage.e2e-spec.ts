import { createHash, randomBytes } from 'node:crypto';
import { Readable } from 'node:stream';
import { buffer } from 'node:stream/consumers';
import { afterAll, beforeAll, describe, expect, it } from '@jest/globals';
import { StorageService } from '../src/storage/storage.service.js';
import { RunningServer } from './running-server.js';

const sha256 = (bytes: Buffer) => createHash('sha256').update(bytes).digest('hex');

describe('the file store', () => {
  let server: RunningServer;
  let storage: StorageService;

  beforeAll(async () => {
    server = await RunningServer.start();
    storage = server.app.get(StorageService, { strict: false });
  });
  afterAll(() => server.stop());

  it.each([0, 1, 24_989, 3 * 1024 * 1024])('gives back %i bytes as they came', async (size) => {
    const bytes = randomBytes(size);
    await storage.put(`bytes/${size}`, bytes, 'application/octet-stream');

    expect(sha256(await buffer((await storage.get(`bytes/${size}`))!))).toBe(sha256(bytes));
    expect(await storage.head(`bytes/${size}`)).toEqual({ sizeBytes: size, mediaType: 'application/octet-stream' });
  });

  it('stores a stream without anything added to it', async () => {
    const bytes = randomBytes(24_989);
    await storage.putStream(
      'stream',
      Readable.from([bytes.subarray(0, 10_000), bytes.subarray(10_000)]),
      24_989,
      'text/csv',
    );

    expect(await storage.head('stream')).toEqual({ sizeBytes: 24_989, mediaType: 'text/csv' });
    expect(sha256(await buffer((await storage.get('stream'))!))).toBe(sha256(bytes));
  });

  it('replaces a file of the same key', async () => {
    await storage.put('replaced', Buffer.from('first, and longer'), 'text/plain');
    await storage.put('replaced', Buffer.from('second'), 'text/plain');

    expect((await buffer((await storage.get('replaced'))!)).toString()).toBe('second');
  });

  it('has nothing under a key that was never used', async () => {
    expect(await storage.get('never/used')).toBeNull();
    expect(await storage.head('never/used')).toBeNull();
    expect(await storage.exists('never/used')).toBe(false);
  });

  it('answers that it is there', async () => {
    await expect(storage.ping()).resolves.toBeUndefined();
  });
});
