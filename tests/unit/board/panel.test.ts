import { describe, expect, it } from 'vitest';
import { makeBatch } from '../../support/boards.ts';
import { missingFields } from '../../../src/routes/board/panel/missingFields.ts';
import { spanWords } from '../../../src/routes/board/panel/keepWords.ts';
import { panelOf } from '../../../src/routes/board/view/useBoardPanel.ts';

describe('what the address opens', () => {
  it.each([
    ['', null],
    ['link=a', { kind: 'link', laterId: 'a' }],
    ['batch=b', { kind: 'batch', batchId: 'b' }],
    ['new=chain', { kind: 'new', what: 'chain' }],
    ['new=batch&like=c', { kind: 'new', what: 'batch', likeId: 'c' }],
    ['new=castle', null],
    ['link=', null],
  ])('%s', (search, panel) => {
    expect(panelOf(new URLSearchParams(search))).toEqual(panel);
  });
});

describe('facts that a check waits for', () => {
  const earlier = makeBatch(1, { ibu: null, dryHops: null });
  const later = makeBatch(2, { ibu: 30, dryHops: [] });
  it('are asked of the batch that lacks them, each once', () => {
    const unchecked = [
      { rule: 'mild-to-bitter', missing: ['ibu'] },
      { rule: 'hops-in-cake', missing: ['dryHop', 'ibu'] },
    ] as const;
    const asked = missingFields(
      unchecked.map((rule) => ({ rule: rule.rule, missing: [...rule.missing] })),
      [earlier, later],
    );
    expect(asked.map(({ batch, field }) => [batch.id, field])).toEqual([
      [earlier.id, 'ibu'],
      [earlier.id, 'dryHops'],
    ]);
  });
  it('leave out what belongs to no batch', () => {
    expect(missingFields([{ rule: 'headspace', missing: ['capacityL'] }], [earlier])).toEqual([]);
  });
});

describe('an interval of a cake', () => {
  const metric = { system: 'metric', gravity: 'sg', colour: 'srm', temperature: 'c' } as const;
  it('names a shared unit once', () => {
    expect(spanWords({ low: 1.05, high: 2.94 }, metric)).toBe('1.05–2.94 L');
    expect(spanWords({ low: 0.4, high: 1.2 }, metric)).toBe('400 mL–1.2 L');
  });
});
