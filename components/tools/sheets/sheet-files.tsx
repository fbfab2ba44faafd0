'use client';

import { useMutation } from '@tanstack/react-query';
import { PanelSection } from '@/components/design/panel-section';
import { Button } from '@/components/ui/button';
import { Notice } from '@/components/ui/notice';
import { kerfWords } from '@/geometry/files/kerf-words';
import type { LaidOut } from '@/geometry/nesting/lay-out';
import type { Saved } from '../tool-props';
import type { Question } from './lay-out.worker';
import { saveSheets } from './save-sheets';
import { SheetPreview } from './sheet-preview';

/** Every sheet as it will be cut, each beside its file, and all files in one. */
export function SheetFiles({
  saved,
  question,
  laid,
  current,
}: {
  saved: Saved;
  /** What was laid out. */
  question: Question;
  laid: LaidOut;
  /** Is it still what is asked? */
  current: boolean;
}) {
  const { machine, kerf, copies } = question;
  const saving = useMutation({
    mutationFn: (only?: { group: number; sheet: number }) =>
      saveSheets(saved, question, laid, only),
  });
  const short = laid.groups.some(({ layout }) => layout.left.length > 0);
  const missing = laid.findings.some(({ code }) => code === 'no-sheet');
  const trouble = saved.changed
    ? 'Files are made from the saved version: save the design first.'
    : !current
      ? 'What is asked has changed: lay it out first.'
      : short || missing
        ? 'Not all parts are on a sheet yet: the checks above say what to add.'
        : null;
  // Not disabled while the files are made: that would take the focus from the button.
  const save = (only?: { group: number; sheet: number }) => {
    if (!saving.isPending) saving.mutate(only);
  };
  const pieces = laid.groups.flatMap(({ parts }) => parts);
  return (
    <PanelSection title="Files">
      <p>
        Version {saved.version}, <strong className="font-semibold">{kerf}</strong>:{' '}
        {kerfWords(kerf, machine)}. By {machine.name}.
      </p>
      <Button
        look="action"
        className="min-h-12 self-stretch"
        isDisabled={trouble !== null}
        onPress={() => save()}
      >
        {saving.isPending ? 'Making the files' : 'Save all in a ZIP'}
      </Button>
      <div role="status">
        {trouble}
        {saving.isError && <Notice look="bad">{saving.error.message}</Notice>}
      </div>
      <p className="text-small text-ink-2">
        It holds a DXF and an SVG of each sheet and of each part (
        {pieces
          .map(({ label, quantity }) => `${quantity * copies} × ${label.toLowerCase()}`)
          .join(', ')}
        ), all {kerf}, and a manifest with quantity, sheet and SHA-256 of each.
      </p>
      <ul className="flex flex-col gap-4">
        {laid.groups.flatMap((group, index) =>
          group.layout.sheets.map((_, sheet) => (
            <li
              key={`${group.material} ${group.thickness} ${sheet}`}
              className="flex flex-col gap-1.5 border-t border-line pt-3"
            >
              <SheetPreview group={group} sheet={sheet} machine={machine} kerf={kerf} />
              <Button
                className="self-start"
                isDisabled={trouble !== null}
                onPress={() => save({ group: index, sheet })}
              >
                Save sheet {sheet + 1} as DXF, {kerf}
              </Button>
            </li>
          )),
        )}
      </ul>
    </PanelSection>
  );
}
