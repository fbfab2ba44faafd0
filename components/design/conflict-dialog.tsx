'use client';

import { Button } from '@/components/ui/button';
import { Dialog } from '@/components/ui/dialog';
import { LocalTime } from '@/components/ui/local-time';
import type { DesignRecord } from '@/lib/schemas/api';
import { differences } from './differences';
import { designOf, type Draft } from './draft';

/** Two people saved the same design: says what differs and lets the person choose. */
export default function ConflictDialog({
  mine,
  theirs,
  onOverwrite,
  onTakeTheirs,
  onSaveAsNew,
  onClose,
}: {
  mine: Draft;
  theirs: DesignRecord;
  onOverwrite: () => void;
  onTakeTheirs: () => void;
  onSaveAsNew: () => void;
  onClose: () => void;
}) {
  const read = designOf(mine);
  const rows = read.ok ? differences(read.design, theirs.design) : [];
  if (mine.name !== theirs.name) {
    rows.unshift({ label: 'Name', mine: mine.name, theirs: theirs.name });
  }
  return (
    <Dialog
      title={`${theirs.updatedBy.name} saved this design meanwhile`}
      role="alertdialog"
      wide
      isOpen
      onClose={onClose}
    >
      <p>
        Version {theirs.version}, <LocalTime iso={theirs.updatedAt} />. Nothing of yours is
        lost; choose what becomes of both.
      </p>
      <table className="dense w-full text-left">
        <thead>
          <tr className="border-b border-line text-small text-ink-2">
            <th scope="col" className="py-1 pr-3 font-semibold">
              Differs in
            </th>
            <th scope="col" className="py-1 pr-3 font-semibold">
              Yours
            </th>
            <th scope="col" className="py-1 font-semibold">
              {theirs.updatedBy.name}
            </th>
          </tr>
        </thead>
        <tbody>
          {rows.map((row) => (
            <tr key={row.label} className="border-b border-line">
              <th scope="row" className="py-1 pr-3 font-normal">
                {row.label}
              </th>
              <td className="py-1 pr-3">{row.mine}</td>
              <td className="py-1">{row.theirs}</td>
            </tr>
          ))}
          {rows.length === 0 && (
            <tr>
              <td colSpan={3} className="py-2">
                Nothing: both hold the same values.
              </td>
            </tr>
          )}
        </tbody>
      </table>
      <div className="flex flex-wrap justify-end gap-2">
        <Button onPress={onClose}>Decide later</Button>
        <Button onPress={onTakeTheirs}>Take theirs</Button>
        <Button onPress={onSaveAsNew}>Save mine as a new design</Button>
        <Button look="danger" onPress={onOverwrite}>
          Overwrite with mine
        </Button>
      </div>
    </Dialog>
  );
}
