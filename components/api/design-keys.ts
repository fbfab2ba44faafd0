/** Under what the client keeps what it fetched. */
export const designKeys = {
  list: ['designs'] as const,
  record: (id: string) => ['designs', id] as const,
  files: (id: string, version: number) => ['designs', id, 'files', version] as const,
};
