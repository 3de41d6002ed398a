import type { Batch, Link } from '../api/batch.ts';
import type { Season } from '../api/brewery.ts';
import type { Chain } from '../api/chain.ts';
import type { Vessel } from '../api/vessel.ts';
import type { Yeast } from '../api/yeast.ts';
import { listed } from '../rules/say.ts';
import { formatDay } from '../units/day.ts';
import { factChanges, factSentence, type FactChange, type FactTable } from './facts.ts';
import { fieldsFor, type Sayer } from './words.ts';

/** What a change is called in the record and on the undo button, with each fact that it changed. */
export interface Told {
  what: string;
  facts: FactChange[];
}

function batchTable(sayer: Sayer): FactTable {
  const as = fieldsFor(sayer);
  return {
    style: as.text('style'),
    volumeL: as.quantity('volume')('volume'),
    og: as.quantity('gravity')('original gravity'),
    fg: as.quantity('gravity')('final gravity'),
    srm: as.quantity('colour')('colour'),
    ibu: as.quantity('bitterness')('bitterness'),
    fermentC: as.quantity('temperature')('fermentation temperature'),
    daysUnderBeer: as.days('time under beer'),
    brewOn: as.day('brew day'),
    wantedOn: as.day('day it is wanted'),
    dryHops: as.dryHops('dry hops'),
    additions: as.additions('additions'),
    allergens: as.allergens('allergens'),
    cultures: as.cultures('cultures'),
    trub: as.text('trub'),
    vesselId: as.named('vessel'),
    yeastId: as.named('yeast asked for'),
    notes: as.note('notes'),
  };
}

/** A row's facts changed, maybe with its name. */
function told(table: FactTable, before: { name: string }, after: { name: string }, a = ''): Told {
  const facts = factChanges(table, before, after);
  const renamed = before.name !== after.name;
  if (renamed) facts.unshift({ label: 'name', from: before.name, to: after.name });
  const what =
    renamed && facts.length === 1
      ? `Renamed ${a}${before.name} to ${after.name}`
      : factSentence(`of ${a}${before.name}`, `Changed ${a}${before.name}`, facts);
  return { what, facts };
}

export const tellBatch = (sayer: Sayer, before: Batch, after: Omit<Batch, 'id'>): Told =>
  told(batchTable(sayer), before, after);

export function tellLink(sayer: Sayer, name: string, before: Link, after: Link): Told {
  const as = fieldsFor(sayer);
  const keeps = ({ keepWhole, keepL }: Link) => ({ kept: keepWhole ? 'all of it' : keepL });
  const part = as.quantity('smallVolume')('');
  const table: FactTable = {
    kept: {
      label: 'kept part',
      say: (value) =>
        typeof value === 'string' ? value : (part.say(value) ?? 'the recommended part'),
    },
    takenOn: as.day('day of taking'),
    leftAboveL: as.quantity('smallVolume')('beer left above'),
    cakeC: as.quantity('temperature')('temperature of the wait'),
    starter: as.yesNo('starter'),
  };
  const of = `of the cake under ${name}`;
  const facts = factChanges(table, { ...before, ...keeps(before) }, { ...after, ...keeps(after) });
  return { what: factSentence(of, `Changed the cake under ${name}`, facts), facts };
}

export function tellYeast(sayer: Sayer, before: Yeast, after: Omit<Yeast, 'id' | 'version'>): Told {
  const as = fieldsFor(sayer);
  const degrees = as.quantity('temperature');
  return told(
    {
      kind: as.text('kind'),
      character: as.yesNo('marked character'),
      fermentMinC: degrees('lowest fermentation temperature'),
      fermentMaxC: degrees('highest fermentation temperature'),
      pourMinC: degrees('lowest pouring temperature'),
      pourMaxC: degrees('highest pouring temperature'),
      neverAboveC: degrees('temperature never to exceed'),
      generationLimit: as.count('generation limit'),
      attenuation: as.percent('attenuation'),
      packPrice: as.money('price of a pack'),
      notes: as.note('notes'),
    },
    before,
    after,
  );
}

export function tellVessel(
  sayer: Sayer,
  before: Vessel,
  after: Omit<Vessel, 'id' | 'version'>,
): Told {
  const as = fieldsFor(sayer);
  const degrees = as.quantity('temperature');
  return told(
    {
      shape: as.text('shape'),
      capacityL: as.quantity('volume')('capacity'),
      blowOff: as.yesNo('blow-off tube'),
      minC: degrees('lowest temperature'),
      maxC: degrees('highest temperature'),
      cleanedOn: as.day('day of cleaning'),
      notes: as.note('notes'),
    },
    before,
    after,
  );
}

export function tellChain(sayer: Sayer, before: Chain, after: Chain): Told {
  const as = fieldsFor(sayer);
  const table: FactTable = {
    yeastId: as.named('yeast'),
    vesselId: as.named('vessel'),
    start: { label: 'start', say: (value) => startWords(sayer, value as Chain['start']) },
    position: {
      label: 'place',
      say: (value) => (typeof value === 'number' ? String(value + 1) : null),
    },
  };
  return told(table, before, after, 'the shelf ');
}

function startWords({ nameOf, currency, units }: Sayer, start: Chain['start']): string {
  const as = fieldsFor({ nameOf, currency, units });
  switch (start.kind) {
    case 'pack':
      return priced('a fresh pack', as.money('').say(start.price));
    case 'cake':
      return `the cake of ${nameOf(start.batchId) ?? 'a batch that is gone'}`;
    case 'outside':
      return priced(`slurry of generation ${start.generation}`, as.money('').say(start.price));
  }
}

const priced = (what: string, price: string | null) =>
  price === null ? what : `${what} at ${price}`;

const WEEKDAYS = ['Mon', 'Tue', 'Wed', 'Thu', 'Fri', 'Sat', 'Sun'];
const weekdays = (days: readonly number[]): string =>
  days.length === 0 ? 'no day' : listed(days.map((day) => WEEKDAYS[day - 1] ?? ''));

const dayOrNone = (value: unknown): string | null =>
  typeof value === 'string' ? `${formatDay(value)} ${value.slice(0, 4)}` : null;

export function tellSeason(before: Season, after: Season): Told {
  const { blocked, freed } = blockedChange(before.blockedDays, after.blockedDays);
  const rest = told(
    {
      brewWeekdays: { label: 'brew days', say: (value) => weekdays(value as number[]) },
      brewsPerDay: { label: 'brews a day', say: String },
      firstDay: { label: 'first day', say: dayOrNone },
      lastDay: { label: 'last day', say: dayOrNone },
    },
    before,
    after,
    'the season ',
  );
  if (blocked.length + freed.length === 0) return rest;
  const sentences = [
    ...(blocked.length > 0 ? [`blocked ${daysListed(blocked)}`] : []),
    ...(freed.length > 0 ? [`freed ${daysListed(freed)}`] : []),
  ];
  const said = listed(sentences);
  const what =
    rest.facts.length === 0
      ? `${said.charAt(0).toUpperCase()}${said.slice(1)} for brewing`
      : `${rest.what}; ${said}`;
  return { what, facts: rest.facts };
}

function blockedChange(before: readonly string[], after: readonly string[]) {
  return {
    blocked: after.filter((day) => !before.includes(day)),
    freed: before.filter((day) => !after.includes(day)),
  };
}

const DAYS_NAMED = 3;
const daysListed = (days: readonly string[]): string =>
  days.length <= DAYS_NAMED ? listed(days.map(formatDay)) : `${days.length} days`;
