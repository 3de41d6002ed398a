const KEY = 'barmkin-keys';

/** Whether single keys do something, on this device. */
export function areKeysOn(): boolean {
  try {
    return localStorage.getItem(KEY) !== 'off';
  } catch {
    return true;
  }
}

export function switchKeys(on: boolean): void {
  try {
    localStorage.setItem(KEY, on ? 'on' : 'off');
  } catch {
    // Storage may be shut off; the keys then stay as they are.
  }
}
