import { createContext } from 'react';

/**
 * Around what is kept on the device where there is no connection, and sent later: its forms save,
 * whatever the connection.
 */
export const KeptOffline = createContext(false);
