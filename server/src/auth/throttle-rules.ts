/** How failed attempts at one thing are slowed down. */
export interface ThrottlePolicy {
  /** Failures are forgotten after this time, s; counted from the first failure, or from the last where `sliding`. */
  readonly windowSeconds: number;
  readonly sliding: boolean;
  /** So many failures cost nothing. */
  readonly free: number;
  /** Pause after the first failure that costs something, s; each further one doubles it. */
  readonly firstPauseSeconds: number;
  readonly longestPauseSeconds: number;
}

/** One counter: what is guarded, and how. */
export interface Throttle {
  readonly key: string;
  readonly policy: ThrottlePolicy;
}

const HOUR = 3600;

/**
 * Figures: OWASP ASVS 4.0.3, 2.2.1 allows at most 100 failed attempts an hour on one account; the pauses are this
 * service's own (ASVS 5.0.0, 6.3.1 asks that there be some and that they be written down).
 */
export const POLICIES = {
  /** One account from one network (or with one known device): 5 free, then 1, 2, 4, … 900 s. */
  pair: { windowSeconds: HOUR, sliding: true, free: 4, firstPauseSeconds: 1, longestPauseSeconds: 900 },
  /** One account from everywhere: a hundred an hour, then none until the hour is over. Known devices are exempt. */
  account: { windowSeconds: HOUR, sliding: false, free: 99, firstPauseSeconds: HOUR, longestPauseSeconds: HOUR },
  /** One address at any account: 20 an hour, then slowly. Many may share an address, so this one never shuts it out. */
  address: { windowSeconds: HOUR, sliding: false, free: 19, firstPauseSeconds: 1, longestPauseSeconds: 60 },
} as const satisfies Record<string, ThrottlePolicy>;

/** @param failures so far, this one included; @returns s to wait before the next attempt is looked at */
export function pauseAfter(failures: number, policy: ThrottlePolicy): number {
  const costly = failures - policy.free;
  if (costly <= 0) return 0;
  return Math.min(policy.longestPauseSeconds, policy.firstPauseSeconds * 2 ** Math.min(costly - 1, 30));
}

/** The network of an address: /24 of IPv4, /64 of IPv6, which is what one customer is usually given. */
export function networkOf(address: string): string {
  const mapped = /^::ffff:(\d+\.\d+\.\d+\.\d+)$/i.exec(address)?.[1] ?? address;
  if (mapped.includes('.')) return mapped.split('.').slice(0, 3).join('.');
  const [head = '', tail] = mapped.toLowerCase().split('%')[0]?.split('::') ?? [];
  const first = head === '' ? [] : head.split(':');
  const last = tail === undefined || tail === '' ? [] : tail.split(':');
  const zeros = tail === undefined ? [] : Array.from({ length: 8 - first.length - last.length }, () => '0');
  return [...first, ...zeros, ...last]
    .slice(0, 4)
    .map((group) => group.replace(/^0+(?=.)/, ''))
    .join(':');
}

/** A single address, or the /64 of IPv6, since whoever has one address of it has them all. */
export function addressOf(address: string): string {
  const mapped = /^::ffff:(\d+\.\d+\.\d+\.\d+)$/i.exec(address)?.[1] ?? address;
  return mapped.includes('.') ? mapped : networkOf(mapped);
}
