/** Under what the client keeps revisions. */
export const revisionKeys = {
  /** Revisions and saves of a design. */
  history: (designId: string) => ['revisions', designId] as const,
  one: (id: string) => ['revision', id] as const,
  files: (id: string) => ['revision', id, 'files'] as const,
};
