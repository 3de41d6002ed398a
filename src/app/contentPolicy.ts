import { config } from 'zod';

/**
 * The content policy lets no text become code. Contracts would try, to be compiled: the browser
 * refuses, and to report from where reads the whole entry once more.
 */
config({ jitless: true });
