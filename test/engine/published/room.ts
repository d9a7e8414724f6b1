/** The room: numbers 75–81, 83 and 84 of the published checks (82, oblique modes, is for a later room). */
import { boundaryGain, HALF_SPACE_RE_FREE_DB, imageDistances } from '$lib/engine/room/boundary';
import { pressureZone } from '$lib/engine/room/pressure-zone';
import { roomGain, roomResponse } from '$lib/engine/room/room';
import type { PressureGainRoom } from '$lib/engine/chain';
import { soundSpeed } from '$lib/engine/quantity/air';
import { absolute, percent } from '../../tolerance';
import { one, rowsOf, type CheckRow } from './check-row';
import { ROOM_AIR } from './worked-chain';

const WATERHOUSE =
  'R. V. Waterhouse, Output of a Sound Source in a Reverberation Chamber and Other Reflecting Environments, JASA 30(1), 1958';
const ALLISON = `${WATERHOUSE}; R. F. Allison, The Influence of Room Boundaries on Loudspeaker Power Output, JAES 22(5), 1974 (from memory)`;
const RAYLEIGH =
  'Rayleigh, The Theory of Sound; H. Kuttruff, Room Acoustics: f = (c/2)·√((l/L)²+(m/W)²+(n/H)²)';
const OWN = "the project's own formula; caps are common practice, no source";

const c = soundSpeed(ROOM_AIR);

/** dB re free field beside boundaries all at the distance d, at this kd. */
function equalDistances(count: number, kd: number): number {
  const d = 0.5;
  const images = imageDistances(Array<number>(count).fill(d));
  return boundaryGain(images, (kd * c) / (2 * Math.PI * d), c) + HALF_SPACE_RE_FREE_DB;
}

const atBoundaries = (distances: readonly number[], f: number): number =>
  boundaryGain(imageDistances(distances), f, c);

const tens = absolute(1e-4);
const NAMES = ['wall', 'edge', 'corner'];
const LARGE: PressureGainRoom = {
  kind: 'pressure-gain',
  length: 6.2,
  width: 4.4,
  height: 2.5,
  airtightness: 'typical',
  cap: null,
  boundaries: [],
  distanceLoss: 3,
  doubt: 4
};
const zone = pressureZone(6.2, 'typical', null, c);

export const room: readonly CheckRow[] = [
  ...[3.0103, 6.0206, 9.0309].map((value, i) =>
    one(75, `${NAMES[i]} at no distance re free field, dB`, value, tens, WATERHOUSE, () => {
      return atBoundaries(Array<number>(i + 1).fill(0), 50) + HALF_SPACE_RE_FREE_DB;
    })
  ),
  ...[0, 3.0103, 6.0206].map((value, i) =>
    one(75, `${NAMES[i]} at no distance re half space, dB`, value, tens, WATERHOUSE, () => {
      return atBoundaries(Array<number>(i + 1).fill(0), 50);
    })
  ),
  ...[1, 2, 3].map((count) =>
    one(
      76,
      `${NAMES[count - 1]} a thousand metres away re half space, dB`,
      -3.0103,
      absolute(0.01),
      WATERHOUSE,
      () => {
        return atBoundaries(Array<number>(count).fill(1000), 50);
      }
    )
  ),
  ...rowsOf<number>(
    { number: 77, what: 'one wall, dB re free field, kd =', tolerance: absolute(5e-4), source: WATERHOUSE },
    [
      [0.5, 2.6516],
      [1, 1.6276],
      [Math.PI / 2, 0],
      [2, -0.9109],
      [2.2467, -1.0637]
    ],
    (kd) => equalDistances(1, kd)
  ),
  ...rowsOf<number>(
    {
      number: 78,
      what: 'edge, equal distances, dB re free field, kd =',
      tolerance: absolute(5e-4),
      source: WATERHOUSE
    },
    [
      [0.5, 5.291],
      [1, 3.0497],
      [2, -2.8569]
    ],
    (kd) => equalDistances(2, kd)
  ),
  ...rowsOf<number>(
    {
      number: 79,
      what: 'corner, equal distances, dB re free field, kd =',
      tolerance: absolute(5e-4),
      source: ALLISON
    },
    [
      [0.5, 7.9167],
      [1, 4.1484],
      [Math.PI / 2, -6.7352],
      [2, -6.8129]
    ],
    (kd) => equalDistances(3, kd)
  ),
  ...rowsOf<number>(
    {
      number: 80,
      what: 'corner 0.4, 0.5, 0.3 m, dB re half space, at Hz',
      tolerance: absolute(0.001),
      source: WATERHOUSE
    },
    [
      [20, 5.9234],
      [40, 5.6295],
      [80, 4.4193],
      [160, -1.0405]
    ],
    (f) => atBoundaries([0.4, 0.5, 0.3], f)
  ),
  ...rowsOf<number>(
    { number: 81, what: 'lowest lengthwise mode, Hz, of m', tolerance: percent(0.01), source: RAYLEIGH },
    [
      [5, 34.323],
      [4, 42.904],
      [2.5, 68.646]
    ],
    (length) => pressureZone(length, 'typical', null, c).upper
  ),
  one(83, 'pressure zone of 6.2 m, f_g, Hz', 27.68, absolute(0.001), OWN, () => zone.upper),
  one(83, 'pressure zone of 6.2 m, cap 12 dB, f_l, Hz', 13.873, absolute(0.001), OWN, () => zone.lower),
  ...rowsOf<number>(
    {
      number: 83,
      what: 'pressure zone of 6.2 m, cap 12 dB, dB at Hz',
      tolerance: absolute(0.001),
      source: OWN
    },
    [
      [0, 12],
      [5, 11.218],
      [10, 9.431],
      [20, 5.882],
      [40, 2.412],
      [80, 0.725]
    ],
    (f) => roomGain(roomResponse(LARGE, 3, c), f)
  ),
  one(84, 'loss of 3 dB a doubling at 3 m, dB', -4.7549, tens, 'common practice (the 3 dB)', () => {
    return roomResponse(LARGE, 3, c).distance;
  })
];
