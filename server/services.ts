import { createPasswords, type Passwords } from './auth/passwords.ts';
import { createTries, type Tries } from './auth/tries.ts';
import type { Deps } from './deps.ts';

/** What is made once from the dependencies and shared by all routes. */
export interface Services {
  passwords: Passwords;
  tries: Tries;
}

export async function createServices({ config, pool }: Deps): Promise<Services> {
  return {
    passwords: await createPasswords(config.limits),
    tries: createTries(pool, config.limits),
  };
}
