const formats = new Map<string, Intl.NumberFormat>();

function formatOf(currency: string): Intl.NumberFormat {
  const known = formats.get(currency);
  if (known) return known;
  const format = new Intl.NumberFormat('en-GB', {
    style: 'currency',
    currency,
    currencyDisplay: 'narrowSymbol',
  });
  formats.set(currency, format);
  return format;
}

/** Digits after the point of a currency, by ISO 4217: 2 for EUR, 0 for JPY, 3 for KWD. */
export const minorDigits = (currency: string): number =>
  formatOf(currency).resolvedOptions().maximumFractionDigits ?? 2;

/**
 * An amount in the currency's minor unit as money: 1250 EUR cents are "€12.50". Parts of a minor
 * unit are rounded. Throws a RangeError where `currency` is not three letters.
 */
export const formatMoney = (minor: number, currency: string): string =>
  formatOf(currency).format(Math.round(minor) / 10 ** minorDigits(currency));
