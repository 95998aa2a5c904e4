import { describe, expect, it } from 'vitest';
import { Saver, type SaveOutcome, type SaveState } from './saver';

function aSaver(outcomes: (SaveOutcome | Promise<SaveOutcome>)[]) {
  const typed = { text: '' as string | null };
  const stored: string[] = [];
  const states: SaveState['kind'][] = [];
  const seen: number[] = [];
  const saver = new Saver<string>(
    {
      read: () => Promise.resolve(typed.text),
      save: (text, count) => {
        stored.push(text);
        seen.push(count);
        return Promise.resolve(outcomes.shift() ?? { kind: 'saved', seen: count + 1 });
      },
      tell: ({ kind }) => states.push(kind),
    },
    7,
  );
  const type = (text: string | null) => {
    typed.text = text;
    saver.touch();
  };
  return { saver, type, stored, states, seen };
}

describe('saving while one writes', () => {
  it('stores what was typed, and nothing when nothing was', async () => {
    const { saver, type, stored, states } = aSaver([]);
    expect(await saver.saveNow()).toBe(true);
    type('six series');
    expect(await saver.saveNow()).toBe(true);
    expect(stored).toEqual(['six series']);
    expect(states).toEqual(['dirty', 'saving', 'saved']);
  });

  it('stores what was typed during a save after it, one at a time', async () => {
    let finish = (_: SaveOutcome) => {};
    const { saver, type, stored, seen } = aSaver([new Promise<SaveOutcome>((resolve) => (finish = resolve))]);
    type('first');
    const done = saver.saveNow();
    await Promise.resolve();
    await Promise.resolve();
    type('second');
    expect(stored).toEqual(['first']);
    finish({ kind: 'saved', seen: 8 });
    expect(await done).toBe(true);
    expect(stored).toEqual(['first', 'second']);
    expect(seen).toEqual([7, 8]);
    expect(saver.isDirty).toBe(false);
  });

  it('stores nothing while something is missing', async () => {
    const { saver, type, stored, states } = aSaver([]);
    type(null);
    expect(await saver.saveNow()).toBe(false);
    expect(stored).toEqual([]);
    expect(states.at(-1)).toBe('incomplete');
  });

  it('tries again after a failure', async () => {
    const { saver, type, stored } = aSaver([{ kind: 'failed', why: 'no connection' }]);
    type('words');
    expect(await saver.saveNow()).toBe(false);
    expect(saver.isDirty).toBe(true);
    expect(await saver.saveNow()).toBe(true);
    expect(stored).toEqual(['words', 'words']);
  });

  it('overwrites nothing after somebody else changed the same', async () => {
    const { saver, type, stored, states } = aSaver([{ kind: 'conflict' }]);
    type('mine');
    expect(await saver.saveNow()).toBe(false);
    type('mine, longer');
    expect(await saver.saveNow()).toBe(false);
    expect(stored).toEqual(['mine']);
    expect(states.at(-1)).toBe('conflict');
  });
});
