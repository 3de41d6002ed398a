import { z } from 'zod';

/** A fault in a page, told to the server's log. Nothing that somebody typed. */
export const clientError = z.strictObject({
  message: z.string().max(500),
  stack: z.string().max(4000).default(''),
  page: z.string().max(200).default(''),
});
