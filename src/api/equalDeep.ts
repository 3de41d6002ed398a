/** True where two values that came of JSON, or could have, say the same. Makes nothing on the way. */
export function equalDeep(a: unknown, b: unknown): boolean {
  if (Object.is(a, b)) return true;
  if (typeof a !== 'object' || typeof b !== 'object' || a === null || b === null) return false;
  if (Array.isArray(a) || Array.isArray(b))
    return (
      Array.isArray(a) &&
      Array.isArray(b) &&
      a.length === b.length &&
      a.every((one, at) => equalDeep(one, b[at]))
    );
  return equalFields(a, b);
}

function equalFields(a: object, b: object): boolean {
  const keys = Object.keys(a);
  if (keys.length !== Object.keys(b).length) return false;
  return keys.every(
    (key) => Object.hasOwn(b, key) && equalDeep(Reflect.get(a, key), Reflect.get(b, key)),
  );
}
