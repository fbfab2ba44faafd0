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

/** The workshop's machines, or some to begin with where it has none, and the sheet in its store. */
export function useShop(): {
  readonly machines: readonly Machine[];
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
    const own = (machines.data ?? []).map(({ name, values }) =>
      machineOf(name, checkMachine(values)),
    );
    return {
      machines: own.length > 0 ? own : startingMachines,
      stock: (sheets.data ?? []).map(({ values }) => sheetOf(checkSheet(values))),
    };
  }, [machines.data, sheets.data]);
}
