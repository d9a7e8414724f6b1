/** The account as the page shows it: six stations in signal order, each with its lines, and the level carried after it. */
import type { Chain } from '$lib/engine/chain';
import type { Account } from '$lib/engine/budget/account';
import type { AccountLine, AccountPage } from '$lib/words/account-lines';
import { blockName, roomName } from '$lib/words/block-name';
import { fixed, significant } from '$lib/words/format-number';
import { hertzText, litresText, ohmText, qText, wattsText } from '$lib/words/quantities';
import type { Report } from '$lib/words/report';

export type StationId = 'programme' | 'shaping' | 'amplifier' | 'driver' | 'box' | 'room';

export interface StationLine {
  readonly text: string;
  readonly loss: number | null;
  readonly gain: number | null;
}

export interface StationEntry {
  readonly id: StationId;
  readonly name: string;
  /** Beside the name: what stands there, in a few words. */
  readonly summary: string;
  readonly lines: readonly StationLine[];
  readonly level: number;
  readonly unit: 'dBV' | 'dB';
  /** What this station is asked for beyond its means, if anything. */
  readonly over: string | null;
}

export const STATION_NAMES: { readonly [S in StationId]: string } = {
  programme: 'Programme',
  shaping: 'Filters and EQ',
  amplifier: 'Amplifier',
  driver: 'Driver',
  box: 'Box',
  room: 'Room'
};

const ORDER: readonly StationId[] = ['programme', 'shaping', 'amplifier', 'driver', 'box', 'room'];

function lineText(chain: Chain, { entry }: AccountLine): string {
  switch (entry.station) {
    case 'shaping': {
      const block = chain.shaping[entry.block ?? 0];
      return blockName(block);
    }
    case 'amplifier':
      return 'gain';
    case 'driver':
      return 'level at 1 m, per volt';
    case 'box':
      return 'air in the box';
    case 'room':
      return entry.part === 'distance' ? `distance ${significant(chain.seatDistance, 3)} m` : 'room gain';
    case 'copies':
      return `${chain.copies} sets together`;
    case 'programme':
      return 'opening';
  }
}

function summaries(chain: Chain, report: Report): { readonly [S in StationId]: string } {
  const { alignment, driver } = report;
  const first = chain.amplifier.ratings[0];
  return {
    programme: `${significant(chain.goal.level, 4)} dB wanted`,
    shaping: '',
    amplifier: `${wattsText(first.power)} into ${ohmText(first.load)}`,
    driver: `Qts ${qText(driver.qts ?? NaN)}, ${ohmText(driver.nominal_ohm ?? NaN)}`,
    box: `${litresText((alignment.net_L ?? NaN) / 1000)}, Qtc ${qText(alignment.qtc ?? NaN)}, fc ${hertzText(alignment.fc_Hz ?? NaN)}`,
    room: roomName(chain)
  };
}

/** What the limits say of a station at the worst frequency: shown once, in red, where it is over. */
function overs(report: Report): { readonly [S in StationId]?: string } {
  const over = new Map(report.limits.filter((l) => (l.margin_dB ?? 0) < 0).map((l) => [l.limit, l]));
  const by = (limit: string): string | null => {
    const found = over.get(limit as never);
    return found === undefined
      ? null
      : `${fixed(-(found.margin_dB ?? 0), 1)} dB over at ${fixed(found.worst_Hz ?? 0, 0)} Hz`;
  };
  const first = (...texts: (string | null)[]) => texts.find((text) => text !== null);
  const amplifier = first(by('amplifier-voltage'), by('amplifier-current'));
  const driver = first(by('cone-travel'), by('mechanical-stop'), by('coil-heat'));
  return { ...(amplifier ? { amplifier } : {}), ...(driver ? { driver } : {}) };
}

/** `page` and `account` are of the same plan at the same frequency. */
export function stationEntries(
  chain: Chain,
  report: Report,
  account: Account,
  page: AccountPage
): StationEntry[] {
  const summary = summaries(chain, report);
  const over = overs(report);
  let level = page.opening;
  return ORDER.map((id) => {
    const mine = page.lines.filter(
      ({ entry }) => entry.station === id || (id === 'room' && entry.station === 'copies')
    );
    const lines: StationLine[] = mine.map((line) => ({
      text: lineText(chain, line),
      loss: line.loss,
      gain: line.gain
    }));
    if (id === 'programme')
      lines.push({
        text:
          account.opensAt === 'input' ? "opens at the amplifier's input" : "opens at the amplifier's output",
        loss: null,
        gain: null
      });
    level = mine.at(-1)?.level ?? level;
    const before = id === 'programme' || id === 'shaping' || id === 'amplifier';
    return {
      id,
      name: STATION_NAMES[id],
      summary: id === 'shaping' && lines.length === 0 ? 'none' : summary[id],
      lines,
      level,
      unit: before ? 'dBV' : 'dB',
      over: over[id] ?? null
    };
  });
}
