'use client';

import { useQuery } from '@tanstack/react-query';
import dynamic from 'next/dynamic';
import { useState } from 'react';
import { fetchShopItems, shopKey } from '@/components/api/shop';
import { SortButton } from '@/components/designs/sort-button';
import { Button } from '@/components/ui/button';
import type { ShopItem, ShopKind } from '@/lib/schemas/shop';
import { shopKinds, writtenValue } from './kinds';

const ItemDialog = dynamic(() => import('./item-dialog'), { ssr: false });
const RemoveDialog = dynamic(() => import('./remove-dialog'), { ssr: false });

type Open =
  | { readonly what: 'edit'; readonly item: ShopItem | null }
  | { readonly what: 'remove'; readonly item: ShopItem };

const valueOf = (item: ShopItem, key: string): string | number =>
  key === 'name' ? item.name : (item.values[key] ?? '');

/** The workshop's machines or sheets, to sort, and for some to change. */
export function ShopTable({
  kind,
  initial,
  mayEdit,
}: {
  kind: ShopKind;
  initial: ShopItem[];
  mayEdit: boolean;
}) {
  const { title, one, empty, parameters, shown } = shopKinds[kind];
  const [open, setOpen] = useState<Open | null>(null);
  const [sort, setSort] = useState({ key: 'name', down: false });
  const { data } = useQuery({
    queryKey: shopKey(kind),
    queryFn: () => fetchShopItems(kind),
    initialData: initial,
  });
  const items = [...data].sort((a, b) => {
    const [x, y] = [valueOf(a, sort.key), valueOf(b, sort.key)];
    const order =
      typeof x === 'number' && typeof y === 'number'
        ? x - y
        : String(x).localeCompare(String(y));
    return sort.down ? -order : order;
  });
  const columns = [
    ['name', 'Name'] as const,
    ...shown.map((key) => [key, parameters[key]!.label] as const),
  ];

  return (
    <section aria-label={title} className="flex flex-col gap-3">
      <div className="flex flex-wrap items-center justify-between gap-3">
        <h2 className="wide-letter text-lead font-semibold">{title}</h2>
        {mayEdit && (
          <Button onPress={() => setOpen({ what: 'edit', item: null })}>Add {one}</Button>
        )}
      </div>
      {items.length === 0 ? (
        <p className="text-ink-2">{empty}</p>
      ) : (
        <div
          role="region"
          aria-label={`${title}, table`}
          tabIndex={0}
          className="overflow-x-auto"
        >
          <table className="dense w-full border-y border-line bg-panel">
            <thead>
              <tr className="border-b border-line bg-page text-left">
                {columns.map(([key, label]) => (
                  <th
                    key={key}
                    scope="col"
                    aria-sort={
                      sort.key === key ? (sort.down ? 'descending' : 'ascending') : 'none'
                    }
                    className="px-3"
                  >
                    <SortButton
                      direction={sort.key === key && (sort.down ? 'desc' : 'asc')}
                      onPress={() =>
                        setSort((now) => ({ key, down: now.key === key && !now.down }))
                      }
                    >
                      {label}
                    </SortButton>
                  </th>
                ))}
                {mayEdit && (
                  <th scope="col">
                    <span className="sr-only">Change it</span>
                  </th>
                )}
              </tr>
            </thead>
            <tbody>
              {items.map((item) => (
                <tr key={item.id} className="border-b border-line last:border-0">
                  <th scope="row" className="px-3 py-2 text-left font-medium">
                    {item.name}
                  </th>
                  {shown.map((key) => (
                    <td key={key} className="px-3 py-2 whitespace-nowrap tabular-nums">
                      {writtenValue(parameters[key]!, item.values[key]!)}
                    </td>
                  ))}
                  {mayEdit && (
                    <td className="px-3 py-1 whitespace-nowrap">
                      <Button
                        look="quiet"
                        aria-label={`Change ${item.name}`}
                        onPress={() => setOpen({ what: 'edit', item })}
                      >
                        Change
                      </Button>
                      <Button
                        look="quiet"
                        aria-label={`Delete ${item.name}`}
                        onPress={() => setOpen({ what: 'remove', item })}
                      >
                        Delete
                      </Button>
                    </td>
                  )}
                </tr>
              ))}
            </tbody>
          </table>
        </div>
      )}
      {open?.what === 'edit' && (
        <ItemDialog kind={kind} item={open.item} onClose={() => setOpen(null)} />
      )}
      {open?.what === 'remove' && (
        <RemoveDialog kind={kind} item={open.item} onClose={() => setOpen(null)} />
      )}
    </section>
  );
}
