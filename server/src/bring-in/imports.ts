import { setImmediate } from 'node:timers/promises';
import { ApiError } from '../common/api-error.js';

export type ImportPhase = 'READING' | 'CHECKING' | 'STORING' | 'DONE' | 'REFUSED' | 'CANCELLED';

/** How far an import is. */
export interface ImportProgress {
  phase: ImportPhase;
  /** rows read so far */
  rows: number;
  /** once the phase is DONE */
  kept: { seriesId: string; pointCount: number } | null;
}

const REMEMBERED_MS = 60 * 60 * 1000;
const MOST_REMEMBERED = 1_000;

/** One import while it runs, and for a while after. */
export class RunningImport {
  readonly progress: ImportProgress = { phase: 'READING', rows: 0, kept: null };
  private readonly cancelling = new AbortController();
  readonly startedAt = Date.now();

  get signal(): AbortSignal {
    return this.cancelling.signal;
  }

  get isOver(): boolean {
    return ['DONE', 'REFUSED', 'CANCELLED'].includes(this.progress.phase);
  }

  /**
   * Begins a phase, after letting those be heard who ask how far it is, or cancel.
   *
   * @throws {ApiError} CONFLICT when it was cancelled meanwhile
   */
  async enter(phase: ImportPhase): Promise<void> {
    await setImmediate();
    this.signal.throwIfAborted();
    this.progress.phase = phase;
  }

  /** What is being stored is stored or not at all; it cannot be stopped half-way. */
  cancel(): void {
    if (this.progress.phase === 'STORING' || this.isOver) return;
    this.progress.phase = 'CANCELLED';
    this.cancelling.abort(new ApiError('CONFLICT', 'The import was cancelled. Nothing was stored.'));
  }
}

/** Imports by person and the id the caller gave: the same one is done once, can be followed, and survives a reload. */
export class ImportsInProgress {
  private readonly imports = new Map<string, RunningImport>();

  find(personId: string, importId: string): RunningImport | null {
    return this.imports.get(`${personId}:${importId}`) ?? null;
  }

  /** @throws {ApiError} CONFLICT when one of this id is running */
  begin(personId: string, importId: string | undefined): RunningImport {
    this.forget();
    const started = new RunningImport();
    if (importId === undefined) return started;
    if (this.find(personId, importId)?.isOver === false) {
      throw new ApiError('CONFLICT', 'This import is running already.');
    }
    this.imports.set(`${personId}:${importId}`, started);
    return started;
  }

  private forget(): void {
    const before = Date.now() - REMEMBERED_MS;
    for (const [key, { startedAt, isOver }] of this.imports) {
      if (isOver && (startedAt < before || this.imports.size > MOST_REMEMBERED)) this.imports.delete(key);
    }
  }
}
