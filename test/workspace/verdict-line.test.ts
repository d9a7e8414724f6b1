import { render, screen } from '@testing-library/svelte';
import { describe, expect, test } from 'vitest';
import VerdictLine from '$lib/workspace/VerdictLine.svelte';
import VerdictMark from '$lib/workspace/VerdictMark.svelte';
import { sampleReport } from './sample-report';

describe('verdict line', () => {
  test('says the whole sentence once, in a region that is spoken when it changes', async () => {
    const report = sampleReport();
    const { rerender } = render(VerdictLine, { report });
    const status = screen.getByRole('status');
    expect(status).toHaveTextContent(report.sentence, { normalizeWhitespace: true });
    expect(status.textContent?.replace(/\s+/g, ' ').trim()).toBe(report.sentence);

    const sentence = 'Does not hold. At 18 Hz the cone would need 19.4 mm of its 16 mm.';
    await rerender({ report: sampleReport({ holds: false, sentence }) });
    expect(screen.getByRole('status')).toBe(status);
    expect(status.textContent?.replace(/\s+/g, ' ').trim()).toBe(sentence);
  });

  test.for([
    ['Holds. 101 dB at the seat.', true, 'Holds.'],
    ['Holds, but falls 2.0 dB short at 20 Hz.', true, 'Holds,'],
    ['Does not hold. The load is too low.', false, 'Does not hold.']
  ] as const)('sets the deciding word apart: %s', ([sentence, holds, word]) => {
    const { container } = render(VerdictLine, { report: sampleReport({ sentence, holds }) });
    expect(container.querySelector('strong')).toHaveTextContent(new RegExp(`^${word.replace('.', '\\.')}$`));
    expect(container.querySelector('strong')).toHaveClass(holds ? 'holds' : 'over');
  });

  test('says the verdict itself when a sentence does not begin with it', () => {
    const { container } = render(VerdictLine, {
      report: sampleReport({ sentence: 'Unusual.', holds: false })
    });
    expect(container.querySelector('p')).toHaveTextContent('Does not hold. Unusual.');
  });
});

describe('verdict mark', () => {
  test('is a closed square when the plan holds and a broken one when it does not', () => {
    const held = render(VerdictMark, { holds: true }).container;
    expect(held.querySelectorAll('rect')).toHaveLength(1);
    expect(held.querySelectorAll('path')).toHaveLength(0);
    const over = render(VerdictMark, { holds: false }).container;
    expect(over.querySelectorAll('rect')).toHaveLength(0);
    expect(over.querySelectorAll('path')).toHaveLength(2);
  });
});
