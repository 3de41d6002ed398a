/** What a device says of when something was, and when that came here. */
interface Told {
  deviceAt: Date;
  clockOffsetMs: number;
  arrivedAt: Date;
}

/** When it was: the device's clock put right by what it measured. Nothing happens after it arrives. */
export const happenedAt = ({ deviceAt, clockOffsetMs, arrivedAt }: Told): Date =>
  new Date(Math.min(deviceAt.getTime() + clockOffsetMs, arrivedAt.getTime()));

export const asTold = (
  { deviceAt, clockOffsetMs }: { deviceAt: string; clockOffsetMs: number },
  now: Date,
): Told => ({ deviceAt: new Date(deviceAt), clockOffsetMs, arrivedAt: now });
