/** One measured figure beside the figure to reach. */
export interface Row {
  what: string;
  reach: string;
  measured: string;
  holds: boolean;
}

/** A part of the bench: measures its rows when it is run. */
export interface Part {
  name: string;
  run(): Promise<Row[]>;
}
