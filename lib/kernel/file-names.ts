/** What stands in title block and manifest beside the plates themselves. */
export interface FileNames {
  /** Name of the design. */
  readonly name: string;
  /** Number of the drawing. */
  readonly number: string;
  /** Name of the workshop. */
  readonly owner: string;
  readonly revision: string;
  /** Moment of the version, ISO 8601; the only time in the files. */
  readonly issued: string;
  readonly creator: string;
  readonly approved: string;
  /** May it be cut? In words: `Draft, not released`. */
  readonly status: string;
  /** What was released in spite of a failing check, and why: one sentence each. */
  readonly waivers: readonly string[];
}
