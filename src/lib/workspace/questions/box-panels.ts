/** Panels of the box question over net volume. */
import { niceDomain } from '$lib/charts/nice-domain';
import { travelPanel, travelTitle, wattsPanel, wattsTitle, type Swept } from './demand-panels';
import { blank, unnamed, type PanelData } from './panel-data';
import type { System } from '$lib/words/units/unit';

const QTC_TITLE = 'Qtc before shaping';
const F3_TITLE = '−3 dB point, Hz';

function qtcPanel({ sweep, x, tint }: Swept): PanelData {
  const qtc = sweep.rows.map((r) => r.qtc);
  return {
    title: QTC_TITLE,
    height: 84,
    y: niceDomain(qtc, { steps: 3 }),
    curves: [{ id: 'qtc', tone: 'played', x, y: qtc }],
    ranges: tint.ranges
  };
}

function f3Panel({ sweep, x, tint }: Swept): PanelData {
  const alone = sweep.rows.map((r) => r.alignmentF3);
  const room = sweep.rows.map((r) => r.systemF3 ?? NaN);
  return {
    title: F3_TITLE,
    height: 96,
    y: niceDomain([...alone, ...room], { steps: 3 }),
    curves: [
      { id: 'alone', tone: 'plain', label: 'box alone', x, y: alone },
      { id: 'room', tone: 'played', label: 'in the room', x, y: room }
    ],
    ranges: unnamed(tint.ranges)
  };
}

export const boxPanels = (of: Swept): PanelData[] => [
  qtcPanel(of),
  f3Panel(of),
  wattsPanel(of, false),
  travelPanel(of)
];

/** As high as the panels will be, before there is a sweep. */
export const blankBoxPanels = (load: number, system: System): PanelData[] =>
  [
    { title: QTC_TITLE, height: 84 },
    { title: F3_TITLE, height: 96 },
    { title: wattsTitle(load), height: 120 },
    { title: travelTitle(system), height: 112 }
  ].map(blank);
