import type { Role } from '@/lib/schemas/api';

/** Roles with what each may do, as they are offered. */
export const roleOptions: readonly { readonly value: Role; readonly label: string }[] = [
  { value: 'owner', label: 'owner' },
  { value: 'builder', label: 'builder' },
  { value: 'machinist', label: 'machinist' },
];

export const roleHelp =
  'An owner also invites and removes people, and may waive a check. A builder designs, releases and orders. A machinist sees what is released, and cuts.';
