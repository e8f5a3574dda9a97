import type { ImportColumn, ImportField } from '../../shared/contracts/list-import.ts';

const AXES = ['latitude', 'longitude'] as const;

/** Why the coordinates of a list cannot be read: columns lacking or doubled, each in a sentence. */
export function unplaced(columns: readonly ImportColumn[]): string[] {
  const has = (field: ImportField) => columns.some((each) => each.field === field);
  const hasAxis = (axis: (typeof AXES)[number]) => has(axis) || has(`${axis}Degrees`);
  const lacking = AXES.flatMap((axis) => {
    const isPart = has(`${axis}Minutes`) || has(`${axis}Seconds`) || has(`${axis}Hemisphere`);
    if (has(axis) && (has(`${axis}Degrees`) || has(`${axis}Minutes`) || has(`${axis}Seconds`))) {
      return `Say either which column holds the whole ${axis}, or which hold its parts.`;
    }
    if (isPart && !hasAxis(axis)) return `Say which column holds the degrees of the ${axis}.`;
    if (has(`${axis}Seconds`) && !has(`${axis}Minutes`)) {
      return `Say which column holds the minutes of the ${axis}.`;
    }
    return [];
  });
  const [whole, half] = hasAxis('latitude') ? AXES : ([AXES[1], AXES[0]] as const);
  const isHalf = hasAxis(whole) && !hasAxis(half);
  return isHalf && lacking.length === 0 ? [`Say which column holds the ${half}.`] : lacking;
}

/** Columns beside whose numbers a letter can say east or west. */
export const sayEastOrWest = ({ field }: ImportColumn): boolean =>
  field === 'longitude' || field === 'longitudeHemisphere' || field === 'place';
