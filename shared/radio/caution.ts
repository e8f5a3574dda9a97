/**
 * What to mind before a set is touched.
 *
 * @module radio/caution
 */

/** Said wherever the product tells someone to touch a set. Common practice. */
export const CAUTION =
  'Caution: high tension, and in some sets mains on the chassis. Use an isolation transformer, ' +
  'one hand and insulated tools, discharge the capacitors and measure; follow local codes and ' +
  'licensed practice.';
