import type { OriginFact } from '../chart/chart-origin';
import { textWidth } from '../place-labels';

/** The facts in lines no wider than there is room; a fact is not broken. */
export function captionLines(facts: readonly OriginFact[], width: number, size: number): string[] {
  const lines: string[] = [];
  for (const { label, value } of facts) {
    const fact = `${label}: ${value}`;
    const longer = `${lines.at(-1) ?? ''}   ${fact}`;
    if (lines.length > 0 && textWidth(longer, size) <= width) lines[lines.length - 1] = longer;
    else lines.push(fact);
  }
  return lines;
}
