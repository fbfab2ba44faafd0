'use client';

import { useMutation, useQueryClient } from '@tanstack/react-query';
import { useRouter } from 'next/navigation';
import type { UseFormReturn } from 'react-hook-form';
import { designKeys } from '@/components/api/design-keys';
import { loadApi } from '@/components/api/load-api';
import { designOf, type Draft } from './draft';
import { dropUnsaved } from './unsaved-store';

/** Saves what is on the screen as another design and opens that. */
export function useSaveAsNew(form: UseFormReturn<Draft>, userId: string, designId: string) {
  const router = useRouter();
  const client = useQueryClient();
  return useMutation<string, Error, void>({
    mutationFn: async () => {
      const draft = form.getValues();
      const read = designOf(draft);
      if (!read.ok) throw new Error(read.message);
      const name = `${draft.name.slice(0, 71)}, my work`;
      const { createDesign } = await loadApi();
      return (await createDesign({ name, design: read.design })).id;
    },
    onSuccess: (id) => {
      dropUnsaved(userId, designId);
      void client.invalidateQueries({ queryKey: designKeys.list, exact: true });
      router.push(`/designs/${id}`);
    },
  });
}
