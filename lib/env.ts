import 'server-only';
import { z } from 'zod';

const envSchema = z.object({
  DATABASE_URL: z.url({ protocol: /^postgres(ql)?$/ }),
  NEXTAUTH_URL: z.url({ protocol: /^https?$/ }),
  NEXTAUTH_SECRET: z.string().min(32),
  PORT: z.coerce.number().int().min(0).max(65535).optional(),
  /** Where a stand-in for a mail server keeps what it was sent; there is none in earnest. */
  MAIL_FOLDER: z.string().optional(),
  /** Threads that the kernel has for itself; 0 has it on the server's own. */
  KERNEL_THREADS: z.coerce.number().int().min(0).max(64).optional(),
  LOG_LEVEL: z.enum(['fatal', 'error', 'warn', 'info', 'debug', 'silent']).default('info'),
});
export type Env = z.infer<typeof envSchema>;

let parsed: Env | undefined;

/**
 * The environment, parsed once. A function, because a build imports this file without one; the
 * server asks for it as it boots (instrumentation.ts).
 * @throws Error naming every variable that is missing or wrong, without its value.
 */
export function env(): Env {
  if (parsed) return parsed;
  const result = envSchema.safeParse(process.env);
  if (!result.success) {
    const wrong = result.error.issues.map(
      (issue) => `${issue.path.join('.')}: ${issue.message}`,
    );
    throw new Error(`The environment is not complete. ${wrong.join('; ')}`);
  }
  parsed = result.data;
  return parsed;
}
