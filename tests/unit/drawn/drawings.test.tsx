import { renderToStaticMarkup } from 'react-dom/server';
import { describe, expect, it } from 'vitest';
import { VERDICTS } from '#shared/rules/vocabulary.ts';
import { flatBeer, pathAcross, vesselStops } from '../../../src/components/drawn/beerPaint.ts';
import { CakeBand } from '../../../src/components/drawn/CakeBand.tsx';
import { DateTag } from '../../../src/components/drawn/DateTag.tsx';
import { VerdictPill } from '../../../src/components/drawn/VerdictPill.tsx';
import { Vessel, type VesselProps } from '../../../src/components/drawn/Vessel.tsx';

const pale: VesselProps = { shape: 'bucket', srm: 4, fill: 0.7, cake: 0.03, stage: 'racked' };
const markup = (props: Partial<VesselProps>) =>
  renderToStaticMarkup(<Vessel {...pale} {...props} />);
const idsOf = (html: string) => [...html.matchAll(/ id="([^"]+)"/g)].map((match) => match[1]);

describe('a vessel', () => {
  it('shares no paint with the vessel beside it', () => {
    const ids = idsOf(
      renderToStaticMarkup(
        <>
          <Vessel {...pale} />
          <Vessel {...pale} srm={40} />
        </>,
      ),
    );
    expect(ids.length).toBeGreaterThan(4);
    expect(new Set(ids).size).toBe(ids.length);
  });

  it('is dashed only while it is pencilled', () => {
    expect(markup({ stage: 'pencilled' })).toContain('stroke-dasharray');
    for (const stage of ['fermenting', 'racked'] as const)
      expect(markup({ stage })).not.toContain('stroke-dasharray');
  });

  it('stays clear where the colour is unknown', () => {
    expect(markup({ srm: null })).not.toContain('stop-color:');
    expect(markup({})).toContain('stop-color:');
  });

  it('has its words for a screen reader, or none at all', () => {
    expect(markup({ label: 'Bucket, 70 % full' })).toContain(
      'role="img" aria-label="Bucket, 70 % full"',
    );
    expect(markup({})).toContain('aria-hidden="true"');
  });

  it('carries hops and foam only where they are', () => {
    expect(markup({ hops: true })).toContain('fill-hop');
    expect(markup({ foam: true })).toContain('fill-foam');
    expect(markup({})).not.toMatch(/fill-hop|fill-foam/);
  });
});

describe('the paint of a beer', () => {
  it('is longest in the middle and never thinner than 0.9 cm', () => {
    expect(pathAcross(4.2, 0)).toBeCloseTo(4.2, 10);
    expect(pathAcross(4.2, 1)).toBe(0.9);
    expect(pathAcross(4.2, -0.5)).toBe(pathAcross(4.2, 0.5));
  });

  it('has a colour for each theme, the dark one lit from behind', () => {
    const [, light = '', dark = ''] =
      /light-dark\((rgb\([^)]*\)), (rgb\([^)]*\))\)/.exec(flatBeer(10)) ?? [];
    const sum = (rgb: string) => [...rgb.matchAll(/[\d.]+/g)].reduce((n, m) => n + Number(m[0]), 0);
    expect(sum(dark)).toBeGreaterThan(sum(light));
    expect(vesselStops(10)).toHaveLength(9);
  });
});

describe('a verdict', () => {
  it('differs in shape and in word, not in colour alone', () => {
    const drawn = VERDICTS.map((verdict) =>
      renderToStaticMarkup(<VerdictPill verdict={verdict} findings={2} unchecked={1} />),
    );
    const shapes = drawn.map((html) => html.slice(html.indexOf('<svg'), html.indexOf('</svg>')));
    expect(new Set(shapes).size).toBe(3);
    const words = drawn.map((html) => html.replace(/<[^>]+>/g, '|').replace(/\|+/g, '|'));
    expect(words).toEqual([
      '|Pour|1 not checked|',
      '|Mind 2|1 not checked|',
      '|Hold 2|1 not checked|',
    ]);
  });

  it('tears the band of a Hold and flecks that of a Mind', () => {
    const band = (verdict: 'pour' | 'mind' | 'hold', hops = false) =>
      renderToStaticMarkup(<CakeBand width={200} verdict={verdict} hops={hops} />);
    expect(band('hold')).toContain('<clipPath');
    expect(band('mind')).toContain('<ellipse');
    expect(band('mind')).not.toContain('fill-hop');
    expect(band('mind', true)).toContain('fill-hop');
    expect(band('pour')).not.toMatch(/<ellipse|<clipPath/);
  });
});

describe('a date tag', () => {
  it('names its day for machines and says where there is none', () => {
    expect(renderToStaticMarkup(<DateTag day="2027-04-03" />)).toContain('dateTime="2027-04-03"');
    expect(renderToStaticMarkup(<DateTag day={null} />)).toContain('no date');
  });
});
