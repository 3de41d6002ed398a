/** A short tone and a buzz, where the device has them. The tone needs a tap before: the switch is one. */
let audio: AudioContext | null = null;

/** To be called from a tap: browsers let nothing sound before. */
export function wakeSound(): void {
  audio ??= new AudioContext();
  void audio.resume();
}

export function signal(): void {
  if ('vibrate' in navigator) navigator.vibrate([300, 150, 300, 150, 300]);
  if (!audio || audio.state !== 'running') return;
  for (const [at, pitch] of [
    [0, 660],
    [0.25, 880],
    [0.5, 660],
  ] as const) {
    const tone = audio.createOscillator();
    const loud = audio.createGain();
    tone.frequency.value = pitch;
    loud.gain.setValueAtTime(0.25, audio.currentTime + at);
    loud.gain.exponentialRampToValueAtTime(0.001, audio.currentTime + at + 0.22);
    tone.connect(loud).connect(audio.destination);
    tone.start(audio.currentTime + at);
    tone.stop(audio.currentTime + at + 0.24);
  }
}
