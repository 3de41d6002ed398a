/** What was read of the demo's batches; days and hours count from noon of the brew day. */
export interface DemoReadings {
  batch: string;
  by: 'Mo' | 'Tamsin';
  /** Day, SG, and the sample's temperature where it was not 20 °C. */
  gravity: readonly (readonly [day: number, sg: number, sampleC?: number])[];
  /** Day, °C. */
  temperature: readonly (readonly [day: number, c: number])[];
  events: readonly {
    day: number;
    kind: 'dry-hop' | 'addition' | 'yeast-taken' | 'other';
    text: string;
  }[];
  notes: readonly { day: number; text: string }[];
}

export const DEMO_READINGS: readonly DemoReadings[] = [
  {
    batch: 'Low Tide Blonde',
    by: 'Tamsin',
    gravity: [
      [0.1, 1.044],
      [1, 1.039],
      [2, 1.029],
      [4, 1.015],
      [7, 1.0118],
      [10, 1.011],
      [13.5, 1.011],
    ],
    temperature: [
      [0.1, 18.6],
      [1, 19.4],
      [2, 20],
      [4, 19.4],
      [7, 19],
      [10, 19],
      [13.5, 18.8],
    ],
    events: [],
    notes: [{ day: 13.6, text: 'Clear to the bottom. Nothing buttery after a warm night.' }],
  },
  {
    batch: 'Jetty Pale',
    by: 'Mo',
    gravity: [
      [0.1, 1.0505, 26],
      [1, 1.047],
      [2, 1.036],
      [3, 1.0265],
      [4, 1.0185],
      [6, 1.0128],
      [9, 1.0118],
      [11, 1.011],
      [13, 1.011],
    ],
    temperature: [
      [0.1, 18.4],
      [0.5, 18.8],
      [1, 19.3],
      [1.5, 19.6],
      [2, 19.9],
      [2.5, 20.2],
      [3, 20.1],
      [4, 19.6],
      [5, 19.4],
      [6, 19.2],
      [8, 19.2],
      [10, 19],
      [11, 18.9],
      [12, 19.1],
      [13, 19],
    ],
    events: [{ day: 5, kind: 'dry-hop', text: '46 g' }],
    notes: [{ day: 5, text: 'Hops went in loose after all: the bag split.' }],
  },
];
