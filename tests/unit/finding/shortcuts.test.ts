import { expect, it } from 'vitest';
import { SHORTCUTS, shortcutOf } from '../../../src/keys/shortcuts.ts';

const press = (change: object = {}) => ({
  key: 'n',
  ctrlKey: false,
  metaKey: false,
  altKey: false,
  repeat: false,
  ...change,
});

it('gives each key one thing to do', () => {
  const keys = Object.values(SHORTCUTS).map(({ key }) => key);
  expect(new Set(keys).size).toBe(keys.length);
});

it.each([
  [{}, 'new-batch'],
  [{ key: '?' }, 'keys'],
  [{ key: 'N' }, null],
  [{ key: 'Enter' }, null],
])('%o is %s', (change, name) => {
  expect(shortcutOf(press(change))).toBe(name);
});

it.each(['ctrlKey', 'metaKey', 'altKey', 'repeat'])(
  'leaves keys with %s to the browser and the screen reader',
  (held) => {
    expect(shortcutOf(press({ [held]: true }))).toBeNull();
  },
);
