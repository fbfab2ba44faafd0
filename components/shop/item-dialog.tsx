'use client';

import { useMutation, useQueryClient } from '@tanstack/react-query';
import { useState } from 'react';
import { RequestError } from '@/components/api/request-error';
import { saveShopItem, shopKey, type SaveShopItem } from '@/components/api/shop';
import { Button } from '@/components/ui/button';
import { Dialog } from '@/components/ui/dialog';
import { Notice } from '@/components/ui/notice';
import { SelectField } from '@/components/ui/select-field';
import { TextField } from '@/components/ui/text-field';
import { loadReader } from '@/components/units/load-reader';
import type { Parameter } from '@/geometry';
import type { ShopItem, ShopKind } from '@/lib/schemas/shop';
import { ItemConflict } from './item-conflict';
import { shopKinds, writtenValue } from './kinds';

/** A value as typed, read as what its parameter asks; the text itself where that can't be. */
async function readValue(parameter: Parameter, text: string): Promise<string | number> {
  if (!('quantity' in parameter)) return text;
  const read = (await loadReader())(
    text,
    parameter.quantity,
    parameter.quantity === 'length' ? 'mm' : '',
  );
  return read ?? text;
}

/** The values of an item as they stand in its fields; without one, those to begin with. */
const textsOf = (kind: ShopKind, item: ShopItem | null): Record<string, string> =>
  Object.fromEntries(
    Object.entries(shopKinds[kind].parameters).map(([key, parameter]) => {
      const value = item?.values[key] ?? (parameter.default as string | number);
      return [
        key,
        parameter.kind === 'choice' ? String(value) : writtenValue(parameter, value),
      ];
    }),
  );

/** What somebody else has stored meanwhile, if that is why a save was refused. */
function theirsIn(error: Error | null): ShopItem | null {
  if (!(error instanceof RequestError) || error.code !== 'conflict') return null;
  return error.current && 'values' in error.current ? error.current : null;
}

/** Adds or changes a machine or a sheet. */
export default function ItemDialog({
  kind,
  item,
  onClose,
}: {
  kind: ShopKind;
  item: ShopItem | null;
  onClose: () => void;
}) {
  const { one, parameters, hints } = shopKinds[kind];
  const client = useQueryClient();
  const [name, setName] = useState(item?.name ?? '');
  const [texts, setTexts] = useState(() => textsOf(kind, item));
  /** The version that what stands in the fields began from. */
  const [base, setBase] = useState(item?.version);
  const [sent, setSent] = useState<Pick<SaveShopItem, 'name' | 'values'> | null>(null);
  const saving = useMutation({
    mutationFn: async (version: number | undefined) => {
      const values = Object.fromEntries(
        await Promise.all(
          Object.entries(parameters).map(async ([key, parameter]) => [
            key,
            await readValue(parameter, texts[key]!),
          ]),
        ),
      ) as Record<string, string | number>;
      // Told here, before anything is sent; the server checks the same again.
      shopKinds[kind].check(values);
      setSent({ name, values });
      return saveShopItem(kind, item?.id ?? null, {
        name,
        values,
        ...(version !== undefined && { version }),
      });
    },
    onSuccess: async () => {
      await client.invalidateQueries({ queryKey: shopKey(kind) });
      onClose();
    },
  });
  const theirs = theirsIn(saving.error);

  function take(stored: ShopItem) {
    setName(stored.name);
    setTexts(textsOf(kind, stored));
    setBase(stored.version);
    saving.reset();
    void client.invalidateQueries({ queryKey: shopKey(kind) });
  }
  const set = (key: string) => (text: string) => setTexts((now) => ({ ...now, [key]: text }));

  return (
    <Dialog title={item ? `Change ${item.name}` : `Add ${one}`} isOpen onClose={onClose} wide>
      <form
        onSubmit={(event) => {
          event.preventDefault();
          saving.mutate(base);
        }}
        className="flex flex-col gap-4"
      >
        <TextField label="Name" value={name} onChange={setName} maxLength={80} autoFocus />
        <div className="grid gap-3 wide:grid-cols-2">
          {Object.entries(parameters).map(([key, parameter]) =>
            parameter.kind === 'choice' ? (
              <SelectField
                key={key}
                label={parameter.label}
                value={texts[key]!}
                options={parameter.options}
                onChange={set(key)}
              />
            ) : (
              <TextField
                key={key}
                label={parameter.label}
                value={texts[key]!}
                onChange={set(key)}
                autoComplete="off"
                {...(hints[key] && { description: hints[key] })}
              />
            ),
          )}
        </div>
        {theirs && sent ? (
          <ItemConflict
            kind={kind}
            mine={sent}
            theirs={theirs}
            isDisabled={saving.isPending}
            onTake={() => take(theirs)}
            onOverwrite={() => saving.mutate(theirs.version)}
          />
        ) : (
          saving.isError && <Notice look="bad">{saving.error.message}</Notice>
        )}
        <div className="flex flex-wrap justify-end gap-2">
          <Button onPress={onClose}>Cancel</Button>
          <Button type="submit" look="action" isDisabled={saving.isPending}>
            {saving.isPending ? 'Saving' : 'Save'}
          </Button>
        </div>
      </form>
    </Dialog>
  );
}
