/** Under what the client keeps revisions. */
export const revisionKeys = {
  /** Revisions and saves of a design. */
  history: (designId: string) => ['revisions', designId] as const,
  one: (id: string) => ['revision', id] as const,
  /** As they are since it was moved last; not asked for again with the revision, for they stay. */
  files: (id: string, since: string) => ['revision-files', id, since] as const,
};
