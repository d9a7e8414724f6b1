import { expect, test } from 'vitest';
import { readFileSync, readdirSync } from 'node:fs';
import { account } from '$lib/engine/budget/account';
import { curves } from '$lib/engine/budget/curves';
import { toChain } from '$lib/plan/to-chain';
import { accountPage } from '$lib/words/account-lines';

const folder = new URL('../reference/public/', import.meta.url);
const chains = readdirSync(folder)
  .filter((name) => name.endsWith('.sealwright.json'))
  .map((name) => ({ name, chain: toChain(JSON.parse(readFileSync(new URL(name, folder), 'utf8'))) }));

test.for(chains)('$name: the account closes at the delivered level, entry by entry', ({ chain }) => {
  const at = new Float64Array([10, 17.3, 31.5, 50, 79, 125]);
  const delivered = curves(chain, at).delivered;
  at.forEach((f, i) => {
    const a = account(chain, f);
    expect(Math.abs(a.closing - delivered[i])).toBeLessThan(1e-9);
    expect(a.opensAt).toBe(chain.amplifier.gain === null ? 'output' : 'input');
    const kinds = chain.shaping.filter((b) => !b.bypass).length;
    expect(a.entries.filter((e) => e.station === 'shaping')).toHaveLength(kinds);
  });
});

test.for(chains)(
  '$name: rounded to tenths it still adds up as shown, and no entry moves far',
  ({ chain }) => {
    for (const f of [10, 13.7, 20, 28.9, 40, 63, 101]) {
      const exact = account(chain, f);
      const page = accountPage(exact);
      let sum = Math.round(page.opening * 10);
      page.lines.forEach((line, i) => {
        sum += Math.round((line.gain ?? 0) * 10) - Math.round((line.loss ?? 0) * 10);
        expect(Math.round(line.level * 10)).toBe(sum);
        expect(Math.abs((line.gain ?? 0) - (line.loss ?? 0) - exact.entries[i].db)).toBeLessThan(0.16);
      });
      expect(sum).toBe(Math.round(page.closing * 10));
      expect(Math.abs(page.closing - exact.closing)).toBeLessThan(0.0501);
    }
  }
);
