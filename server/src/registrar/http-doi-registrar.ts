import { type DoiMetadata, DoiRegistrar } from './doi-registrar.js';

const TIMEOUT_MS = 10_000;
const RESOURCE_TYPE = { resourceTypeGeneral: 'Dataset', resourceType: 'Data sheet' };

/** Registers over HTTP: `PUT {base}/dois/{doi}` with a JSON:API document in the terms of the DataCite metadata schema 4. */
export class HttpDoiRegistrar extends DoiRegistrar {
  private readonly base: string;
  private readonly authorization: string | undefined;

  /** @param address the registrar's base URL; a user and password in it are sent as Basic credentials */
  constructor(address: string) {
    super();
    const url = new URL(address);
    if (url.username) {
      const credentials = `${decodeURIComponent(url.username)}:${decodeURIComponent(url.password)}`;
      this.authorization = `Basic ${Buffer.from(credentials).toString('base64')}`;
    }
    this.base = `${url.origin}${url.pathname.replace(/\/$/, '')}`;
  }

  async register(doi: string, metadata: DoiMetadata): Promise<void> {
    const answer = await fetch(`${this.base}/dois/${encodeURIComponent(doi)}`, {
      method: 'PUT',
      headers: {
        'content-type': 'application/vnd.api+json',
        ...(this.authorization !== undefined && { authorization: this.authorization }),
      },
      body: JSON.stringify(toDocument(doi, metadata)),
      redirect: 'error',
      signal: AbortSignal.timeout(TIMEOUT_MS),
    });
    await answer.body?.cancel();
    if (!answer.ok) throw new Error(`the DOI registrar answered ${answer.status} for ${doi}`);
  }
}

function toDocument(doi: string, metadata: DoiMetadata): object {
  const { url, title, creators, publisher, publicationYear, version, supersedes } = metadata;
  const relatedIdentifiers = supersedes
    ? [{ relatedIdentifier: supersedes, relatedIdentifierType: 'DOI', relationType: 'IsNewVersionOf' }]
    : [];
  const attributes = {
    doi,
    event: 'publish',
    url,
    titles: [{ title }],
    creators: creators.map((name) => ({ name })),
    publisher,
    publicationYear,
    version,
    types: RESOURCE_TYPE,
    relatedIdentifiers,
  };
  return { data: { id: doi, type: 'dois', attributes } };
}
