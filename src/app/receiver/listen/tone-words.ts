import type { Tone } from '../../../../shared/radio/listen/audible-beats';
import { whole } from '../../charts/readings';

/** What is played, or would be, in words. */
export function toneWords(tones: readonly Tone[]): string {
  const [loudest, ...others] = tones;
  if (!loudest) return $localize`No tone an ear could hear: zero beat, or a pitch beyond 12 kHz.`;
  const softer = others.map(({ pitchHz, amplitude }) => {
    const less = whole(20 * Math.log10(loudest.amplitude / amplitude));
    return $localize`${pitchHz}:pitch: Hz, ${less}:level: dB softer`;
  });
  const first = $localize`A tone of ${loudest.pitchHz}:pitch: Hz`;
  return `${[first, ...softer].join('; ')}.`;
}
