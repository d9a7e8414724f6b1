/** Panels of the amplifier question over the boost. */
import type { System } from '$lib/words/units/unit';
import {
  travelPanel,
  travelTitle,
  VOLTS_TITLE,
  voltsPanel,
  wattsPanel,
  wattsTitle,
  type Swept
} from './demand-panels';
import { blank, type PanelData } from './panel-data';

export const boostPanels = (of: Swept): PanelData[] => [
  wattsPanel(of, true),
  voltsPanel(of),
  travelPanel(of)
];

/** As high as the panels will be, before there is a sweep. */
export const blankBoostPanels = (load: number, system: System): PanelData[] =>
  [
    { title: wattsTitle(load), height: 120 },
    { title: VOLTS_TITLE, height: 104 },
    { title: travelTitle(system), height: 112 }
  ].map(blank);
