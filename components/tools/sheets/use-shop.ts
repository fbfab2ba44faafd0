'use client';

import { useQuery } from '@tanstack/react-query';
import { useMemo } from 'react';
import { fetchShopItems, shopKey } from '@/components/api/shop';
import type { Machine, Sheet } from '@/geometry/cutting/machine';
import {
  checkMachine,
  checkSheet,
  machineOf,
  sheetOf,
} from '@/geometry/cutting/shop-parameters';
import { startingMachines } from '@/geometry/cutting/starting-values';

/** A machine, and where the workshop keeps it; null for one to begin with. */
export interface ShopMachine extends Machine {
  readonly item: { readonly id: string; readonly version: number } | null;
}

/** The workshop's machines, or some to begin with where it has none, and the sheet in its store. */
export function useShop(): {
  readonly machines: readonly ShopMachine[];
  readonly stock: readonly Sheet[];
} {
  const machines = useQuery({
    queryKey: shopKey('machines'),
    queryFn: () => fetchShopItems('machines'),
  });
  const sheets = useQuery({
    queryKey: shopKey('sheets'),
    queryFn: () => fetchShopItems('sheets'),
  });
  return useMemo(() => {
    const own = (machines.data ?? []).map(({ id, version, name, values }) => ({
      ...machineOf(name, checkMachine(values)),
      item: { id, version },
    }));
    return {
      machines:
        own.length > 0 ? own : startingMachines.map((machine) => ({ ...machine, item: null })),
      stock: (sheets.data ?? []).map(({ values }) => sheetOf(checkSheet(values))),
    };
  }, [machines.data, sheets.data]);
}
