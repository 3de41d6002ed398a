/** Id of the landmark that menus open in, so that none hangs outside every landmark. */
export const MENUS = 'menus';
