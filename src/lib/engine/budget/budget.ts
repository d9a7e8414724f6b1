/**
 * The budget: what comes out when a chain goes in. SI throughout; the report in the plan's units is written in `words/`.
 * Findings and ways out are codes and numbers here; their sentences live in `words/`.
 */
import type { CoilWiring, DriverWiring } from '../chain';
import type { Contradiction, Suspicion } from '../driver/sheet-check';
import type { EquivalentDriver } from '../driver/equivalent';
import type { Alignment } from '../box/alignment';

export type LimitName =
  'amplifier-voltage' | 'amplifier-current' | 'cone-travel' | 'mechanical-stop' | 'coil-heat';

export interface LimitMargin {
  readonly limit: LimitName;
  /** Hz where the margin is smallest. */
  readonly worst: number;
  /** dB, allowed over demanded. */
  readonly margin: number;
  /** What is allowed, and what is demanded at `worst`: V, A or m (one-way peak); heat is counted in amps. */
  readonly allowed: number;
  readonly demanded: number;
}

export interface System {
  readonly f3: number | null;
  readonly f10: number | null;
  /** dB, shaping re the pivot; its frequency; the power it costs. */
  readonly boost: number;
  readonly boostAt: number;
  readonly boostPower: number;
}

export interface Demand {
  readonly peakV: number;
  readonly peakA: number;
  readonly realW: number;
  readonly apparentVA: number;
  readonly ratedW: number;
  /** m, one-way peak. */
  readonly travel: number;
  readonly travelAt: number;
  readonly mainsW: number;
  /** V RMS at the terminals, the largest. */
  readonly terminalV: number;
}

/** One frequency of the ledger. */
export interface LedgerRow {
  readonly nominal: number;
  readonly f: number;
  readonly wanted: number | null;
  readonly delivered: number;
  readonly driverBox: number;
  readonly shaping: number;
  readonly room: number;
  readonly distance: number;
  readonly roomGain: number;
  readonly copies: number;
  readonly driveV: number;
  readonly currentA: number;
  readonly realW: number;
  readonly travel: number;
  readonly margin: number | null;
  readonly limit: LimitName | null;
}

/** The curves: one entry a frequency in every array. A ceiling whose rating is missing is null. */
export interface Curves {
  readonly f: Float64Array;
  readonly delivered: Float64Array;
  /** NaN outside the goal's band. */
  readonly wanted: Float64Array;
  /** Degrees in (−180, 180]. */
  readonly phase: Float64Array;
  /** Seconds. */
  readonly groupDelay: Float64Array;
  readonly shaping: Float64Array;
  readonly driverBox: Float64Array;
  readonly room: Float64Array;
  /** dB, the same at every frequency. */
  readonly copies: number;
  readonly driveV: Float64Array;
  readonly currentA: Float64Array;
  readonly realW: Float64Array;
  readonly apparentVA: Float64Array;
  readonly impedance: Float64Array;
  /** Degrees. */
  readonly impedancePhase: Float64Array;
  readonly travel: Float64Array;
  readonly ceilings: { readonly [L in LimitName]: Float64Array | null };
}

export interface Exposure {
  /** dB(A) long-term, of the subwoofer alone; null when no ledger row lies in the goal's band. */
  readonly levelA: number | null;
  readonly hours: number | null;
  readonly peakC: number;
  readonly peakCAt: number;
}

export interface Limiter {
  readonly terminalV: number;
  readonly inputDbv: number | null;
}

export interface RoomDoubt {
  readonly doubt: number;
  readonly worstMargin: number;
  readonly bestMargin: number;
}

export interface Hot {
  readonly rise: number;
  readonly re: number;
  readonly qtc: number;
  readonly levelLoss: number;
  /** Smallest margin and its limit when the level is still to be delivered. */
  readonly margin: number;
  readonly limit: LimitName;
  readonly worst: number;
  readonly holds: boolean;
}

export type Severity = 'blocking' | 'caution' | 'note';

/**
 * What the plan's owner must know: a code, how grave, where, and the numbers its sentence needs.
 * Each code carries exactly the facts listed here.
 */
export type Finding = {
  readonly severity: Severity;
  readonly at: number | null;
  readonly waysOut: readonly WayOut[];
} & FindingFacts;

