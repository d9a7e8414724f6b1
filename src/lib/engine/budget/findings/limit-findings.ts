/** Limits over, thin, not judged, over once the coil is hot or the room is worse, or over below the programme. */
import type { Finding, LimitMargin, LimitName } from '../budget';
import { maxima } from '../extremes';
import { LIMITED, marginsFrom, tightest } from '../limit-margins';
import { shapingLevel, type Workings } from '../workings';
import { boostWayOut } from '../ways-out/boost';
import { fullCure } from '../ways-out/cure';
import { highPassWayOut } from '../ways-out/high-pass';
import { levelWayOut } from '../ways-out/level';
import { limitWaysOut } from '../ways-out/limit-ways-out';
import { finding, type Context } from './context';

/** Margins of 3 dB and more are comfortable, 0 to 3 thin (common practice, no source). */
const COMFORTABLE_DB = 3;
/** Where content can still lurk below the programme, Hz. */
const INFRASONIC_FROM = 5;
/** dB of boost from which a missing high-pass is worth a word (common practice, no source). */
const BOOSTED_DB = 3;

const RATING_OF: { readonly [L in LimitName]?: 'xmax' | 'xmech' | 'power' } = {
  'cone-travel': 'xmax',
  'mechanical-stop': 'xmech',
  'coil-heat': 'power'
};

export function exceeded({ w, figures, solve }: Context): Finding[] {
  const over = figures.limits.filter((m) => m.margin < 0);
  let solved: ReturnType<typeof limitWaysOut> | null = null;
  const waysOut = (m: LimitMargin) =>
    solve(() => {
      solved ??= limitWaysOut(w, over);
      return solved.get(m) ?? [];
    });
  const level = w.chain.goal.level;
  return over.map((m) =>
    finding(
      {
        code: `limit-${m.limit}`,
        facts: {
          margin: m.margin,
          allowed: m.allowed,
          demanded: m.demanded,
          level,
          maxLevel: level + m.margin
        }
      },
      'blocking',
      m.worst,
      waysOut(m)
    )
  );
}

/** Where an exceeded limit's worst frequency is one that shaping lifts: how much of the boost cannot be given. */
export function boostShort({ w, figures, solve }: Context): Finding[] {
  const worst = figures.limits.filter((m) => m.margin < 0);
  if (worst.length === 0) return [];
  const m = tightest(worst);
  const boostHere = shapingLevel(w.cascade, m.worst) - shapingLevel(w.cascade, w.chain.goal.pivot);
  if (!(boostHere > 0.5)) return [];
  const short = Math.min(-m.margin, boostHere);
  return [
    finding(
      { code: 'boost-short', facts: { limit: m.limit, boostHere, short } },
      'caution',
      m.worst,
      solve(() => [boostWayOut(w, fullCure(w.chain))])
    )
  ];
}

export function thin({ w, figures, solve }: Context): Finding[] {
  const { margin, limit, worst } = figures.verdict;
  if (!(margin >= 0 && margin < COMFORTABLE_DB)) return [];
  return [
    finding(
      { code: 'margin-thin', facts: { limit, margin } },
      'caution',
      worst,
      solve(() => [levelWayOut(w, { ...fullCure(w.chain), inHand: COMFORTABLE_DB })])
    )
  ];
}

export function unjudged({ figures }: Context): Finding[] {
  const missing = figures.notJudged.map((name) => RATING_OF[name]).filter((rating) => rating !== undefined);
  return missing.length === 0 ? [] : [finding({ code: 'not-judged', facts: { missing } }, 'caution')];
}

export function roomDoubt({ w, figures, solve }: Context): Finding[] {
  const { doubt } = figures.roomDoubt;
  const { margin } = figures.verdict;
  const turnsAt = Math.abs(margin);
  if (doubt === 0 || !(turnsAt < doubt)) return [];
  const holds = margin >= 0;
  return [
    finding(
      { code: 'room-doubt', facts: { holds, doubt, turnsAt } },
      'caution',
      null,
      holds ? solve(() => [levelWayOut(w, { ...fullCure(w.chain), inHand: doubt })]) : []
    )
  ];
}

export function hotCoil({ figures, w, solve }: Context): Finding[] {
  const { hot, verdict } = figures;
  if (!(verdict.margin >= 0 && hot.margin < 0)) return [];
  return [
    finding(
      {
        code: 'hot-coil',
        facts: { limit: hot.limit, margin: hot.margin, levelLoss: hot.levelLoss, rise: hot.rise }
      },
      'caution',
      hot.worst,
      solve(() => [levelWayOut(w, { ...fullCure(w.chain), inHand: verdict.margin - hot.margin })])
    )
  ];
}

const hasHighPass = (w: Workings): boolean =>
  w.chain.shaping.some((b) => b.kind === 'high-pass' && !b.bypass);

/** What lies below the programme: a limit over when content is taken from 5 Hz, and a boost without a high-pass under it. */
export function infrasonic({ w, figures, solve }: Context): Finding[] {
  const found: Finding[] = [];
  const { lowest } = w.chain.programme;
  const cure = { ...fullCure(w.chain), from: INFRASONIC_FROM };
  let over = false;
  let ways: readonly Finding['waysOut'][number][] = [];
  if (lowest > INFRASONIC_FROM) {
    const peaks = maxima(w, LIMITED, { from: INFRASONIC_FROM, to: lowest, points: 60 });
    const worst = tightest(marginsFrom(w, peaks));
    // Only what the missing content adds: a limit that is over in the programme has its own finding.
    over = worst.margin < 0 && worst.margin < figures.verdict.margin - 1e-6;
    if (over) {
      ways = solve(() => [highPassWayOut(w, cure)]);
      found.push(
        finding(
          { code: 'infrasonic', facts: { limit: worst.limit, margin: worst.margin, from: INFRASONIC_FROM } },
          'caution',
          worst.worst,
          ways
        )
      );
    }
  }
  if (figures.system.boost >= BOOSTED_DB && !hasHighPass(w))
    found.push(
      finding(
        { code: 'no-high-pass', facts: { boost: figures.system.boost, boostAt: figures.system.boostAt } },
        over ? 'caution' : 'note',
        null,
        ways
      )
    );
  return found;
}
