/** What a tool's worker sends back: how far it is, then its answer or why there is none. */
export type JobMessage<Answer> =
  | { readonly done: number; readonly of: number }
  | { readonly answer: Answer }
  | { readonly failure: string };

export const failureOf = (error: unknown): { failure: string } => ({
  failure: error instanceof Error ? error.message : String(error),
});
