import { LRUCache } from 'lru-cache';

/** A batch function for `loaderFor` that remembers what it loaded. */
export interface CachedBatch<V> {
  (ids: readonly string[]): Promise<(V | Error)[]>;
  /** Drops what is remembered of one id, after it changed. */
  forget(id: string): void;
}

interface CacheOptions<V> {
  /** Most entries kept */
  max: number;
  /** ms an entry is trusted; for rows that another process may change. Absent for rows that never change. */
  ttl?: number;
  /** Whether a loaded value may be remembered; everything but errors where absent */
  keep?: (value: V) => boolean;
}

/** Remembers what `load` gives, so that hot reads cost no question to the database. */
export function cachedBatch<V extends object>(
  { keep = () => true, ...limits }: CacheOptions<V>,
  load: (ids: readonly string[]) => Promise<readonly (V | Error)[]>,
): CachedBatch<V> {
  const cache = new LRUCache<string, V>(limits);
  const batch = async (ids: readonly string[]): Promise<(V | Error)[]> => {
    const known = ids.map((id) => cache.get(id));
    const missing = [...new Set(ids.filter((_, i) => known[i] === undefined))];
    const loaded = new Map<string, V | Error>();
    if (missing.length > 0) {
      const values = await load(missing);
      missing.forEach((id, i) => {
        const value = values[i] ?? new Error(`nothing was loaded for ${id}`);
        loaded.set(id, value);
        if (!(value instanceof Error) && keep(value)) cache.set(id, value);
      });
    }
    return ids.map((id, i) => known[i] ?? loaded.get(id) ?? new Error(`nothing was loaded for ${id}`));
  };
  return Object.assign(batch, { forget: (id: string) => void cache.delete(id) });
}
