/**
 * An id made here, so that a lost answer never doubles a row. `crypto.randomUUID` is missing on a
 * page that came over plain http from another machine.
 */
export function newId(): string {
  if (typeof crypto.randomUUID === 'function') return crypto.randomUUID();
  const bytes = crypto.getRandomValues(new Uint8Array(16));
  // Version 4, variant 1 of RFC 9562, section 5.4.
  const marked = bytes.map((byte, i) =>
    i === 6 ? (byte & 0x0f) | 0x40 : i === 8 ? (byte & 0x3f) | 0x80 : byte,
  );
  const hex = Array.from(marked, (byte) => byte.toString(16).padStart(2, '0')).join('');
  return [
    hex.slice(0, 8),
    hex.slice(8, 12),
    hex.slice(12, 16),
    hex.slice(16, 20),
    hex.slice(20),
  ].join('-');
}
