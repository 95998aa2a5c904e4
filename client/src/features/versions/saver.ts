/** How what was typed stands to what is stored. */
export type SaveState =
  | { readonly kind: 'saved'; readonly at: Date | null }
  | { readonly kind: 'dirty' }
  | { readonly kind: 'saving' }
  | { readonly kind: 'incomplete' }
  | { readonly kind: 'conflict' }
  | { readonly kind: 'failed'; readonly why: string };

export type SaveOutcome =
  /** `seen` is the count of changes that this save left behind. */
  | { readonly kind: 'saved'; readonly seen: number }
  | { readonly kind: 'conflict' }
  | { readonly kind: 'failed'; readonly why: string };

interface Work<V> {
  /** What is typed, or null while something in it is missing. */
  readonly read: () => Promise<V | null>;
  /** Stores it, as a change of the state with that count of changes; never throws. */
  readonly save: (values: V, seen: number) => Promise<SaveOutcome>;
  readonly tell: (state: SaveState) => void;
}

/** Saves one state after another: never two at once, what is typed during a save after it, and nothing after a conflict. */
export class Saver<V> {
  private running: Promise<boolean> | null = null;
  private dirty = false;
  private stopped = false;

  /** @param seen the count of changes of the state that writing began with */
  constructor(
    private readonly work: Work<V>,
    private seen: number,
  ) {}

  get isDirty(): boolean {
    return this.dirty;
  }

  /** Something was typed. */
  touch(): void {
    if (this.stopped) return;
    this.dirty = true;
    this.work.tell({ kind: 'dirty' });
  }

  /** Stores what is not stored yet; true when everything is. */
  async saveNow(): Promise<boolean> {
    while (this.running !== null) await this.running;
    if (this.stopped) return false;
    if (!this.dirty) return true;
    this.running = this.saveOnce();
    const stored = await this.running;
    this.running = null;
    return stored && this.dirty ? this.saveNow() : stored;
  }

  private async saveOnce(): Promise<boolean> {
    const values = await this.work.read();
    if (values === null) {
      this.work.tell({ kind: 'incomplete' });
      return false;
    }
    this.dirty = false;
    this.work.tell({ kind: 'saving' });
    const outcome = await this.work.save(values, this.seen);
    if (outcome.kind === 'saved') {
      this.seen = outcome.seen;
      this.work.tell(this.dirty ? { kind: 'dirty' } : { kind: 'saved', at: new Date() });
      return true;
    }
    this.dirty = true;
    this.stopped = outcome.kind === 'conflict';
    this.work.tell(outcome);
    return false;
  }
}
