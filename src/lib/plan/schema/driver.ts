import { z } from 'zod';
import { DEFAULTS } from '../defaults';
import { optional, quantity, required, whole } from './keys';

/** One driver's data sheet, how many there are, and how they are wired. Coil values are per coil. */
export const driverSchema = z.strictObject({
  label: optional(z.string(), 'A name of your own for the driver.'),
  count: optional(whole(1, 16), 'Identical drivers sharing the box.', DEFAULTS.count),
  coils: optional(whole(1, 4), 'Voice coils of one driver.', DEFAULTS.coils),
  coil_wiring: optional(
    z.enum(['single', 'series', 'parallel']),
    'How the coils of one driver are joined; required with more than one coil. "single" drives one and leaves the others open.'
  ),
  driver_wiring: optional(
    z.enum(['series', 'parallel']),
    'How the drivers are joined; required with more than one driver.'
  ),
  fs_Hz: optional(quantity(5, 200), 'Resonance in free air, Hz; or from mms_g beside vas_L or cms_mm_per_N.'),
  qms: optional(
    quantity(0.2, 50),
    'Mechanical Q at resonance; or from rms_kg_per_s, or from qts beside qes.'
  ),
  qes: optional(
    quantity(0.05, 20),
    'Electrical Q at resonance, all coils driven; or from bl_Tm, or from qts beside qms.'
  ),
  qts: optional(
    quantity(0.05, 20),
    'Total Q at resonance, all coils driven; beside qms and qes a check only.'
  ),
  vas_L: optional(
    quantity(0.1, 5000),
    'Volume of air as stiff as the suspension, of one driver at 20 °C and 101.325 kPa, litres; or from mms_g or cms_mm_per_N.'
  ),
  re_ohm: required(quantity(0.1, 100), 'Resistance of one coil at DC, cold, ohm.'),
  le_mH: optional(quantity(0, 100), 'Inductance of one coil, mH.', DEFAULTS.le_mH),
  l2_mH: optional(
    quantity(0, 200),
    'Lossy part of the inductance of one coil, mH; only together with r2_ohm.'
  ),
  r2_ohm: optional(
    quantity(0.01, 1000),
    'Resistance beside l2_mH of one coil, ohm; only together with l2_mH.'
  ),
  sd_cm2: required(quantity(5, 5000), 'Area of one cone, to the middle of the surround, cm².'),
  nominal_ohm: optional(
    quantity(0.1, 100),
    'Nominal impedance of one coil, ohm; left out, the usual one nearest to 1.25 times re_ohm.'
  ),
  mms_g: optional(quantity(0.5, 5000), 'Moving mass of one driver with its air load, g.'),
  cms_mm_per_N: optional(quantity(0.001, 50), 'Compliance of the suspension of one driver, mm/N.'),
  bl_Tm: optional(quantity(0.1, 200), 'Force factor of one coil, T·m (the same as N/A).'),
  rms_kg_per_s: optional(
    quantity(0.01, 100),
    'Mechanical resistance of one driver, kg/s (the same as N·s/m).'
  ),
  xmax_mm: optional(quantity(0.1, 100), 'Linear travel one way, peak, mm; half of a peak-to-peak figure.'),
  xmech_mm: optional(
    quantity(0.1, 200),
    'Travel one way at which the cone meets its stop, not below xmax_mm, mm.'
  ),
  facing: optional(z.enum(['side', 'down', 'up']), 'Where the cone faces; down and up are checked for sag.'),
  coil_rise_K: optional(
    quantity(0, 300),
    'How much hotter than cold the coil is in the hot figures, K.',
    DEFAULTS.coil_rise_K
  ),
  power_W: optional(quantity(1, 20000), 'Continuous rating of one driver, all its coils, W.'),
  displacement_L: optional(
    quantity(0, 100),
    'Volume one driver takes from the box, litres; left out, estimated from sd_cm2.'
  )
});
