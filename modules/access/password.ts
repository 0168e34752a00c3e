import { hash, verify } from '@node-rs/argon2';

/** OWASP Password Storage Cheat Sheet: argon2id with 19 MiB, 2 passes, 1 lane; the library's defaults, stated. */
const settings = { memoryCost: 19_456, timeCost: 2, parallelism: 1 } as const;

/** An argon2id PHC string. Slow on purpose: call it before a transaction, never inside. */
export const hashPassword = (password: string): Promise<string> => hash(password, settings);

/** Whether the password fits the hash; false for a hash that cannot be read. */
export const isPassword = async (passwordHash: string, password: string): Promise<boolean> => {
  try {
    return await verify(passwordHash, password);
  } catch {
    return false;
  }
};
