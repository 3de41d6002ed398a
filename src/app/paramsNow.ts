/**
 * What stands behind the question mark at this moment. The router's own value is of the last
 * drawing, so that the second of two quick choices would forget the first.
 */
export const paramsNow = (): URLSearchParams => new URLSearchParams(window.location.search);
