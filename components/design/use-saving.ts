'use client';

import { useMutation, useQueryClient } from '@tanstack/react-query';
import { useCallback, useEffect, useRef, useState } from 'react';
import type { UseFormReturn } from 'react-hook-form';
import { designKeys } from '@/components/api/design-keys';
import { loadApi } from '@/components/api/load-api';
import type { RequestError } from '@/components/api/request-error';
import type { DesignRecord } from '@/lib/schemas/api';
import { designOf, draftOf, sameDraft, type Draft } from './draft';
import { focusField } from './focus-field';

/** Longest wait between two tries at an unreachable server, ms. */
const LONGEST_WAIT = 15_000;

export interface Saving {
  /** What the server holds, as far as this screen knows. */
  readonly stored: DesignRecord;
  readonly dirty: boolean;
  readonly state: 'idle' | 'saving' | 'waiting';
  /** Why the last save was refused. */
  readonly refusal: string | null;
  /** Somebody else's version that stands in the way. */
  readonly conflict: DesignRecord | null;
  save(overVersion?: number): void;
  /** Puts a stored version on the screen, over what is there. */
  adopt(record: DesignRecord): void;
  /** The stored version that the work on the screen began from. */
  baseVersion(): number;
  /** Puts kept work on the screen, that began from an earlier version perhaps. */
  restore(draft: Draft, baseVersion: number): void;
  dismissConflict(): void;
}

/** Saving with a version check; an unreachable server is tried again until it answers. */
export function useSaving(
  form: UseFormReturn<Draft>,
  first: DesignRecord,
  userId: string,
): Saving {
  const client = useQueryClient();
  const [stored, setStored] = useState(first);
  const [dirty, setDirty] = useState(false);
  const [refusal, setRefusal] = useState<string | null>(null);
  const [conflict, setConflict] = useState<DesignRecord | null>(null);
  const base = useRef(first.version);
  const sent = useRef<Draft | null>(null);
  const storedDraft = useRef(draftOf(first.name, first.design));

  const note = useCallback(
    (record: DesignRecord) => {
      base.current = record.version;
      storedDraft.current = draftOf(record.name, record.design);
      setStored(record);
      setConflict(null);
      setDirty(!sameDraft(form.getValues(), storedDraft.current));
      client.setQueryData(designKeys.record(record.id), record);
      void client.invalidateQueries({ queryKey: designKeys.list, exact: true });
    },
    [client, form],
  );

  const mutation = useMutation<DesignRecord, RequestError, void>({
    mutationFn: async () => {
      // Read here, not when asked: a try after a lost connection sends what is on the screen now.
      const draft = structuredClone(form.getValues());
      const read = designOf(draft);
      if (!read.ok) throw new Error(read.message);
      sent.current = draft;
      const { saveDesign } = await loadApi();
      return saveDesign(first.id, {
        version: base.current,
        name: draft.name,
        design: read.design,
      });
    },
    // The first try goes out in any case; further ones wait for the network.
    networkMode: 'offlineFirst',
    retry: (_count, error) => error.passing === true,
    retryDelay: (count) => Math.min(1000 * 2 ** count, LONGEST_WAIT),
    onSuccess: (record) => {
      setRefusal(null);
      note(record);
    },
    onError: (error) => {
      const current = error.current;
      if (error.code !== 'conflict' || !current || !('design' in current)) {
        setRefusal(error.message);
        return;
      }
      // The answer to an earlier try may have been lost on the way: then this is our own save.
      const ours =
        current.updatedBy.id === userId &&
        sent.current !== null &&
        sameDraft(sent.current, draftOf(current.name, current.design));
      if (ours) note(current);
      else setConflict(current);
    },
  });

  const { mutate, isPending, isPaused, failureCount } = mutation;

  useEffect(
    () =>
      form.subscribe({
        formState: { values: true },
        callback: ({ values }) => setDirty(!sameDraft(values, storedDraft.current)),
      }),
    [form],
  );

  const save = useCallback(
    (overVersion?: number) => {
      if (isPending) return;
      setRefusal(null);
      setConflict(null);
      const draft = form.getValues();
      const read = designOf(draft);
      if (!read.ok) {
        setRefusal(`Not saved. ${read.message}`);
        focusField(read.path);
      } else {
        if (overVersion !== undefined) base.current = overVersion;
        mutate();
      }
    },
    [form, isPending, mutate],
  );

  const adopt = useCallback(
    (record: DesignRecord) => {
      form.reset(draftOf(record.name, record.design));
      note(record);
    },
    [form, note],
  );
  const baseVersion = useCallback(() => base.current, []);
  const restore = useCallback(
    (draft: Draft, version: number) => {
      base.current = version;
      form.reset(draft);
    },
    [form],
  );

  return {
    stored,
    dirty,
    state: !isPending ? 'idle' : isPaused || failureCount > 0 ? 'waiting' : 'saving',
    refusal,
    conflict,
    save,
    adopt,
    baseVersion,
    restore,
    dismissConflict: () => setConflict(null),
  };
}
