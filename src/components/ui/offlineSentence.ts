/** Where only reading works without a connection. */
export const OFFLINE_SENTENCE =
  'No connection. You can read what is here; nothing can be changed until it is back.';
