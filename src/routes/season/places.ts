import type { Option } from '../../components/form/SelectField.tsx';

/** The browser's own list, with the present value even where the browser does not know it. */
function listed(kind: 'timeZone' | 'currency', now: string): string[] {
  return [...new Set([...Intl.supportedValuesOf(kind), now])].toSorted();
}

export const timeZones = (now: string): Option[] =>
  [...new Set(['UTC', ...listed('timeZone', now)])].map((value) => ({
    value,
    label: value.replaceAll('_', ' '),
  }));

export function currencies(now: string): Option[] {
  const names = new Intl.DisplayNames('en-GB', { type: 'currency' });
  return listed('currency', now).map((value) => ({
    value,
    label: `${value}, ${names.of(value) ?? value}`,
  }));
}
