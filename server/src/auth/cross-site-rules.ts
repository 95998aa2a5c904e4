/** The headers by which a browser says where a request comes from. */
export interface RequestOrigin {
  readonly method: string;
  readonly host: string | undefined;
  readonly origin: string | undefined;
  /** `Sec-Fetch-Site` (W3C Fetch Metadata) */
  readonly fetchSite: string | undefined;
}

const SAFE_METHODS = new Set(['GET', 'HEAD', 'OPTIONS']);
const OWN_SITES = new Set(['same-origin', 'none']);

/**
 * Whether a page of another origin sent this request to change something.
 *
 * Cookies alone authenticate only refreshing and signing out; both, and everything else that changes something over
 * HTTP, are refused when a browser says that they come from elsewhere. Programs send neither header and may pass.
 * `SameSite=Strict` on the cookies, JSON bodies and the Authorization header, which both need a preflight that is never
 * granted, stand behind this. OWASP ASVS 5.0.0, 3.5.1 to 3.5.3.
 *
 * @param publicOrigin the origin at which readers find the server, such as `https://sheets.example`
 */
export function isCrossSite({ method, host, origin, fetchSite }: RequestOrigin, publicOrigin: string): boolean {
  if (SAFE_METHODS.has(method)) return false;
  if (fetchSite !== undefined && !OWN_SITES.has(fetchSite)) return true;
  if (origin === undefined) return false;
  return (
    origin !== publicOrigin && (host === undefined || (origin !== `http://${host}` && origin !== `https://${host}`))
  );
}
