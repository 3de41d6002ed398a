/** A screen on which one shelf fills the width. */
export const PHONE = '(max-width: 39.99rem)';

export const isPhone = (): boolean => window.matchMedia(PHONE).matches;
