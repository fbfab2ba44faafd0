'use client';

import { useMutation, useQueryClient } from '@tanstack/react-query';
import { designKeys } from '@/components/api/design-keys';
import { deleteDesign } from '@/components/api/designs';
import { Button } from '@/components/ui/button';
import { Dialog } from '@/components/ui/dialog';
import { Notice } from '@/components/ui/notice';
import type { DesignSummary } from '@/lib/schemas/api';

export default function DeleteDialog({
  design,
  onClose,
}: {
  design: DesignSummary;
  onClose: () => void;
}) {
  const client = useQueryClient();
  const removal = useMutation({
    mutationFn: () => deleteDesign(design.id),
    onSuccess: async () => {
      client.setQueryData<DesignSummary[]>(designKeys.list, (list) =>
        list?.filter((other) => other.id !== design.id),
      );
      onClose();
      await client.invalidateQueries({ queryKey: designKeys.list, exact: true });
    },
  });
  return (
    <Dialog title={`Delete ${design.name}?`} role="alertdialog" isOpen onClose={onClose}>
      <p>
        The design and its files go for everybody in the workshop. This cannot be taken back;
        duplicate it first if you may need it.
      </p>
      {removal.isError && <Notice look="bad">{removal.error.message}</Notice>}
      <div className="flex flex-wrap justify-end gap-2">
        <Button onPress={onClose} autoFocus>
          Keep it
        </Button>
        <Button look="danger" isDisabled={removal.isPending} onPress={() => removal.mutate()}>
          Delete it
        </Button>
      </div>
    </Dialog>
  );
}
