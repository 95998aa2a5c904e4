import { ConcurrencyLimit } from './concurrency-limit.js';

describe('a concurrency limit', () => {
  const refusal = () => new Error('full');
  const tick = () => new Promise<void>((resolve) => setImmediate(resolve));

  it('runs no more tasks at a time than it says, and all of them in the end', async () => {
    const limit = new ConcurrencyLimit(4, 100, refusal);
    let running = 0;
    let most = 0;
    const results = await Promise.all(
      Array.from({ length: 30 }, (_, i) =>
        limit.run(async () => {
          running += 1;
          most = Math.max(most, running);
          await tick();
          running -= 1;
          return i;
        }),
      ),
    );

    expect(most).toBe(4);
    expect(results).toEqual(Array.from({ length: 30 }, (_, i) => i));
  });

  it('refuses once too many wait, and takes tasks again when they are done', async () => {
    const limit = new ConcurrencyLimit(1, 1, refusal);
    const first = limit.run(tick);
    const second = limit.run(tick);

    await expect(limit.run(tick)).rejects.toThrow('full');
    await Promise.all([first, second]);
    await expect(limit.run(async () => Promise.resolve('done'))).resolves.toBe('done');
  });

  it('gives the place of a failed task to the next one', async () => {
    const limit = new ConcurrencyLimit(1, 10, refusal);
    const failing = limit.run(() => Promise.reject(new Error('broken')));
    const next = limit.run(() => Promise.resolve('fine'));

    await expect(failing).rejects.toThrow('broken');
    await expect(next).resolves.toBe('fine');
  });
});
