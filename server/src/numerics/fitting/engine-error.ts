/** Something the caller can mend; the codes are those of the API. */
export interface EngineProblem {
  code: 'NOT_DETERMINABLE' | 'NOT_AVAILABLE' | 'BAD_INPUT';
  message: string;
  path: string | null;
}

/** A refusal raised where no outcome can be returned; its message is fit for a person. */
export class EngineError extends Error {
  constructor(
    readonly code: EngineProblem['code'],
    message: string,
    readonly path: string | null = null,
  ) {
    super(message);
    this.name = 'EngineError';
  }

  asProblem(): EngineProblem {
    return { code: this.code, message: this.message, path: this.path };
  }
}
