/** Timing by medians over many runs; figures only mean something beside others of the same run. */

export interface Timed {
  /** ms. */
  readonly median: number;
  readonly least: number;
}

const summary = (times: number[]): Timed => {
  times.sort((a, b) => a - b);
  return { median: times[times.length >> 1], least: times[0] };
};

export function time(work: () => unknown, runs: number, warmUp = runs): Timed {
  for (let i = 0; i < warmUp; i++) work();
  return summary(
    Array.from({ length: runs }, () => {
      const start = performance.now();
      work();
      return performance.now() - start;
    })
  );
}

export async function timeAsync(work: () => Promise<unknown>, runs: number): Promise<Timed> {
  await work();
  const times: number[] = [];
  for (let i = 0; i < runs; i++) {
    const start = performance.now();
    await work();
    times.push(performance.now() - start);
  }
  return summary(times);
}

export interface BenchRow {
  readonly what: string;
  readonly timed: Timed;
  /** Compared with which time of the same run, and the bound on the ratio; or a bound in ms. */
  readonly against?: { readonly name: string; readonly ms: number; readonly atMost: number };
  readonly atMostMs?: number;
}

export function printRows(rows: readonly BenchRow[]): void {
  const lines = rows.map(({ what, timed, against, atMostMs }) => {
    const bound =
      against !== undefined
        ? `${(timed.median / against.ms).toPrecision(3)} of ${against.name}, wanted at most ${against.atMost.toPrecision(3)}`
        : atMostMs !== undefined
          ? `wanted at most ${atMostMs} ms`
          : '';
    return [what, `${timed.median.toFixed(3)} ms`, `${timed.least.toFixed(3)} ms`, bound];
  });
  const widths = [0, 1, 2].map((i) =>
    Math.max(...lines.map((l) => l[i].length), ['', 'median', 'least'][i].length)
  );
  console.log(`${''.padEnd(widths[0])}  ${'median'.padStart(widths[1])}  ${'least'.padStart(widths[2])}`);
  for (const [what, median, least, bound] of lines)
    console.log(
      `${what.padEnd(widths[0])}  ${median.padStart(widths[1])}  ${least.padStart(widths[2])}  ${bound}`
    );
}
