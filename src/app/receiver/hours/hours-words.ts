import type { BreakthroughHoursAnswer } from '../../../../shared/contracts/breakthrough-hours';
import { clock } from '../../charts/day-strip/time-axis';
import { whole } from '../../charts/readings';

type Hour = BreakthroughHoursAnswer['hours'][number];
type Kind = 'breakthrough' | 'image';

const MINUTE_MS = 60_000;
const DAY_MINUTES = 24 * 60;
/** A swing smaller than this is none: levels are not known better. */
const LEAST_SWING_DB = 3;

/** Minutes since midnight UTC. */
export const minutesOf = (at: string): number => (Date.parse(at) / MINUTE_MS) % DAY_MINUTES;

const clockOf = (at: string): string => clock(minutesOf(at));

/** When breakthrough and image rise and fall, in two sentences with their own numbers. */
export function hoursSentence(
  { hours, rises, falls }: BreakthroughHoursAnswer,
  nameOf: (station: number) => string,
): string {
  const through = peak(hours, 'breakthrough');
  const image = peak(hours, 'image');
  if (!through && !image) {
    return $localize`Neither breakthrough nor an image is heard at any hour of this day.`;
  }
  return [
    through ? throughText(through, hours, { rises, falls }, nameOf) : noBreakthrough(),
    image ? imageText(image, hours, nameOf) : $localize`No image is heard all day.`,
  ].join(' ');
}

const noBreakthrough = (): string => $localize`No breakthrough is heard all day.`;

function throughText(
  loudest: Peak,
  hours: readonly Hour[],
  { rises, falls }: Pick<BreakthroughHoursAnswer, 'rises' | 'falls'>,
  nameOf: (station: number) => string,
): string {
  const at = peakText(loudest, nameOf);
  const steady = levelText(loudest, nameOf);
  if (rises.length === 0 && falls.length === 0) {
    return swingOf(hours, 'breakthrough') < LEAST_SWING_DB
      ? $localize`Breakthrough is as strong at every hour: ${steady}:peak:.`
      : $localize`Breakthrough is loudest ${at}:peak:.`;
  }
  const up = rises.map(clockOf).join(', ');
  const down = falls.map(clockOf).join(', ');
  const turns = [
    ...(up ? [$localize`has risen by ${up}:times:`] : []),
    ...(down ? [$localize`has fallen by ${down}:times:`] : []),
  ].join($localize` and `);
  return $localize`Breakthrough ${turns}:turns: UTC; it is loudest ${at}:peak:.`;
}

function imageText(
  loudest: Peak,
  hours: readonly Hour[],
  nameOf: (station: number) => string,
): string {
  const [at, steady] = [peakText(loudest, nameOf), levelText(loudest, nameOf)];
  return swingOf(hours, 'image') < LEAST_SWING_DB
    ? $localize`The worst image hardly changes: ${steady}:peak:.`
    : $localize`The worst image is loudest ${at}:peak:.`;
}

type Peak = { readonly at: string } & NonNullable<Hour['image']>;

function peak(hours: readonly Hour[], kind: Kind): Peak | undefined {
  return hours
    .flatMap((hour) => (hour[kind] ? [{ at: hour.at, ...hour[kind] }] : []))
    .sort((a, b) => b.levelDb - a.levelDb)[0];
}

const peakText = (loudest: Peak, nameOf: (station: number) => string): string =>
  $localize`at ${clockOf(loudest.at)}:time:, ${levelText(loudest, nameOf)}:level:`;

const levelText = ({ levelDb, station }: Peak, nameOf: (station: number) => string): string =>
  $localize`${nameOf(station)}:station: with ${whole(levelDb)}:level: dB(µV/m)`;

/** Infinite where it comes and goes altogether. */
function swingOf(hours: readonly Hour[], kind: Kind): number {
  const levels = hours.map((hour) => hour[kind]?.levelDb ?? -Infinity);
  return Math.max(...levels) - Math.min(...levels);
}
