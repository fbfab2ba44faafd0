export function startMail(
  env: NodeJS.ProcessEnv,
  folder: string,
): Promise<{ MAIL_FOLDER?: string }>;
