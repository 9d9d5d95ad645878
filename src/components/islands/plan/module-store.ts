import { useSyncExternalStore } from "react";

/** A value that all islands of a page share: they are separate trees, but one module. */
export interface ModuleStore<T> {
  now(): T;
  put(next: T): void;
  change(how: (current: T) => T): void;
  watch(listener: () => void): () => void;
}

export function moduleStore<T>(first: T): ModuleStore<T> {
  let value = first;
  const listeners = new Set<() => void>();
  function put(next: T): void {
    if (Object.is(next, value)) return;
    value = next;
    for (const listener of listeners) listener();
  }
  return {
    now: () => value,
    put,
    change: (how) => put(how(value)),
    watch(listener) {
      listeners.add(listener);
      return () => listeners.delete(listener);
    },
  };
}

/** The store's value, kept current. `onServer` stands in while the page is rendered and hydrated. */
export function useStore<T>(store: ModuleStore<T>, onServer: T): T {
  return useSyncExternalStore(store.watch, store.now, () => onServer);
}
