/** Under what the client keeps cut orders. */
export const orderKeys = {
  list: ['orders'] as const,
  orderable: ['orders', 'orderable'] as const,
  one: (id: string) => ['order', id] as const,
};
