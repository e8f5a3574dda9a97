import { formatFrequency } from '../../ui/frequency-pipe';

/**
 * Stands over what is drawn dimmed while another judgement is computed, so that no old figure is
 * taken for the IF that is set now.
 */
export const awaitedWords = (nowHz: number, drawnHz: number): string =>
  nowHz === drawnHz
    ? $localize`Being computed. What is dimmed was drawn before the change.`
    : $localize`Being computed for ${formatFrequency(nowHz)}:now:. What is dimmed still holds for ${formatFrequency(drawnHz)}:drawn:.`;
