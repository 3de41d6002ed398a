import { createFlag } from './flag.ts';

/** Whether one is looking for something by its name. */
export const findStore = createFlag();
/** Whether the keys are told. */
export const keysStore = createFlag();
