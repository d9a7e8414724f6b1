/**
 * The report: the budget in the plan file's units under fixed names, as `check --json` prints it.
 * Numbers keep their full precision; what does not exist is null, never NaN.
 */
import type { Budget, Finding, LimitMargin } from '$lib/engine/budget/budget';
import type { Chain } from '$lib/engine/chain';
import type { Plan } from '$lib/plan/schema';
import { toPatch } from '$lib/plan/to-patch';
import { cautions } from './cautions';
import { findingText } from './findings/finding-words';
import { goalNote } from './goal-note';
import { LIMIT_UNITS } from './limit-names';
import { reportLedger } from './report-ledger';
import { finite } from './report-number';
import { sentence } from './sentence';
import { titleOf } from './title';
import { wayOutAct, wayOutOutcome, wayOutText } from './ways-out';

export function report(plan: Plan, chain: Chain, budget: Budget) {
  const { system, demand, verdict, limiter, roomDoubt, hot, goalShort } = budget;
  return {
    title: titleOf(plan),
    holds: verdict.holds,
    sentence: sentence(chain, budget),
    driver: reportDriver(budget),
    alignment: reportAlignment(budget),
    system: {
      f3_Hz: finite(system.f3),
      f10_Hz: finite(system.f10),
      shaping_boost_dB: finite(system.boost),
      shaping_boost_Hz: finite(system.boostAt),
      boost_power_ratio: finite(system.boostPower)
    },
    limits: budget.limits.map(reportLimit),
    not_judged: budget.notJudged,
    max_level_dB: finite(budget.maxLevel),
    max_level_limit: verdict.limit,
    max_level_Hz: finite(verdict.worst),
    master_drive_V: finite(budget.masterDrive),
    demand: {
      peak_V: finite(demand.peakV),
      peak_A: finite(demand.peakA),
      real_W: finite(demand.realW),
      apparent_VA: finite(demand.apparentVA),
      rated_W_nominal: finite(demand.ratedW),
      cone_travel_mm: finite(demand.travel, 1000),
      cone_travel_Hz: finite(demand.travelAt),
      mains_average_W: finite(demand.mainsW)
    },
    goal_short: {
      short_dB: finite(goalShort.short),
      at_Hz: finite(goalShort.at),
      beyond_tolerance: goalShort.beyondTolerance
    },
    goal_note: goalNote(chain.goal.level),
    findings: budget.findings.map((finding) => reportFinding(plan, chain, finding)),
    exposure: {
      level_dBA: finite(budget.exposure.levelA),
      hours: finite(budget.exposure.hours),
      peak_dBC: finite(budget.exposure.peakC),
      peak_dBC_Hz: finite(budget.exposure.peakCAt)
    },
    limiter: { terminal_V: finite(limiter.terminalV), input_dBV: finite(limiter.inputDbv) },
    room_doubt: {
      doubt_dB: finite(roomDoubt.doubt),
      worst_margin_dB: finite(roomDoubt.worstMargin),
      best_margin_dB: finite(roomDoubt.bestMargin)
    },
    hot: {
      rise_K: finite(hot.rise),
      re_ohm: finite(hot.re),
      qtc: finite(hot.qtc),
      level_loss_dB: finite(hot.levelLoss),
      holds: hot.holds,
      margin_dB: finite(hot.margin),
      limit: hot.limit,
      worst_Hz: finite(hot.worst)
    },
    ledger: budget.ledger.map(reportLedger),
    cautions: cautions(budget.exposure)
  };
}

export type Report = ReturnType<typeof report>;

function reportDriver({ driver }: Budget) {
  return {
    qts: finite(driver.qts),
    cms_mm_per_N: finite(driver.cms, 1000),
    mms_g: finite(driver.mms, 1000),
    rms_kg_per_s: finite(driver.rms),
    bl_Tm: finite(driver.bl),
    re_ohm: finite(driver.coil.re),
    efficiency_pct: finite(driver.efficiency, 100),
    spl_1W_dB: finite(driver.level1W),
    spl_2V83_dB: finite(driver.level2V83),
    nominal_ohm: finite(driver.nominal)
  };
}

function reportAlignment({ alignment }: Budget) {
  return {
    net_L: finite(alignment.net, 1000),
    effective_L: finite(alignment.effective, 1000),
    alpha: finite(alignment.alpha),
    fc_Hz: finite(alignment.fc),
    qtc: finite(alignment.qtc),
    f3_Hz: finite(alignment.f3),
    peak_dB: finite(alignment.peak),
    peak_Hz: finite(alignment.peakAt)
  };
}

/** `demanded_V`, `allowed_V` and so on carry the limit's own unit in their names. */
function reportLimit({ limit, worst, margin, demanded, allowed }: LimitMargin) {
  const { unit, factor } = LIMIT_UNITS[limit];
  return {
    limit,
    worst_Hz: finite(worst),
    margin_dB: finite(margin),
    [`demanded_${unit}`]: finite(demanded, factor),
    [`allowed_${unit}`]: finite(allowed, factor)
  };
}

function reportFinding(plan: Plan, chain: Chain, finding: Finding) {
  return {
    code: finding.code,
    severity: finding.severity,
    at_Hz: finite(finding.at),
    text: findingText(finding),
    ways_out: finding.waysOut.map((way) => ({
      text: wayOutText(way, finding.code, chain.driver),
      act: wayOutAct(way, chain.driver),
      outcome: wayOutOutcome(way, finding.code),
      change: toPatch(plan, way.changes)
    }))
  };
}
