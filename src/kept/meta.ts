import '@tanstack/react-query';

declare module '@tanstack/react-query' {
  interface Register {
    queryMeta: {
      /** The last answer is kept on this device, to be read without a connection. */
      kept?: true;
    } & Record<string, unknown>;
  }
}

/**
 * Options of a query whose last answer is kept on this device. It stays in the open page too, for as
 * long as that is open: a page that nobody looks at is not given up after a while.
 */
export const KEPT = { meta: { kept: true }, gcTime: Infinity } as const;
