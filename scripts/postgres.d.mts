/** A running cluster of our own. */
export interface Cluster {
  stop(): Promise<void>;
  /** Runs SQL and gives what psql printed. */
  query(sql: string, database?: string): string;
  /** Makes the database when it isn't there; gives its address. */
  ensureDatabase(name: string): string;
}

export function postgresBinaries(): string | null;
export function startPostgres(): Promise<Cluster>;
export function startThrowawayPostgres(options?: {
  durable?: boolean;
}): Promise<Cluster & { crash(): Promise<() => Promise<void>> }>;
