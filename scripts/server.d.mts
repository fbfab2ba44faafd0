export function startServer(options: {
  mode?: 'start' | 'dev';
  host: string;
  port: number;
  env: Record<string, string>;
}): Promise<unknown>;
