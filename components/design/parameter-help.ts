'use client';

import { useSyncExternalStore } from 'react';

type Help = Readonly<Record<string, string>>;

let loaded: Help = {};
let loading: Promise<void> | null = null;
const listeners = new Set<() => void>();

/** Fetches what the parameters mean, once: a screen that is only looked at goes without. */
export function loadHelp(): Promise<void> {
  loading ??= import('@/geometry/parameter-help').then(
    ({ parameterHelp }) => {
      loaded = parameterHelp;
      listeners.forEach((listener) => listener());
    },
    () => {
      loading = null;
    },
  );
  return loading;
}

function subscribe(listener: () => void): () => void {
  listeners.add(listener);
  return () => listeners.delete(listener);
}

/** What the parameter at a path of the design means; empty until it is there. */
export function useHelp(path: string): string {
  const help = useSyncExternalStore(
    subscribe,
    () => loaded,
    () => loaded,
  );
  return help[path.slice(path.lastIndexOf('.') + 1)] ?? '';
}
