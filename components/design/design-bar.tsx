'use client';

import Link from 'next/link';
import { Input, Label, TextField } from 'react-aria-components/TextField';
import { useController, useFormContext } from 'react-hook-form';
import { Button } from '@/components/ui/button';
import { buttonClass } from '@/components/ui/button-class';
import { Notice } from '@/components/ui/notice';
import { StatusBadge } from '@/components/ui/status-badge';
import type { Draft } from './draft';
import { SaveState } from './save-state';
import type { History } from './use-history';
import { useNews } from './use-news';
import type { Saving } from './use-saving';

function NameField() {
  const { control } = useFormContext<Draft>();
  const { field } = useController({ control, name: 'name' });
  return (
    <TextField
      className="-ml-1.5 max-w-full min-w-0"
      value={field.value}
      onChange={field.onChange}
      onBlur={field.onBlur}
      maxLength={80}
    >
      <Label className="sr-only">Name of the design</Label>
      <Input className="wide-letter field-sizing-content max-w-full min-w-40 rounded-[3px] border border-transparent bg-transparent px-1.5 py-1 text-title max-wide:text-lead font-semibold hover:border-edge focus:border-edge focus:bg-white max-bench:min-h-11" />
    </TextField>
  );
}

/** Name, state, where saving stands, and what there is to do with the whole design. */
export function DesignBar({ saving, history }: { saving: Saving; history: History }) {
  const { stored, dirty, state, refusal } = saving;
  const { state: standing } = useNews(stored);

  return (
    <>
      <div className="flex flex-wrap items-center gap-x-4 gap-y-2 border-b border-line px-5 py-2.5 max-wide:px-3">
        <h1 className="sr-only">{stored.name}</h1>
        <NameField />
        <StatusBadge state={standing} />
        <SaveState saving={saving} />
        <div className="ml-auto flex flex-wrap gap-2">
          <Button look="quiet" isDisabled={!history.canUndo} onPress={history.undo}>
            Undo
          </Button>
          <Button look="quiet" isDisabled={!history.canRedo} onPress={history.redo}>
            Redo
          </Button>
          <Link href={`/designs/${stored.id}/revisions`} className={buttonClass('plain')}>
            Revisions
          </Link>
          <Button
            look="action"
            onPress={() => {
              if (dirty) saving.save();
            }}
          >
            {state === 'idle' ? 'Save' : 'Saving'}
          </Button>
        </div>
      </div>
      {refusal && <Notice look="bad">{refusal}</Notice>}
    </>
  );
}
