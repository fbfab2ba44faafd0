'use client';

import { useMutation, useQueryClient } from '@tanstack/react-query';
import { deleteShopItem, shopKey } from '@/components/api/shop';
import { Button } from '@/components/ui/button';
import { Dialog } from '@/components/ui/dialog';
import { Notice } from '@/components/ui/notice';
import type { ShopItem, ShopKind } from '@/lib/schemas/shop';

export default function RemoveDialog({
  kind,
  item,
  onClose,
}: {
  kind: ShopKind;
  item: ShopItem;
  onClose: () => void;
}) {
  const client = useQueryClient();
  const removal = useMutation({
    mutationFn: () => deleteShopItem(kind, item.id),
    onSuccess: async () => {
      await client.invalidateQueries({ queryKey: shopKey(kind) });
      onClose();
    },
  });
  return (
    <Dialog title={`Delete ${item.name}?`} role="alertdialog" isOpen onClose={onClose}>
      <p>It goes for everybody in the workshop. Designs and files stay as they are.</p>
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
