/**
 * Where the aerial stands.
 *
 * @module radio/site
 */

/** Classes of ground by conductivity and permittivity. */
export type Ground = 'sea' | 'wet' | 'average' | 'dry' | 'poor';

/** Environmental classes of man-made noise of ITU-R P.372. */
export type NoiseClass = 'city' | 'residential' | 'rural' | 'quiet';

/** ITU Region: 1 Europe and Africa, 2 the Americas, 3 Asia and the Pacific. */
export type ItuRegion = 1 | 2 | 3;

/** Time of day for which powers and propagation are taken. */
export type Period = 'day' | 'night';

/** When something is received: everywhere by day, everywhere at night, or at a moment. */
export type ReceptionTime = Period | Date;

/** A receiving site. What is null was not given; each computation says what it needs. */
export interface Site {
  readonly latitude: number | null;
  readonly longitude: number | null;
  readonly ground: Ground | null;
  readonly noise: NoiseClass | null;
  /** Indoors, in a modern house: the noise is 25 dB higher. */
  readonly indoors: boolean;
  /** Measured noise field in the receiver's bandwidth, dB(uV/m), at every frequency; or null. */
  readonly noiseFloorDb: number | null;
  readonly ituRegion: ItuRegion;
}
