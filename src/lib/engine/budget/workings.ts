/** A chain made ready to compute with: every station reduced to the numbers its curve needs. */
import { amplifierCeiling, type AmplifierCeiling } from '../amplifier/ceiling';
import { alignBox, type Alignment } from '../box/alignment';
import { buildCircuit, circuitPoint, solveCircuit, type Circuit } from '../box/circuit';
import type { Chain } from '../chain';
import { equivalentDriver, type EquivalentDriver } from '../driver/equivalent';
import { density, soundSpeed } from '../quantity/air';
import { fromDb, pressureLevel, REFERENCE_PRESSURE, toDb } from '../quantity/decibel';
import { roomPower, roomResponse, type RoomResponse } from '../room/room';
import { cascadePower, compileCascade, resonances, type Cascade } from '../shaping/cascade';

export interface Workings {
  readonly chain: Chain;
  readonly driver: EquivalentDriver;
  /** Resistance between the amplifier's ideal source and the coil, Ω. */
  readonly sourceResistance: number;
  readonly alignment: Alignment;
  readonly circuit: Circuit;
  readonly cascade: Cascade;
  readonly ceiling: AmplifierCeiling;
  readonly room: RoomResponse;
  /** Hz, ascending: resonances of box and shaping, for scans to look at. */
  readonly landmarks: readonly number[];
  /** dB the copies add at the seat. */
  readonly copies: number;
  /** V RMS where shaping is at 0 dB, so that the goal's level arrives at the pivot. */
  readonly masterDrive: number;
  readonly masterDriveDb: number;
}

/** dB SPL at 1 m in half space for 1 V of drive at f. */
export function driverBoxLevel(circuit: Circuit, f: number): number {
  const point = circuitPoint();
  solveCircuit(circuit, f, point);
  return pressureLevel(Math.hypot(point.pRe, point.pIm));
}

/** dB of shaping at f. */
export const shapingLevel = (cascade: Cascade, f: number): number =>
  10 * Math.log10(cascadePower(cascade, f));

/** Squared pressure of circuit, shaping and room at f for 1 V of master drive, flat terms left out: what searches compare, without logarithms. */
export function shapedPower(w: Pick<Workings, 'circuit' | 'cascade' | 'room'>, f: number): number {
  const point = circuitPoint();
  solveCircuit(w.circuit, f, point);
  return (point.pRe * point.pRe + point.pIm * point.pIm) * cascadePower(w.cascade, f) * roomPower(w.room, f);
}

/** dB that `shapedPower` leaves out: reference pressure, distance, copies, master drive. */
export const flatLevel = (w: Pick<Workings, 'room' | 'copies' | 'masterDriveDb'>): number =>
  w.room.distance + w.copies + w.masterDriveDb - toDb(REFERENCE_PRESSURE);

/** dB SPL at the seat at f, with the master drive. */
export const deliveredLevel = (w: Workings, f: number): number =>
  10 * Math.log10(shapedPower(w, f)) + flatLevel(w);

function withDrive(w: Omit<Workings, 'masterDrive' | 'masterDriveDb' | 'landmarks'>): Workings {
  const landmarks = [w.alignment.fc, ...resonances(w.cascade)].sort((a, b) => a - b);
  const silent = { ...w, landmarks, masterDrive: 1, masterDriveDb: 0 };
  const masterDrive = fromDb(w.chain.goal.level - deliveredLevel(silent, w.chain.goal.pivot));
  return { ...silent, masterDrive, masterDriveDb: toDb(masterDrive) };
}

export function workOut(chain: Chain): Workings {
  const driver = equivalentDriver(chain.driver, chain.air);
  const output = chain.amplifier.outputResistance;
  const sourceResistance = chain.cableResistance + output;
  const alignment = alignBox(driver, chain.box, chain.air, sourceResistance);
  return withDrive({
    chain,
    driver,
    sourceResistance,
    alignment,
    circuit: buildCircuit(driver, alignment, chain.box, density(chain.air), chain.cableResistance, output),
    cascade: compileCascade(chain.shaping, alignment),
    ceiling: amplifierCeiling(chain.amplifier.ratings),
    room: roomResponse(chain.room, chain.seatDistance, soundSpeed(chain.air)),
    copies: toDb(chain.copies)
  });
}

/** Another level on the same chain: only the drive moves. */
export function atLevel(w: Workings, level: number): Workings {
  const masterDrive = w.masterDrive * fromDb(level - w.chain.goal.level);
  return {
    ...w,
    chain: { ...w.chain, goal: { ...w.chain.goal, level } },
    masterDrive,
    masterDriveDb: toDb(masterDrive)
  };
}

/** Other shaping on the same chain: driver, box and room stay as worked out. */
export function withShaping(w: Workings, shaping: Chain['shaping']): Workings {
  return withDrive({ ...w, chain: { ...w.chain, shaping }, cascade: compileCascade(shaping, w.alignment) });
}

/** Resistance rise of copper per kelvin at 20 °C: IEC 60028, "International standard of resistance for copper", 1925 (from memory). */
const COPPER_PER_KELVIN = 0.00393;

/**
 * The same chain with its coil hot. The filter stays as it was set (a transform bound to the box keeps the cold box's values);
 * the drive rises to deliver the level all the same.
 */
export function withHotCoil(w: Workings): Workings {
  const re = w.driver.coil.re * (1 + COPPER_PER_KELVIN * w.chain.driver.coilRise);
  const cold = w.driver.coil.re;
  const hot: EquivalentDriver = {
    ...w.driver,
    qes: (w.driver.qes * re) / cold,
    coil: { ...w.driver.coil, re }
  };
  const alignment = alignBox(hot, w.chain.box, w.chain.air, w.sourceResistance);
  return withDrive({ ...w, alignment, circuit: { ...w.circuit, coil: hot.coil } });
}

/** Whether the nominal load lies below what the amplifier is made for: a blocking matter, whatever the margins. */
export const loadTooLow = (w: Workings): boolean =>
  w.driver.nominal < w.chain.amplifier.minimumLoad * (1 - 1e-9);
