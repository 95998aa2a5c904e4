/** Runs at most `most` tasks at a time, the others in turn, and refuses once `longestQueue` of them wait. */
export class ConcurrencyLimit {
  private running = 0;
  private readonly waiting: (() => void)[] = [];

  constructor(
    private readonly most: number,
    private readonly longestQueue: number,
    private readonly refusal: () => Error,
  ) {}

  async run<T>(task: () => Promise<T>): Promise<T> {
    if (this.running >= this.most) {
      if (this.waiting.length >= this.longestQueue) throw this.refusal();
      await new Promise<void>((resolve) => this.waiting.push(resolve));
    } else {
      this.running += 1;
    }
    try {
      return await task();
    } finally {
      // A waiting task takes over the place, so that none can slip in between.
      const next = this.waiting.shift();
      if (next) next();
      else this.running -= 1;
    }
  }
}
