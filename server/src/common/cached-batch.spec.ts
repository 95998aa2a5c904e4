import { describe, expect, it, jest } from '@jest/globals';
import { cachedBatch } from './cached-batch.js';

const rows = (ids: readonly string[]) => Promise.resolve(ids.map((id) => ({ id })));

describe('cachedBatch', () => {
  it('asks for what it does not know, and only once', async () => {
    const load = jest.fn(rows);
    const batch = cachedBatch({ max: 10 }, load);
    await batch(['a', 'b']);
    expect(await batch(['b', 'c', 'c', 'a'])).toEqual([{ id: 'b' }, { id: 'c' }, { id: 'c' }, { id: 'a' }]);
    expect(load.mock.calls).toEqual([[['a', 'b']], [['c']]]);
  });

  it('asks again for what it was told to forget', async () => {
    const load = jest.fn(rows);
    const batch = cachedBatch({ max: 10 }, load);
    await batch(['a']);
    batch.forget('a');
    await batch(['a']);
    expect(load).toHaveBeenCalledTimes(2);
  });

  it('remembers no error and nothing that must not be kept', async () => {
    const load = jest.fn((ids: readonly string[]) =>
      Promise.resolve(ids.map((id) => (id === 'missing' ? new Error(id) : { id }))),
    );
    const batch = cachedBatch<{ id: string }>({ max: 10, keep: (value) => value.id !== 'open' }, load);
    await batch(['missing', 'open']);
    const [missing] = await batch(['missing', 'open']);
    expect(missing).toBeInstanceOf(Error);
    expect(load).toHaveBeenCalledTimes(2);
  });
});
