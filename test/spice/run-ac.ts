/**
 * A general circuit simulator (ngspice, in the package eecircuit-engine) as a witness that shares nothing with the engine: small-signal AC
 * analysis of a netlist. A faulty netlist does not reject but drops the faulty line or hands back the run before it: so errors and
 * warnings are looked for, and every title is its own.
 */
import { Simulation } from 'eecircuit-engine';

export interface Complex {
  readonly re: number;
  readonly im: number;
}

export interface AcResult {
  /** Hz. */
  readonly f: readonly number[];
  /** A node's voltage as `v(node)`, a source's or inductor's current as `i(name)`, one value a frequency. */
  readonly of: (name: string) => readonly Complex[];
}

export class AcBench {
  private runs = 0;

  private constructor(private readonly simulation: Simulation) {}

  static async start(): Promise<AcBench> {
    const simulation = new Simulation();
    await simulation.start();
    return new AcBench(simulation);
  }

  /** Runs one netlist (without title, analysis and end). Runs must follow one another: two at once never end. */
  async run(
    lines: readonly string[],
    { from = 5, to = 500, perDecade = 50 }: { from?: number; to?: number; perDecade?: number } = {}
  ): Promise<AcResult> {
    const title = `sealwright witness ${++this.runs}`;
    this.simulation.setNetList([title, ...lines, `.ac dec ${perDecade} ${from} ${to}`, '.end'].join('\n'));
    const result = await this.simulation.runSim();
    const errors = this.simulation.getError().filter((line) => /error|warning|aborted/i.test(line));
    if (errors.length > 0) throw new Error(`the simulator refused a netlist: ${errors.join('; ')}`);
    if (!result.header.includes(title))
      throw new Error(`the simulator answered another netlist than "${title}"`);
    if (result.dataType !== 'complex') throw new Error('the simulator did not run an AC analysis');
    const values = (name: string): readonly Complex[] => {
      const found = result.data.find((d) => d.name.toLowerCase() === name.toLowerCase());
      if (found === undefined)
        throw new Error(`the simulator knows no ${name}: ${result.data.map((d) => d.name).join(', ')}`);
      return found.values.map(({ real, img }) => ({ re: real, im: img }));
    };
    return { f: values('frequency').map(({ re }) => re), of: values };
  }
}

/** A number as a netlist takes it, in full precision. */
export const num = (value: number): string => {
  if (!Number.isFinite(value)) throw new Error(`a netlist needs a finite value (got ${value})`);
  return value.toExponential(16);
};

export const modulus = ({ re, im }: Complex): number => Math.hypot(re, im);
export const degreesOf = ({ re, im }: Complex): number => (Math.atan2(im, re) * 180) / Math.PI;
export function quotient(a: Complex, b: Complex): Complex {
  const size = b.re * b.re + b.im * b.im;
  return { re: (a.re * b.re + a.im * b.im) / size, im: (a.im * b.re - a.re * b.im) / size };
}
