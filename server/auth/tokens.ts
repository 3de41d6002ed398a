import { createHash, randomBytes } from 'node:crypto';

/** 256 random bits: a token that nobody guesses, so that a plain hash of it is enough. */
export const newToken = () => randomBytes(32).toString('base64url');

export const hashToken = (token: string) => createHash('sha256').update(token).digest('base64url');
