/**
 * Electrical constants of the ground and what follows from them at a frequency.
 *
 * Source: definition of the complex permittivity; ground classes from memory of ITU-R P.527, not
 * re-read.
 *
 * @module radio/propagation/ground
 */
import { complex, type Complex, divide, squareRoot, subtract } from '../mathematics/complex.ts';
import type { Ground } from '../site.ts';

/** Constants of a kind of ground. */
export interface GroundConstants {
  /** Relative permittivity. */
  readonly permittivity: number;
  /** Conductivity, S/m. */
  readonly conductivity: number;
}

/**
 * Constants of the classes of ground.
 * Source: from memory of the classes of ITU-R P.527 and P.832, rounded, not re-read.
 */
export const GROUNDS: Readonly<Record<Ground, GroundConstants>> = {
  sea: { permittivity: 80, conductivity: 5 },
  wet: { permittivity: 30, conductivity: 0.01 },
  average: { permittivity: 15, conductivity: 0.005 },
  dry: { permittivity: 15, conductivity: 0.001 },
  poor: { permittivity: 7, conductivity: 0.0003 },
};

/** Speed of light in vacuum, m/s. */
const LIGHT = 299_792_458;
/** 1 / (2 pi epsilon0 c), ohms. */
const SIXTY_OHMS = 59.9584916;

/**
 * Wavelength in vacuum.
 *
 * @param frequencyHz Frequency, hertz, above 0.
 * @returns Wavelength, metres.
 * @example
 *   wavelength(1_000_000); // 299.792
 */
export const wavelength = (frequencyHz: number): number => LIGHT / frequencyHz;

/**
 * Complex relative permittivity of the ground, `eta = eps - j 59.958 lambda sigma`.
 *
 * @param frequencyHz Frequency, hertz, above 0.
 * @param ground Constants of the ground.
 * @returns eta.
 * @example
 *   complexPermittivity(1_000_000, GROUNDS.average); // 15 - 89.8755j
 */
export function complexPermittivity(frequencyHz: number, ground: GroundConstants): Complex {
  return complex(ground.permittivity, -SIXTY_OHMS * wavelength(frequencyHz) * ground.conductivity);
}

/**
 * Surface impedance of the ground to vertical polarisation relative to free space,
 * `delta = sqrt(eta - 1) / eta`.
 *
 * Source: N. DeMinco, Medium Frequency Propagation Prediction Techniques and Antenna Modeling for
 * Intelligent Transportation Systems (ITS) Broadcast Applications, NTIA Report 99-368, 1999,
 * equation 15.
 *
 * @param frequencyHz Frequency, hertz, above 0.
 * @param ground Constants of the ground.
 * @returns delta.
 * @example
 *   surfaceImpedance(1_000_000, GROUNDS.sea); // 0.0023597 + 0.0023576j
 */
export function surfaceImpedance(frequencyHz: number, ground: GroundConstants): Complex {
  const eta = complexPermittivity(frequencyHz, ground);
  return divide(squareRoot(subtract(eta, complex(1))), eta);
}
