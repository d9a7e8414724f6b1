import type { ComponentProps, Snippet } from 'svelte';
import Panel from '$lib/charts/Panel.svelte';
import type PlotStack from '$lib/charts/PlotStack.svelte';

export type PanelProps = ComponentProps<typeof Panel>;
export type StackProps = ComponentProps<typeof PlotStack>;

/** A stack as data: what a page writes as markup. */
export interface Specimen {
  readonly stack: Omit<StackProps, 'children'>;
  readonly panels: readonly PanelProps[];
}

/** Props that render a specimen. A snippet and a component are called alike, with the place where they are drawn. */
export function stackProps({ stack, panels }: Specimen): StackProps {
  const children = (place: Parameters<typeof Panel>[0]) => {
    for (const props of panels) Panel(place, props);
  };
  return { ...stack, children: children as unknown as Snippet };
}
