import type { Beer } from './batchForm.ts';

const beer = (name: string, style: string, og: string, srm: string, ibu: string): Beer => ({
  name,
  style,
  og,
  srm,
  ibu,
});

/** A dozen beers that a small team might plan for a spring. */
export const DOZEN: readonly Beer[] = [
  { ...beer('Creek Blonde', 'Blonde ale', '1.044', '4', '20'), volume: '23' },
  beer('Ebb Pale', 'Pale ale', '1.052', '7', '38'),
  beer('Jetty Amber', 'Amber ale', '1.054', '14', '40'),
  beer('Samphire Brown', 'Brown ale', '1.056', '22', '30'),
  beer('Gull Wheat', 'Wheat beer', '1.045', '4', '15'),
  beer('Reed Bitter', 'Bitter', '1.046', '10', '32'),
  beer('Kelp Rye', 'Rye ale', '1.056', '12', '34'),
  beer('Mudlark Porter', 'Porter', '1.058', '28', '34'),
  beer('Withy Mild', 'Mild', '1.038', '16', '18'),
  beer('Fog Bank', 'India pale ale', '1.062', '7', '58'),
  beer('Lantern Stout', 'Stout', '1.060', '35', '42'),
  beer('Long Night', 'Imperial stout', '1.095', '42', '60'),
];
