import '@tanstack/react-query';

declare module '@tanstack/react-query' {
  interface Register {
    queryMeta: {
      /** The last answer is kept on this device, to be read without a connection. */
      kept?: true;
    } & Record<string, unknown>;
  }
}

/** `meta` of a query whose last answer is kept on this device. */
export const KEPT = { kept: true } as const;
