/** The numbers of a driver's data sheet, grouped as a sheet is read. */
import type { Plan } from '$lib/plan/schema';
import type { Stepping } from '$lib/words/units/quantity';
import type { System } from '$lib/words/units/unit';

export type DriverKey = keyof Plan['driver'];

export interface SheetField {
  readonly key: DriverKey;
  readonly label: string;
  readonly help?: string;
  /** In place of the quantity's own steps. */
  readonly stepping?: Readonly<Record<System, Stepping>>;
}

export type SheetPart = 'small-signal' | 'coil' | 'cone' | 'limits' | 'fitting';

const both = (small: number, large: number): Readonly<Record<System, Stepping>> => ({
  metric: { small, large },
  imperial: { small, large }
});
const TRAVEL: SheetField['stepping'] = {
  metric: { small: 0.5, large: 5 },
  imperial: { small: 0.02, large: 0.2 }
};

export const SHEET: { readonly [P in SheetPart]: readonly SheetField[] } = {
  'small-signal': [
    {
      key: 'fs_Hz',
      label: 'Resonance, fs',
      help: 'In free air, outside any box.',
      stepping: both(0.5, 5)
    },
    { key: 'qms', label: 'Mechanical Q, Qms', stepping: both(0.1, 1) },
    {
      key: 'qes',
      label: 'Electrical Q, Qes',
      help: 'With all its coils driven. The plan works out what one coil alone does.'
    },
    {
      key: 'qts',
      label: 'Total Q, Qts',
      help: 'Beside Qms and Qes it is a check and no more; beside one of them it gives the other.'
    },
    {
      key: 'vas_L',
      label: 'Equivalent volume, Vas',
      help: 'The volume of air as stiff as the suspension, of one driver.'
    }
  ],
  coil: [
    {
      key: 're_ohm',
      label: 'DC resistance, Re',
      help: 'Cold, as an ohmmeter reads it across one coil.'
    },
    { key: 'le_mH', label: 'Inductance, Le', help: 'Left out, the coil is taken to have none.' },
    {
      key: 'nominal_ohm',
      label: 'Nominal impedance',
      help: 'What the maker calls it. Left out, it is the usual load nearest to 1.25 times Re.',
      stepping: both(1, 4)
    }
  ],
  cone: [
    { key: 'sd_cm2', label: 'Cone area, Sd', help: 'Out to the middle of the surround, one cone.' },
    { key: 'mms_g', label: 'Moving mass, Mms', help: 'With the air that moves along.' },
    { key: 'cms_mm_per_N', label: 'Compliance, Cms' },
    { key: 'rms_kg_per_s', label: 'Mechanical resistance, Rms' },
    { key: 'bl_Tm', label: 'Force factor, Bl', help: 'Of one coil; newton per ampere is the same.' }
  ],
  limits: [
    {
      key: 'xmax_mm',
      label: 'Travel one way, Xmax',
      help: 'One way, from rest. If the sheet says peak to peak, enter half of it.',
      stepping: TRAVEL
    },
    {
      key: 'xmech_mm',
      label: 'Cone stop one way, Xmech',
      help: 'One way, from rest to where the cone meets its stop. Left out, the stop is not judged.',
      stepping: TRAVEL
    },
    {
      key: 'power_W',
      label: 'Power, continuous',
      help: 'What one driver takes for hours, all its coils together. Leave peak and programme figures aside.'
    }
  ],
  fitting: [
    {
      key: 'displacement_L',
      label: 'Volume it takes up',
      help: 'What one driver takes from the inside of the box. Left out, it is estimated from the cone area, to within 40 %.',
      stepping: { metric: { small: 0.1, large: 1 }, imperial: { small: 0.005, large: 0.05 } }
    },
    {
      key: 'coil_rise_K',
      label: 'Coil rise when hot',
      help: 'How much hotter than cold the coil is in the hot figures. 100 to 150 K after hard use is common practice.'
    }
  ]
};
