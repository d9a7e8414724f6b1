import { render } from '@testing-library/svelte';
import { expect, test } from 'vitest';
import AlignmentFigures from '$lib/workspace/AlignmentFigures.svelte';
import CautionList from '$lib/workspace/CautionList.svelte';
import DemandFigures from '$lib/workspace/DemandFigures.svelte';
import type { Report } from '$lib/words/report';
import { sampleReport } from './sample-report';

function figures(container: HTMLElement): [string | undefined, string | undefined][] {
  return [...container.querySelectorAll('dl > div')].map((line) => [
    line.querySelector('dt')?.firstChild?.textContent?.trim(),
    line.querySelector('dd')?.textContent?.trim()
  ]);
}

test('the box by itself, then shaped and at the seat', () => {
  const { container } = render(AlignmentFigures, { report: sampleReport() });
  expect(figures(container)).toEqual([
    ['Net volume', '57.3 L'],
    ['Effective volume', '62.7 L'],
    ['Compliance ratio α', '1.83'],
    ['Resonance fc', '35.4 Hz'],
    ['Qtc', '0.73'],
    ['−3 dB point f3', '34.4 Hz'],
    ['Peak', '0.0 dB at 148 Hz'],
    ['−3 dB point', '18.2 Hz'],
    ['−10 dB point', '11.1 Hz'],
    ['Most boost', '5.0 dB at 18 Hz']
  ]);
});

test('what does not exist is a dash, and a box without a peak says none', () => {
  const report = sampleReport();
  const bare: Report = {
    ...report,
    alignment: { ...report.alignment, peak_Hz: null },
    system: { ...report.system, f10_Hz: null }
  };
  const lines = Object.fromEntries(figures(render(AlignmentFigures, { report: bare }).container));
  expect(lines['Peak']).toBe('none');
  expect(lines['−10 dB point']).toBe('–');
});

test('one watt figure leads; the others stand under their own names', () => {
  const { container } = render(DemandFigures, { report: sampleReport() });
  expect(container.querySelector('.lead')).toHaveTextContent(
    'Amplifier to buy 96.1 W into 4 Ω, at the least'
  );
  expect(figures(container)).toEqual([
    ['Largest peak voltage', '27.7 V'],
    ['Largest peak current', '6.25 A'],
    ['Real power', '69.5 W'],
    ['Apparent power', '84 VA'],
    ['Average from the mains', '10.3 W'],
    ['Cone travel, one way', '11.6 mm at 17.6 Hz']
  ]);
});

test('each caution is led by its matter', () => {
  const { container } = render(CautionList, { report: sampleReport() });
  const lines = [...container.querySelectorAll('li')].map((li) => [...li.children].map((c) => c.textContent));
  expect(lines).toEqual([
    ['Hearing.', 'Measure the whole system.'],
    ['Lifting.', 'A loaded box is heavy.']
  ]);
});
