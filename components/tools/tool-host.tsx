'use client';

import { useEffect, useState } from 'react';
import type { UseFormReturn } from 'react-hook-form';
import { designOf, draftOf, type Draft } from '@/components/design/draft';
import type { History } from '@/components/design/use-history';
import type { Derived, Design } from '@/geometry';
import { Button } from '@/components/ui/button';
import { Notice } from '@/components/ui/notice';
import type { ToolName } from './places';
import type { Saved } from './tool-props';
import ToolSheet from './tool-sheet';

/** The open tool, and what the last one put on the screen until it is undone or accepted. */
export default function ToolHost({
  tool,
  form,
  history,
  derived,
  section,
  saved,
  onClose,
}: {
  tool: ToolName | null;
  form: UseFormReturn<Draft>;
  history: History;
  derived: Derived | null;
  section: number;
  saved: Saved;
  onClose: () => void;
}) {
  const [applied, setApplied] = useState<string | null>(null);

  // What is said of a step holds until the next one, whatever takes it.
  useEffect(
    () =>
      applied === null
        ? undefined
        : form.subscribe({
            formState: { values: true },
            callback: () => setApplied(null),
          }),
    [applied, form],
  );
  const read = tool ? designOf(form.getValues()) : null;
  const design = read?.ok ? read.design : derived?.design;

  function apply(change: (design: Design) => Design, words: string) {
    if (!design) return;
    history.apply(draftOf(form.getValues('name'), change(design)));
    setApplied(words);
  }

  const notice = applied && (
    <Notice>
      <div className="flex flex-wrap items-center justify-between gap-x-4 gap-y-2">
        <p>{applied}.</p>
        <span className="flex gap-2">
          <Button
            onPress={() => {
              history.undo();
              setApplied(null);
            }}
          >
            Undo
          </Button>
          <Button onPress={() => setApplied(null)}>Keep it</Button>
        </span>
      </div>
    </Notice>
  );

  // Where the tool covers the screen's edge, what it did is said in it.
  return (
    <>
      {!tool && notice}
      {tool && design && (
        <ToolSheet
          tool={tool}
          design={design}
          section={section}
          derived={derived}
          saved={saved}
          apply={apply}
          close={onClose}
          notice={notice}
        />
      )}
    </>
  );
}
