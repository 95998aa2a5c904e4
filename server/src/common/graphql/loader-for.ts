import DataLoader from 'dataloader';

type Batch<K, V> = (keys: readonly K[]) => Promise<readonly (V | Error)[]>;
const loadersOf = new WeakMap<object, Map<unknown, unknown>>();

/** The request's loader for `batch`: one per GraphQL context and batch function, dropped with the context. */
export function loaderFor<K, V>(context: object, batch: Batch<K, V>): DataLoader<K, V> {
  const loaders = loadersOf.get(context) ?? new Map<unknown, unknown>();
  loadersOf.set(context, loaders);
  const loader = (loaders.get(batch) as DataLoader<K, V> | undefined) ?? new DataLoader<K, V>(batch);
  loaders.set(batch, loader);
  return loader;
}
