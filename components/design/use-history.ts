'use client';

import { useCallback, useEffect, useRef, useState } from 'react';
import type { UseFormReturn } from 'react-hook-form';
import { sameDraft, type Draft } from './draft';

/** Steps that can be taken back. */
const STEPS = 100;

/** Changes of one field within this time are one step, ms. */
const TOGETHER = 1500;

export interface History {
  readonly canUndo: boolean;
  readonly canRedo: boolean;
  undo(): void;
  redo(): void;
  /** Puts another design on the screen as one step. */
  apply(draft: Draft): void;
}

interface Trail {
  readonly drafts: Draft[];
  at: number;
  /** The field that the last step changed, and when. */
  field: string | undefined;
  time: number;
}

/**
 * Leaves the field one is in, so that it shows what comes, and goes back to it afterwards. A
 * tool's own field is not left: until the next frame its keys, Escape too, would go nowhere.
 */
function withFieldLeft(change: () => void): void {
  const field = document.activeElement;
  const typed = field instanceof HTMLInputElement || field instanceof HTMLTextAreaElement;
  if (!typed || field.closest('[role=dialog]')) {
    change();
    return;
  }
  field.blur();
  change();
  requestAnimationFrame(() => field.isConnected && field.focus());
}

/** What lies over the design has its own keys: a question, and text typed in a tool. */
const ELSEWHERE =
  ':is([role=dialog]:not(aside),[role=alertdialog]) *,[role=dialog] :is(textarea,input:not([type=radio],[type=checkbox]))';

/** Undo and redo over the whole design, whoever changed it: fields, tools, a restored draft. */
export function useHistory(form: UseFormReturn<Draft>): History {
  const trail = useRef<Trail | null>(null);
  const moving = useRef(false);
  const [ends, setEnds] = useState({ canUndo: false, canRedo: false });

  const note = useCallback(({ drafts, at }: Trail) => {
    setEnds((before) => {
      const now = { canUndo: at > 0, canRedo: at < drafts.length - 1 };
      return before.canUndo === now.canUndo && before.canRedo === now.canRedo ? before : now;
    });
  }, []);

  useEffect(() => {
    const own: Trail = {
      drafts: [structuredClone(form.getValues())],
      at: 0,
      field: undefined,
      time: 0,
    };
    trail.current = own;
    return form.subscribe({
      formState: { values: true },
      callback: ({ values, name }) => {
        if (moving.current || sameDraft(values, own.drafts[own.at]!)) return;
        const now = performance.now();
        const together = name !== undefined && name === own.field && now - own.time < TOGETHER;
        own.drafts.length = own.at + 1;
        // Typed and taken back again: no step.
        if (together && own.at > 0) own.drafts.pop();
        if (!together || own.at === 0 || !sameDraft(values, own.drafts.at(-1)!)) {
          own.drafts.push(structuredClone(values));
        }
        if (own.drafts.length > STEPS) own.drafts.shift();
        own.at = own.drafts.length - 1;
        own.field = name;
        own.time = now;
        note(own);
      },
    });
  }, [form, note]);

  const go = useCallback(
    (by: 1 | -1) => {
      const own = trail.current;
      const draft = own?.drafts[own.at + by];
      if (!own || !draft) return;
      withFieldLeft(() => {
        own.at += by;
        own.field = undefined;
        moving.current = true;
        form.reset(structuredClone(draft));
        moving.current = false;
        note(own);
      });
    },
    [form, note],
  );

  const undo = useCallback(() => go(-1), [go]);
  const redo = useCallback(() => go(1), [go]);
  const apply = useCallback((draft: Draft) => withFieldLeft(() => form.reset(draft)), [form]);

  useEffect(() => {
    const onKey = (event: KeyboardEvent) => {
      if (!(event.ctrlKey || event.metaKey) || event.altKey) return;
      const key = event.key.toLowerCase();
      const forward = key === 'y' || (key === 'z' && event.shiftKey);
      if ((!forward && key !== 'z') || (event.target as Element).matches(ELSEWHERE)) {
        return;
      }
      event.preventDefault();
      go(forward ? 1 : -1);
    };
    window.addEventListener('keydown', onKey);
    return () => window.removeEventListener('keydown', onKey);
  }, [go]);

  return { ...ends, undo, redo, apply };
}
