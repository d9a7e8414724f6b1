/**
 * Pictures that were looked at in light and dark, wide and narrow, before they were kept. A changed file is a changed
 * picture: look at it again. Each file holds the panels of a stack and its axis row, one under the other.
 */
import { render } from 'svelte/server';
import { expect, test } from 'vitest';
import PlotStack from '$lib/charts/PlotStack.svelte';
import Sparkline from '$lib/charts/Sparkline.svelte';
import { doubtSpecimen, levelSpecimen, loudnessSpecimen, volumeSpecimen } from './specimens';
import { specimenData } from './specimen-data';
import { stackProps } from './stack-of';
import { svgFile } from './svg-file';

test.for([
  { name: 'level-over', specimen: levelSpecimen() },
  { name: 'level-over-narrow', specimen: levelSpecimen({ width: 358 }) },
  { name: 'level-holds', specimen: levelSpecimen({ level: 94 }) },
  { name: 'level-doubt-and-before', specimen: doubtSpecimen() },
  { name: 'volume-sweep', specimen: volumeSpecimen() },
  { name: 'volume-sweep-end-narrow', specimen: volumeSpecimen({ value: 248, width: 358 }) },
  { name: 'loudness-flags', specimen: loudnessSpecimen() },
  {
    name: 'loudness-flags-turned',
    specimen: loudnessSpecimen({ low: 80, high: 106, value: 100, width: 600 })
  }
])('$name', async ({ name, specimen }) => {
  const { body } = render(PlotStack, { props: stackProps(specimen) });
  await expect(svgFile(body)).toMatchFileSnapshot(`snapshots/${name}.svg`);
});

test('sparkline of a plan that does not hold', async () => {
  const { played, wanted } = specimenData(105, 48);
  const props = { levels: played, wanted, holds: false, domain: [84, 110] as const, label: 'Does not hold' };
  await expect(svgFile(render(Sparkline, { props }).body)).toMatchFileSnapshot(
    'snapshots/sparkline-over.svg'
  );
});
