/** The columns that shelf and plots share, px. A batch's middle is where its vessel stands. */
export const COLUMN = { label: 132, cell: 226, vessel: 72 } as const;

export const middleOf = (place: number): number => place * COLUMN.cell + COLUMN.vessel / 2;
/** Where the link behind a batch is drawn. */
export const betweenOf = (place: number): number => middleOf(place) + COLUMN.cell / 2;
export const widthOf = (batches: number): number => Math.max(1, batches) * COLUMN.cell;
