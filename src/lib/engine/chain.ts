/**
 * The chain: everything about one plan that the engine needs, in SI (Hz, m, m², m³, kg, N, V, A, W, Pa, K, s; dB where named).
 * The plan file's own units stop at `plan/`; what is not given is null.
 */
import type { Block } from './shaping/block';

export interface Air {
  /** Kelvin. */
  readonly temperature: number;
  /** Pascal. */
  readonly pressure: number;
}

export interface Goal {
  /** dB re 20 µPa RMS of a steady tone at the seat, delivered at the pivot. */
  readonly level: number;
  /** Hz. The band in which the level is wanted flat. */
  readonly from: number;
  readonly to: number;
  readonly pivot: number;
  /** dB by which the delivered level may fall short inside the band. */
  readonly tolerance: number;
}

export interface Programme {
  /** Hz. No content below. */
  readonly lowest: number;
  /** Peak over RMS, dB; a sine has 3.01. */
  readonly crest: number;
}

export interface Rating {
  readonly power: number;
  readonly load: number;
}

export interface Amplifier {
  readonly ratings: readonly Rating[];
  /** dB from input to terminals; null when not given. */
  readonly gain: number | null;
  readonly outputResistance: number;
  /** Ohm; 0 when not given. */
  readonly minimumLoad: number;
  readonly efficiency: number;
}

export type CoilWiring = 'single' | 'series' | 'parallel';
export type DriverWiring = 'series' | 'parallel';
export type Facing = 'side' | 'down' | 'up';

/** What a data sheet says of one driver. Coil values (re, le, l2, r2, bl, nominal) are per coil; qes, qts with all coils driven. */
export interface DriverSheet {
  readonly count: number;
  readonly coils: number;
  readonly coilWiring: CoilWiring;
  readonly driverWiring: DriverWiring;
  readonly fs: number | null;
  readonly qms: number | null;
  readonly qes: number | null;
  readonly qts: number | null;
  readonly vas: number | null;
  readonly re: number;
  readonly le: number;
  readonly l2: number | null;
  readonly r2: number | null;
  readonly sd: number;
  readonly nominal: number | null;
  readonly mms: number | null;
  readonly cms: number | null;
  readonly bl: number | null;
  readonly rms: number | null;
  readonly xmax: number | null;
  readonly xmech: number | null;
  readonly facing: Facing | null;
  /** Kelvin above cold of the hot coil. */
  readonly coilRise: number;
  readonly power: number | null;
  /** m³ taken from the box by one driver; null when not given. */
  readonly displacement: number | null;
}

export interface Box {
  /** m³, final; or null when `inner` is given. */
  readonly net: number | null;
  readonly inner: number | null;
  readonly bracing: number;
  readonly fillGain: number;
  /** Box Q from absorption and from leakage; null is none. */
  readonly qAbsorption: number | null;
  readonly qLeakage: number | null;
}

export type Airtightness = 'tight' | 'typical' | 'leaky';

export interface OpenAir {
  readonly kind: 'open-air';
  readonly doubt: number;
}

export interface PressureGainRoom {
  readonly kind: 'pressure-gain';
  readonly length: number;
  readonly width: number;
  readonly height: number;
  readonly airtightness: Airtightness;
  /** dB; null takes the cap of the airtightness. */
  readonly cap: number | null;
  /** m to up to three perpendicular boundaries. */
  readonly boundaries: readonly number[];
  /** dB per doubling of distance. */
  readonly distanceLoss: number;
  readonly doubt: number;
}

export type Room = OpenAir | PressureGainRoom;

export interface Chain {
  readonly air: Air;
  readonly goal: Goal;
  readonly programme: Programme;
  readonly copies: number;
  readonly shaping: readonly Block[];
  readonly amplifier: Amplifier;
  /** Ohm, the whole loop. */
  readonly cableResistance: number;
  readonly driver: DriverSheet;
  readonly box: Box;
  readonly room: Room;
  /** m from the box to the seat. */
  readonly seatDistance: number;
}
