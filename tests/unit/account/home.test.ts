import { afterEach, beforeEach, expect, it, vi } from 'vitest';
import type { Person } from '#shared/api/people.ts';
import { lastBrewery, rememberBrewery } from '../../../src/app/lastBrewery.ts';
import { lossWords } from '../../../src/routes/account/lossWords.ts';
import { homeOf } from '../../../src/routes/public/home.ts';

const kept = new Map<string, string>();
beforeEach(() => {
  kept.clear();
  vi.stubGlobal('localStorage', {
    getItem: (key: string) => kept.get(key) ?? null,
    setItem: (key: string, value: string) => void kept.set(key, value),
  });
});
afterEach(() => vi.unstubAllGlobals());

const somebody = (id: string, ...slugs: string[]): Person => ({
  id,
  version: 1,
  name: 'Orla Finch',
  email: 'orla@reedbed.example',
  units: { system: 'metric', gravity: 'sg', colour: 'srm', temperature: 'c' },
  theme: 'system',
  breweries: slugs.map((slug) => ({ brewery: { id: slug, slug, name: slug }, role: 'brewer' })),
  guestOf: [],
});

it('leads home to the only brewery, to the one used last, or to the choice', () => {
  expect(homeOf(null)).toBe('/');
  expect(homeOf(somebody('orla'))).toBe('/breweries');
  expect(homeOf(somebody('orla', 'reedbed'))).toBe('/b/reedbed');
  expect(homeOf(somebody('orla', 'reedbed', 'far-shore'))).toBe('/breweries');
  rememberBrewery('orla', 'far-shore');
  expect(homeOf(somebody('orla', 'reedbed', 'far-shore'))).toBe('/b/far-shore');
});

it('keeps it by person, and forgets one that they no longer belong to', () => {
  rememberBrewery('orla', 'far-shore');
  expect(homeOf(somebody('ned', 'reedbed', 'far-shore'))).toBe('/breweries');
  expect(homeOf(somebody('orla', 'reedbed', 'estuary'))).toBe('/breweries');
});

it('does without storage where a browser keeps nothing', () => {
  vi.stubGlobal('localStorage', {
    getItem() {
      throw new Error('denied');
    },
    setItem() {
      throw new Error('denied');
    },
  });
  expect(() => rememberBrewery('orla', 'reedbed')).not.toThrow();
  expect(lastBrewery('orla')).toBeNull();
});

it('lists what is lost, leaving out what there is none of', () => {
  const none = { seasons: 0, chains: 0, batches: 0, yeasts: 0, vessels: 0, comments: 0, shared: 0 };
  const loss = { id: 'x', name: 'Estuary', ...none };
  expect(lossWords(loss)).toBe('the whole record');
  expect(lossWords({ ...loss, seasons: 1, batches: 12 })).toBe(
    '1 season, 12 batches and the whole record',
  );
});
