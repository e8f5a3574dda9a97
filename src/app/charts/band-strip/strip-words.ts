import { formatFrequency } from '../../ui/frequency-pipe';
import { causeMark } from '../cause-mark';
import type { Readout } from '../plot/plot-mark';
import { decibels, field, kilohertz, tenths, whole } from '../readings';
import type { TwinRow } from '../twin-table/twin-table';
import { gradeWord } from './grade-word';
import {
  type HeardMark,
  type JudgedBand,
  type JudgedResponse,
  overNoise,
  responseMark,
  type WantedMark,
} from './strip-layout';

type NameOf = (station: number) => string;

/** What a strip shows, in a sentence with its own numbers. */
export function stripSentence(band: JudgedBand, nameOf: NameOf): string {
  const heard = band.responses.filter(({ hidden, dialHz }) => hidden === null && dialHz !== null);
  const count =
    heard.length === 1
      ? $localize`One response rises over noise and band`
      : $localize`${heard.length}:count: responses rise over noise and band`;
  const rest = band.total - band.responses.length;
  const more = rest > 0 ? $localize` The ${rest}:count: faintest are not drawn.` : '';
  const loudest = heard.reduce<JudgedResponse | undefined>(
    (best, each) =>
      (overNoise(each) ?? -999) > (best ? (overNoise(best) ?? -999) : -999) ? each : best,
    undefined,
  );
  if (!loudest) return $localize`Nothing rises over noise and band here.` + more;
  const { cause, dialHz, station } = loudest;
  return (
    $localize`${count}:count:; the loudest is ${nameOf(station)}:station: (${causeMark(cause).label}:cause:) at ${formatFrequency(dialHz ?? 0)}:dial:, ${whole(overNoise(loudest) ?? 0)}:level: dB over the noise.` +
    more
  );
}

/** Heads of the strip's table. */
export const stripColumns = (): string[] => [
  $localize`Dial, kHz`,
  $localize`Station`,
  $localize`Heard as`,
  $localize`Over the noise, dB`,
  $localize`Ratio, dB`,
  $localize`Grade`,
];

/** The strip's responses as rows, in the order of the answer: the worst first. */
export const stripRows = (band: JudgedBand, nameOf: NameOf): TwinRow[] =>
  band.responses.map((each) => {
    const over = overNoise(each);
    return {
      id: responseMark(band.name, each),
      cells: [
        each.dialHz === null ? $localize`everywhere` : kilohertz(each.dialHz),
        nameOf(each.station),
        causeMark(each.cause).label,
        over === null ? '\u2013' : tenths(over),
        each.ratioDb === null ? '\u2013' : tenths(each.ratioDb),
        gradeWord(each),
      ],
    };
  });

/** What is said about a mark of the strip. */
export function stripReadout(
  id: string,
  heard: readonly HeardMark[],
  wanted: readonly WantedMark[],
  nameOf: NameOf,
  noise: (hz: number) => number | null,
): Readout | undefined {
  const response = heard.find((each) => each.id === id);
  if (response) return responseReadout(response, nameOf);
  const station = wanted.find((each) => each.id === id)?.station;
  if (!station) return undefined;
  const floor = noise(station.frequencyHz);
  return {
    title: `${station.name}, ${formatFrequency(station.frequencyHz)}`,
    lines: [
      { label: $localize`Field`, value: field(station.fieldDb) },
      {
        label: $localize`Over the noise`,
        value: decibels(floor === null ? null : station.fieldDb - floor),
      },
    ],
  };
}

function responseReadout({ response, overNoiseDb, look }: HeardMark, nameOf: NameOf): Readout {
  const { station, dialHz, beatHz, ratioDb } = response;
  return {
    title: $localize`${nameOf(station)}:station: at dial ${formatFrequency(dialHz ?? 0)}:dial:`,
    lines: [
      { label: $localize`Heard as`, value: look.label },
      { label: $localize`Over the noise`, value: decibels(overNoiseDb) },
      { label: $localize`Wanted to unwanted`, value: decibels(ratioDb) },
      { label: $localize`Beat`, value: formatFrequency(beatHz) },
      { label: $localize`Grade`, value: gradeWord(response) },
    ],
  };
}
