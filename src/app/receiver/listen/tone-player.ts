import { DestroyRef, DOCUMENT, inject, Injectable, InjectionToken, signal } from '@angular/core';

import type { Tone } from '../../../../shared/radio/listen/audible-beats';

/** Makes what sounds; a fake in specs. */
export const MAKE_AUDIO = new InjectionToken<() => AudioContext>('makes an audio context', {
  providedIn: 'root',
  factory: () => () => new AudioContext(),
});

interface Voice {
  readonly oscillator: OscillatorNode;
  readonly gain: GainNode;
}

interface Sounding {
  readonly context: AudioContext;
  readonly master: GainNode;
  readonly voices: Voice[];
}

/** Time in which a level or a pitch is reached: no click, no glide to be heard; seconds. */
const SMOOTH = 0.03;
const FADE_MS = 120;

/**
 * Plays tones, softly, through a limiter. Silent until it is started by hand, and again as soon as
 * the page is left or hidden.
 */
@Injectable()
export class TonePlayer {
  private readonly make = inject(MAKE_AUDIO);
  private readonly document = inject(DOCUMENT);
  private sounding: Sounding | null = null;

  readonly isOn = signal(false);
  /** No sound could be had. */
  readonly isMute = signal(false);

  constructor() {
    const leave = () => {
      if (this.document.visibilityState === 'hidden') this.stop();
    };
    this.document.addEventListener('visibilitychange', leave);
    inject(DestroyRef).onDestroy(() => {
      this.document.removeEventListener('visibilitychange', leave);
      this.stop();
    });
  }

  /** Call from a press of a button: browsers give no sound otherwise. */
  start(tones: readonly Tone[], volume: number): void {
    if (this.sounding) return;
    try {
      this.sounding = this.open();
    } catch {
      this.isMute.set(true);
      return;
    }
    this.isMute.set(false);
    this.isOn.set(true);
    void this.sounding.context.resume();
    this.play(tones, volume);
  }

  /** Goes over to other tones; silent while stopped. */
  play(tones: readonly Tone[], volume: number): void {
    if (!this.sounding) return;
    const { context, master, voices } = this.sounding;
    const now = context.currentTime;
    master.gain.setTargetAtTime(Math.min(Math.max(volume, 0), 1), now, SMOOTH);
    while (voices.length < tones.length) voices.push(voice(context, master));
    voices.forEach(({ oscillator, gain }, at) => {
      const tone = tones[at];
      gain.gain.setTargetAtTime(tone?.amplitude ?? 0, now, SMOOTH);
      if (tone) oscillator.frequency.setTargetAtTime(tone.pitchHz, now, SMOOTH);
    });
  }

  stop(): void {
    if (!this.sounding) return;
    const { context, master, voices } = this.sounding;
    this.sounding = null;
    this.isOn.set(false);
    master.gain.setTargetAtTime(0, context.currentTime, SMOOTH);
    setTimeout(() => {
      for (const { oscillator } of voices) oscillator.stop();
      void context.close();
    }, FADE_MS);
  }

  private open(): Sounding {
    const context = this.make();
    const master = context.createGain();
    master.gain.value = 0;
    // The tones never add up to more than a quarter of full scale; this is for what nobody foresaw.
    const limiter = context.createDynamicsCompressor();
    limiter.threshold.value = -12;
    limiter.knee.value = 0;
    limiter.ratio.value = 20;
    limiter.attack.value = 0.002;
    limiter.release.value = 0.1;
    master.connect(limiter);
    limiter.connect(context.destination);
    return { context, master, voices: [] };
  }
}

function voice(context: AudioContext, master: GainNode): Voice {
  const [oscillator, gain] = [context.createOscillator(), context.createGain()];
  gain.gain.value = 0;
  oscillator.connect(gain);
  gain.connect(master);
  oscillator.start();
  return { oscillator, gain };
}
