import { fixed, significant } from '$lib/words/format-number';
import { aboutHertzText, dbText, hertzText, litresText, ohmText, percentText } from '$lib/words/quantities';
import { wiringOf } from '$lib/words/wiring-text';
import { beside, pairLines } from '../table';
import { block, type Page } from './page';

/** Columns the left block takes, and the right one may. */
const LEFT = 44;
const RIGHT = 56;

/** The driver as wired beside what the box, and then the room, make of it. */
export function alignmentBlock(page: Page): string[] {
  return beside(driverLines(page), boxLines(page), LEFT);
}

function driverLines(page: Page): string[] {
  const { driver } = page.budget;
  const wiring = wiringOf(page.chain.driver);
  return block(page, driver.count > 1 ? `${driver.count} drivers as wired` : 'Driver as wired', [
    ...(wiring === '' ? [] : [`  ${wiring}`]),
    ...pairLines(
      [
        ['load', `${ohmText(driver.nominal)}, Re ${ohmText(driver.coil.re)}`],
        ['Qts', fixed(driver.qts, 3)],
        ['Bl', `${significant(driver.bl, 3)} Tm`],
        ['moving mass', `${significant(driver.mms * 1000, 3)} g`],
        ['compliance', `${significant(driver.cms * 1000, 3)} mm/N`],
        ['resistance', `${significant(driver.rms, 3)} kg/s`],
        ['from 1 W', `${dbText(driver.level1W)} at 1 m`],
        ['from 2.83 V', `${dbText(driver.level2V83)} at 1 m`],
        ['efficiency', percentText(driver.efficiency)]
      ],
      LEFT
    )
  ]);
}

function boxLines(page: Page): string[] {
  const { alignment: a, system } = page.budget;
  return [
    ...block(
      page,
      'Box',
      pairLines(
        [
          [
            'net volume',
            a.effective > a.net * 1.001
              ? `${litresText(a.net)}, acts as ${litresText(a.effective)}`
              : litresText(a.net)
          ],
          ['alpha', significant(a.alpha, 3)],
          ['fc', hertzText(a.fc)],
          ['Qtc', fixed(a.qtc, 3)],
          ['−3 dB point', hertzText(a.f3)],
          [
            'peak',
            a.peakAt === null || a.peak < 0.05 ? 'none' : `${dbText(a.peak)} at ${aboutHertzText(a.peakAt)}`
          ]
        ],
        RIGHT
      )
    ),
    ...block(
      page,
      'Shaped, in the room',
      pairLines(
        [
          ['−3 dB point', system.f3 === null ? 'none found' : hertzText(system.f3)],
          ['−10 dB point', system.f10 === null ? 'none found' : hertzText(system.f10)],
          [
            'most boost',
            `${dbText(system.boost)} at ${aboutHertzText(system.boostAt)}, ${significant(system.boostPower, 3)} times the power`
          ]
        ],
        RIGHT
      )
    )
  ];
}
