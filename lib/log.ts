import pino from 'pino';

const secrets = [
  'password',
  'passwordHash',
  'secret',
  'token',
  'cookie',
  'authorization',
  'NEXTAUTH_SECRET',
  'DATABASE_URL',
];

/** One JSON line per event. Whatever carries a secret is blanked, two levels deep. */
export const logOptions: pino.LoggerOptions = {
  level: process.env.LOG_LEVEL ?? 'info',
  base: undefined,
  timestamp: pino.stdTimeFunctions.isoTime,
  formatters: { level: (label) => ({ level: label }) },
  redact: {
    paths: secrets.flatMap((name) => [name, `*.${name}`, `*.*.${name}`]),
    censor: '[redacted]',
  },
  serializers: { err: describeError },
};

export const log = pino(logOptions);

/** Name, message, code and stack of an error and its causes. Driver errors carry rows: left out. */
function describeError(error: unknown): unknown {
  if (!(error instanceof Error)) return String(error);
  const code: unknown = Reflect.get(error, 'code');
  const isDriver = typeof code === 'string' && /^[0-9A-Z]{5}$/.test(code);
  return {
    name: error.name,
    message: isDriver ? withoutStatement(error.message) : error.message,
    ...(typeof code === 'string' && { code }),
    stack: error.stack?.split('\n').filter((line) => /^\s+at /.test(line)),
    ...(error.cause !== undefined && { cause: describeError(error.cause) }),
  };
}

/** MikroORM puts the statement with its values, which may be somebody's, before the reason. */
const withoutStatement = (message: string) => message.split('\n')[0]!.replace(/^.* - /, '');
