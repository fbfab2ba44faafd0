'use client';

import { useMutation, useQuery, useQueryClient } from '@tanstack/react-query';
import { useRouter } from 'next/navigation';
import { useState } from 'react';
import { designKeys } from '@/components/api/design-keys';
import { createDesign, fetchDesign } from '@/components/api/designs';
import { fetchExample, fetchExamples } from '@/components/api/examples';
import { Button } from '@/components/ui/button';
import { Dialog } from '@/components/ui/dialog';
import { Notice } from '@/components/ui/notice';
import { TextField } from '@/components/ui/text-field';
import { designNameSchema, type CreateDesign, type DesignSummary } from '@/lib/schemas/api';
import { StartChoice, startFromDefault } from './start-choice';

const copyName = (name: string) => `${name.slice(0, 74)}, copy`;

/** Names a new design and says what it starts from; makes it and opens it. */
export default function NewDesignDialog({
  copyOf,
  onClose,
}: {
  copyOf: DesignSummary | null;
  onClose: () => void;
}) {
  const router = useRouter();
  const client = useQueryClient();
  const [name, setName] = useState(copyOf ? copyName(copyOf.name) : '');
  const [start, setStart] = useState(startFromDefault);
  const [nameError, setNameError] = useState<string>();
  const examples = useQuery({
    queryKey: ['examples'],
    queryFn: fetchExamples,
    enabled: !copyOf,
    staleTime: Infinity,
  });
  const creation = useMutation({
    mutationFn: async (): Promise<string> => {
      const body: CreateDesign = { name };
      if (copyOf) body.design = (await fetchDesign(copyOf.id)).design;
      else if (start !== startFromDefault) body.design = (await fetchExample(start)).design;
      return (await createDesign(body)).id;
    },
    onSuccess: async (id) => {
      router.push(`/designs/${id}`);
      await client.invalidateQueries({ queryKey: designKeys.list, exact: true });
    },
  });

  function submit() {
    const parsed = designNameSchema.safeParse(name);
    setNameError(parsed.error?.issues[0]?.message);
    if (parsed.success) creation.mutate();
  }

  return (
    <Dialog
      title={copyOf ? `Duplicate ${copyOf.name}` : 'New design'}
      isOpen
      onClose={onClose}
      wide={!copyOf}
    >
      <form
        onSubmit={(event) => {
          event.preventDefault();
          submit();
        }}
        className="flex flex-col gap-4"
      >
        <TextField
          label="Name"
          value={name}
          onChange={setName}
          errorMessage={nameError}
          maxLength={80}
          autoFocus
        />
        {!copyOf && (
          <StartChoice value={start} onChange={setStart} examples={examples.data ?? []} />
        )}
        {creation.isError && <Notice look="bad">{creation.error.message}</Notice>}
        <div className="flex flex-wrap justify-end gap-2">
          <Button onPress={onClose}>Cancel</Button>
          <Button type="submit" look="action" isDisabled={creation.isPending}>
            {creation.isPending ? 'Making it' : 'Make it'}
          </Button>
        </div>
      </form>
    </Dialog>
  );
}
