/** What the person who looks may do with revisions; the server decides again at every write. */
export interface May {
  readonly edit: boolean;
  readonly release: boolean;
  /** Release in spite of a check that fails. */
  readonly waive: boolean;
  readonly order: boolean;
}

/** Somebody who only reads. */
export const mayNothing: May = { edit: false, release: false, waive: false, order: false };
