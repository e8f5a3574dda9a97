import { receiverDraft } from '../../../../../shared/contracts/receiver';
import { formatFrequency } from '../../../ui/frequency-pipe';
import type { ReceiverFields } from './controls';
import { receiverOf } from './fields';

/** Something worth knowing about what is being typed. An error stops the set-up, a warning not. */
export interface Notice {
  readonly kind: 'error' | 'warning';
  readonly text: string;
}

type BandFields = ReceiverFields['bands'][number];
type Range = BandFields & { lowHz: number; highHz: number };

const LEAST_SHAPE_FACTOR = 3.5;
const TRAP_TOLERANCE = 0.03;

/** What stands out in the fields, most serious first. */
export function notices(fields: ReceiverFields): Notice[] {
  return [
    ...contradictions(fields),
    ...ifInsideBand(fields),
    ...steepSelectivity(fields),
    ...filterElsewhere(fields),
    ...bfoOutOfReach(fields),
    ...trapElsewhere(fields),
  ];
}

const warning = (text: string): Notice => ({ kind: 'warning', text });

const isRange = (band: BandFields): band is Range => band.lowHz !== null && band.highHz !== null;

/** What the contract finds between fields that are complete, with the band it is about. */
function contradictions(fields: ReceiverFields): Notice[] {
  const bands = fields.bands.filter(isRange).map((band) => ({ ...band, name: band.name || '?' }));
  const parsed = receiverDraft.safeParse(receiverOf({ ...fields, bands }));
  return (parsed.error?.issues ?? [])
    .filter(({ code }) => code === 'custom')
    .map(({ path: [part, at], message }) => {
      const name = part === 'bands' ? bands[Number(at)]?.name : undefined;
      return { kind: 'error', text: name === undefined ? message : `${name}: ${message}` };
    });
}

function ifInsideBand({ ifHz, bands }: ReceiverFields): Notice[] {
  if (ifHz === null) return [];
  return bands
    .filter(isRange)
    .filter(({ lowHz, highHz }) => lowHz <= ifHz && ifHz <= highHz)
    .map(({ name }) =>
      warning(
        $localize`The IF of ${formatFrequency(ifHz)}:if: lies inside ${name || '?'}:band:. Such sets exist; near that setting nothing keeps the IF out.`,
      ),
    );
}

function steepSelectivity({ selectivity, fixedFilter }: ReceiverFields): Notice[] {
  const { b6Hz, b60Hz, kind } = selectivity;
  if (b6Hz === null || b60Hz === null || kind !== 'widths' || fixedFilter.fitted) return [];
  const factor = b60Hz / b6Hz;
  if (factor <= 1 || factor >= LEAST_SHAPE_FACTOR) return [];
  return [
    warning(
      $localize`A shape factor of ${factor.toFixed(1)}:factor: is better than coil transformers reach. Check the two widths, or say which filter is fitted.`,
    ),
  ];
}

function filterElsewhere({ ifHz, fixedFilter }: ReceiverFields): Notice[] {
  const { fitted, centreHz, widthHz } = fixedFilter;
  if (!fitted || ifHz === null || centreHz === null || widthHz === null) return [];
  if (Math.abs(centreHz - ifHz) <= widthHz / 2) return [];
  return [
    warning(
      $localize`The filter stands on ${formatFrequency(centreHz)}:centre: and does not pass the IF of ${formatFrequency(ifHz)}:if:.`,
    ),
  ];
}

function bfoOutOfReach({ ifHz, bfo }: ReceiverFields): Notice[] {
  const { fitted, centreHz, rangeHz } = bfo;
  if (!fitted || ifHz === null || centreHz === null || rangeHz === null) return [];
  if (Math.abs(centreHz - ifHz) <= rangeHz) return [];
  return [
    warning(
      $localize`The BFO on ${formatFrequency(centreHz)}:centre: does not reach the IF of ${formatFrequency(ifHz)}:if:.`,
    ),
  ];
}

function trapElsewhere({ ifHz, trap }: ReceiverFields): Notice[] {
  const { fitted, inductanceH, capacitanceF } = trap;
  if (!fitted || ifHz === null || inductanceH === null || capacitanceF === null) return [];
  const resonanceHz = Math.round(1 / (2 * Math.PI * Math.sqrt(inductanceH * capacitanceF)));
  if (!Number.isFinite(resonanceHz)) return [];
  if (Math.abs(resonanceHz / ifHz - 1) <= TRAP_TOLERANCE) return [];
  return [
    warning(
      $localize`The trap resonates at ${formatFrequency(resonanceHz)}:resonance:, not at the IF of ${formatFrequency(ifHz)}:if:.`,
    ),
  ];
}
