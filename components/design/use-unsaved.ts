'use client';

import { useEffect, useMemo, useRef, useState } from 'react';
import type { UseFormReturn } from 'react-hook-form';
import { useHydrated } from '@/components/ui/local-time';
import { draftOf, sameDraft, type Draft } from './draft';
import { dropUnsaved, keepUnsaved, readUnsaved, type Unsaved } from './unsaved-store';
import type { Saving } from './use-saving';

/** Pause in typing after which the work is kept, ms. */
const PAUSE = 250;

/**
 * Keeps unsaved work in this browser and brings it back after a reload. Returns what was brought
 * back until the person has answered, and how to answer.
 */
export function useUnsaved(
  form: UseFormReturn<Draft>,
  saving: Saving,
  userId: string,
): { restored: Unsaved | null; accept: () => void } {
  const { stored, dirty, restore, baseVersion } = saving;
  const hydrated = useHydrated();
  const [answered, setAnswered] = useState(false);
  const wasDirty = useRef(false);

  // Once, as the page comes alive: later the store holds only what this screen puts there.
  const [first] = useState(stored);
  const found = useMemo(() => {
    const unsaved = hydrated ? readUnsaved(userId, first.id) : null;
    const same = unsaved && sameDraft(unsaved.draft, draftOf(first.name, first.design));
    return same ? null : unsaved;
  }, [first, hydrated, userId]);

  const brought = useRef<Unsaved | null>(null);
  useEffect(() => {
    // Once: a second time would undo what was typed since.
    if (!found || brought.current === found) return;
    brought.current = found;
    restore(found.draft, found.version);
  }, [found, restore]);

  useEffect(() => {
    if (!dirty) {
      if (wasDirty.current) dropUnsaved(userId, stored.id);
      wasDirty.current = false;
      return;
    }
    wasDirty.current = true;
    let kept = true;
    let timer: ReturnType<typeof setTimeout> | undefined;
    const keep = () => {
      clearTimeout(timer);
      timer = undefined;
      kept = keepUnsaved(userId, stored.id, baseVersion(), form.getValues());
    };
    const leave = (event: BeforeUnloadEvent) => {
      if (timer !== undefined) keep();
      if (!kept) event.preventDefault();
    };
    keep();
    const unsubscribe = form.subscribe({
      formState: { values: true },
      callback: () => {
        clearTimeout(timer);
        timer = setTimeout(keep, PAUSE);
      },
    });
    window.addEventListener('beforeunload', leave);
    return () => {
      if (timer !== undefined) keep();
      unsubscribe();
      window.removeEventListener('beforeunload', leave);
    };
  }, [baseVersion, dirty, form, stored.id, userId]);

  return { restored: answered ? null : found, accept: () => setAnswered(true) };
}
