/**
 * The account at one frequency: what each station loses or gains on the way from the voltage at the amplifier's input to the level at the seat.
 * dB. Entries are exact here; `words/` rounds them so that the page still adds up.
 * Programme opens; shaping is entered block by block; the amplifier its gain; the driver its half-space level per volt without the box's
 * air behind it (Z_box = 0); the box what its air changes; the room distance, then gain; copies a line of their own.
 */
import { withoutBox } from '../box/circuit';
import { roomGain } from '../room/room';
import { blockResponse } from '../shaping/block-response';
import { cascadePower, joinResponses } from '../shaping/cascade';
import type { Chain } from '../chain';
import { driverBoxLevel, workOut, type Workings } from './workings';

export type Station = 'programme' | 'shaping' | 'amplifier' | 'driver' | 'box' | 'room' | 'copies';

export interface Entry {
  readonly station: Station;
  /** Which shaping block, by its index in the plan; which part of the room. */
  readonly block?: number;
  readonly part?: 'distance' | 'gain';
  /** dB; negative is a loss. */
  readonly db: number;
}

export interface Account {
  readonly f: number;
  /** dB re 1 V at the amplifier's input; without a known gain, the drive at its output. */
  readonly opening: number;
  readonly opensAt: 'input' | 'output';
  readonly entries: readonly Entry[];
  /** dB SPL at the seat: the opening and all entries. */
  readonly closing: number;
}

export const account = (chain: Chain, f: number): Account => accountOf(workOut(chain), f);

export function accountOf(w: Workings, f: number): Account {
  const { shaping, amplifier } = w.chain;
  const gain = amplifier.gain;
  const driver = driverBoxLevel(withoutBox(w.circuit), f);
  const entries: Entry[] = [];
  shaping.forEach((block, index) => {
    if (block.bypass) return;
    const power = cascadePower(joinResponses([blockResponse(block, w.alignment)]), f);
    entries.push({ station: 'shaping', block: index, db: 10 * Math.log10(power) });
  });
  if (gain !== null) entries.push({ station: 'amplifier', db: gain });
  entries.push({ station: 'driver', db: driver });
  entries.push({ station: 'box', db: driverBoxLevel(w.circuit, f) - driver });
  entries.push({ station: 'room', part: 'distance', db: w.room.distance });
  entries.push({ station: 'room', part: 'gain', db: roomGain(w.room, f) });
  if (w.chain.copies > 1) entries.push({ station: 'copies', db: w.copies });
  const opening = w.masterDriveDb - (gain ?? 0);
  return {
    f,
    opening,
    opensAt: gain === null ? 'output' : 'input',
    entries,
    closing: entries.reduce((sum, e) => sum + e.db, opening)
  };
}
