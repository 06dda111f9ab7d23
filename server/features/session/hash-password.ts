import { hash, verify } from '@node-rs/argon2';

/** argon2id with the parameters that OWASP's password storage notes give for it (19 MiB, 2 rounds, 1 lane). Node's thread pool does the work. */
export const hashPassword = (password: string): Promise<string> =>
  hash(password, { memoryCost: 19_456, timeCost: 2, parallelism: 1 });

let nobody: Promise<string> | undefined;

/** Whether a password fits. Without a hash it takes as long and says no, so that time does not tell which addresses exist. */
export async function passwordFits(passwordHash: string | null, password: string): Promise<boolean> {
  if (passwordHash !== null) return verify(passwordHash, password);
  nobody ??= hashPassword('nobody has this password');
  await verify(await nobody, password);
  return false;
}
