'use client';

import { useEffect } from 'react';
import type { Saving } from './use-saving';

/** Ctrl+S and Cmd+S save the design instead of the page. */
export function useSaveKey({ save, dirty }: Saving): void {
  useEffect(() => {
    const onKey = (event: KeyboardEvent) => {
      if (event.key.toLowerCase() !== 's' || !(event.ctrlKey || event.metaKey)) return;
      if (event.altKey || event.shiftKey) return;
      event.preventDefault();
      if (dirty) save();
    };
    window.addEventListener('keydown', onKey);
    return () => window.removeEventListener('keydown', onKey);
  }, [dirty, save]);
}
