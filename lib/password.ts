import { hash, verify } from '@node-rs/argon2';

/** argon2id at the OWASP Password Storage Cheat Sheet's first setting: 19 MiB, 2 passes. */
const options = { memoryCost: 19_456, timeCost: 2, parallelism: 1 };

export const hashPassword = (password: string): Promise<string> => hash(password, options);

let decoy: Promise<string> | undefined;

/** Takes the same time whether or not there is such a person, so an answer tells nothing. */
export async function verifyPassword(
  passwordHash: string | undefined,
  password: string,
): Promise<boolean> {
  decoy ??= hashPassword('nobody has this password');
  const right = await verify(passwordHash ?? (await decoy), password);
  return right && passwordHash !== undefined;
}
