/**
 * Dry air as an ideal gas. K, Pa in; kg/m³, m/s out.
 * Source: ideal-gas law and Newton–Laplace speed of sound; R and γ of dry air as in ISO 2533, "Standard Atmosphere", 1975.
 */
import type { Air } from '../chain';

/** J/(kg·K). */
export const GAS_CONSTANT = 287.05;
/** Ratio of specific heats, dimensionless. */
export const GAMMA = 1.4;
/** Pa; the pressure a data sheet's Vas belongs to. */
export const STANDARD_PRESSURE = 101_325;
/** K at 0 °C. */
export const ZERO_CELSIUS = 273.15;

/** kg/m³. */
export const density = (air: Air): number => air.pressure / (GAS_CONSTANT * air.temperature);
/** m/s. */
export const soundSpeed = (air: Air): number => Math.sqrt(GAMMA * GAS_CONSTANT * air.temperature);
