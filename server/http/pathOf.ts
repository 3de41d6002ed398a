/** A route's pattern from its URL builder, given `:name` in place of the values. */
export const pathOf = (url: string) => decodeURIComponent(url);
