import { serverClock } from '../../../api/serverClock.ts';

/** When something is, by this device's clock, and by how much that clock is off. */
export const deviceTime = () => ({
  deviceAt: new Date().toISOString(),
  clockOffsetMs: serverClock.offsetMs(),
});
export type DeviceTime = ReturnType<typeof deviceTime>;
