/** What a DOI is registered with. */
export interface DoiMetadata {
  /** Where the DOI leads: the page of the released version. */
  readonly url: string;
  readonly title: string;
  readonly creators: readonly string[];
  readonly publisher: string;
  readonly publicationYear: number;
  /** edition.revision */
  readonly version: string;
  /** The DOI of the version that this one supersedes. */
  readonly supersedes: string | null;
}

/** Port to whoever registers DOIs. Registering the same DOI again brings its metadata up to date. */
export abstract class DoiRegistrar {
  /** @throws when the registrar refuses or does not answer; the caller tries again later */
  abstract register(doi: string, metadata: DoiMetadata): Promise<void>;
}