export type FindingFacts =
  | {
      readonly code: `limit-${LimitName}`;
      readonly facts: { margin: number; allowed: number; demanded: number; level: number; maxLevel: number };
    }
  /** A limit without its rating: which rating is missing. */
  | { readonly code: 'not-judged'; readonly facts: { missing: readonly ('xmax' | 'xmech' | 'power')[] } }
  | { readonly code: 'margin-thin'; readonly facts: { limit: LimitName; margin: number } }
  /** The room's doubt can turn the verdict: `turnsAt` is how many dB better or worse than estimated it takes. */
  | { readonly code: 'room-doubt'; readonly facts: { holds: boolean; doubt: number; turnsAt: number } }
  | { readonly code: 'infrasonic'; readonly facts: { limit: LimitName; margin: number; from: number } }
  | { readonly code: 'no-high-pass'; readonly facts: { boost: number; boostAt: number } }
  | { readonly code: 'boost-high'; readonly facts: { boost: number; power: number; strong: boolean } }
  | { readonly code: 'boost-short'; readonly facts: { limit: LimitName; boostHere: number; short: number } }
  | { readonly code: 'transform-large'; readonly facts: { lift: number; block: number } }
  | { readonly code: 'air-spring'; readonly facts: { share: number; secondHarmonic: number } }
  | {
      readonly code: 'sag';
      readonly facts: { sag: number; withCreep: number; share: number; facing: 'down' | 'up' };
    }
  | { readonly code: 'cable-loss'; readonly facts: { loss: number; qesRise: number; resistance: number } }
  | {
      readonly code: 'source-resistance';
      readonly facts: { qtcWith: number; qtcWithout: number; resistance: number };
    }
  | {
      readonly code: 'hot-coil';
      readonly facts: { limit: LimitName; margin: number; levelLoss: number; rise: number };
    }
  | {
      readonly code: 'losses-missing';
      readonly facts: { qtc: number; fill: boolean; absorption: boolean; leakage: boolean };
    }
  | {
      readonly code: 'goal-short';
      readonly facts: { short: number; level: number; tolerance: number; shapingHere: number };
    }
  | {
      readonly code: 'load-low';
      readonly facts: { nominal: number; minimum: number; loads: readonly LoadChoice[] };
    }
  | {
      readonly code: 'qtc-high' | 'qtc-low';
      readonly facts: { qtc: number; hotQtc: number; peak: number; peakAt: number | null };
    }
  | { readonly code: 'driver-contradiction'; readonly facts: Contradiction }
  | { readonly code: 'driver-suspicious'; readonly facts: Suspicion }
  | { readonly code: 'net-small'; readonly facts: { net: number; displacement: number; estimated: boolean } }
  | { readonly code: 'boundary-dip'; readonly facts: { depth: number } }
  | { readonly code: 'displacement-estimated'; readonly facts: { each: number; total: number } }
  | { readonly code: 'alignment-differs'; readonly facts: { alignmentF3: number; circuitF3: number | null } }
  | { readonly code: 'single-rating'; readonly facts: { lowestImpedance: number; load: number } }
  | { readonly code: 'exposure'; readonly facts: { peakC: number; action: number } };

export type FindingCode = FindingFacts['code'];

/** One way of wiring coils and drivers, and the nominal load it makes. */
export interface LoadChoice {
  readonly coilWiring: CoilWiring;
  readonly driverWiring: DriverWiring;
  readonly nominal: number;
  readonly belowMinimum: boolean;
}

/** A change in SI to a quantity the engine knows. */
export type Change =
  | { readonly set: 'level'; readonly value: number }
  | { readonly set: 'goal-from' | 'goal-to'; readonly value: number }
  | { readonly set: 'block-corner'; readonly block: number; readonly value: number }
  | { readonly set: 'block-to'; readonly block: number; readonly value: number }
  | { readonly set: 'block-gain'; readonly block: number; readonly value: number }
  | { readonly set: 'add-high-pass'; readonly order: number; readonly value: number }
  | { readonly set: 'drivers'; readonly count: number; readonly wiring: DriverWiring }
  | { readonly set: 'wiring'; readonly coilWiring: CoilWiring; readonly driverWiring: DriverWiring }
  | { readonly set: 'ratings'; readonly powers: readonly number[] }
  | { readonly set: 'net-volume'; readonly value: number }
  | { readonly set: 'inner-volume'; readonly value: number }
  | { readonly set: 'cable'; readonly value: number };

/** A computed change that cures a finding, evaluated again after rounding. */
export interface WayOut {
  readonly kind:
    | 'level'
    | 'high-pass'
    | 'transform'
    | 'shelf'
    | 'drivers'
    | 'drivers-and-box'
    | 'amplifier'
    | 'volume'
    | 'wiring'
    | 'cable'
    | 'band';
  readonly changes: readonly Change[];
  /** Numbers its sentence needs. */
  readonly facts: {
    /** The new value, in SI, and the one it replaces (null when there was none). */
    readonly value: number;
    readonly before: number | null;
    /** Ratings in order, for an amplifier. */
    readonly ratings?: readonly { readonly power: number; readonly load: number }[];
    /** Qtc afterwards, where the change moves it. */
    readonly qtc?: number;
    /** dB given up at the bottom of the goal's band, or of the level, where the change gives some up. */
    readonly givesUp?: number;
    readonly count?: number;
    readonly wiring?: DriverWiring;
    readonly coilWiring?: CoilWiring;
    readonly nominal?: number;
    readonly order?: number;
  };
  /** Smallest margin in dB with the change made. */
  readonly marginAfter: number;
  /** What still stands with the change made: blocking findings by code, and by how many dB (null where not in dB). */
  readonly remaining: readonly { readonly code: FindingCode; readonly by: number | null }[];
}

export interface Verdict {
  readonly holds: boolean;
  /** Smallest margin over all judged limits. */
  readonly margin: number;
  readonly limit: LimitName;
  readonly worst: number;
}

export interface Budget {
  readonly driver: EquivalentDriver;
  readonly alignment: Alignment;
  readonly system: System;
  readonly limits: readonly LimitMargin[];
  /** Limits that could not be judged. */
  readonly notJudged: readonly LimitName[];
  readonly verdict: Verdict;
  readonly maxLevel: number;
  readonly masterDrive: number;
  readonly demand: Demand;
  readonly goalShort: { readonly short: number; readonly at: number; readonly beyondTolerance: boolean };
  readonly findings: readonly Finding[];
  readonly exposure: Exposure;
  readonly limiter: Limiter;
  readonly roomDoubt: RoomDoubt;
  readonly hot: Hot;
  readonly ledger: readonly LedgerRow[];
  readonly loads: readonly LoadChoice[];
}
