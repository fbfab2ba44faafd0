'use client';

import { Button } from '@/components/ui/button';
import { Dialog } from '@/components/ui/dialog';
import { DifferenceTable } from '@/components/ui/difference-table';
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
      <DifferenceTable rows={rows} theirName={theirs.updatedBy.name} />
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
