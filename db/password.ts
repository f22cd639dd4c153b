import { hash, verify } from '@node-rs/argon2';

/** argon2id with the package's defaults, which follow OWASP's advice: 19 MiB, 2 rounds, 1 lane. */
export const hashPassword = (password: string): Promise<string> => hash(password);

export const passwordMatches = (passwordHash: string, password: string): Promise<boolean> =>
  verify(passwordHash, password);
