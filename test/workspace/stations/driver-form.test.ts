import { fireEvent, screen, within } from '@testing-library/svelte';
import { expect, test } from 'vitest';
import { evaluate } from '$lib/engine/budget/evaluate';
import type { Plan } from '$lib/plan/schema';
import { toChain } from '$lib/plan/to-chain';
import { report } from '$lib/words/report';
import DriverForm from '$lib/workspace/stations/DriverForm.svelte';
import { examplePlan, showForm } from './desk';

const box = (name: string) => screen.getByRole<HTMLInputElement>('textbox', { name });
async function enter(name: string, text: string) {
  await fireEvent.input(box(name), { target: { value: text } });
  await fireEvent.keyDown(box(name), { key: 'Enter' });
}
const radio = (group: string, name: string) =>
  within(screen.getByRole('radiogroup', { name: group })).getByRole('radio', { name });

const withDriver = (over: Partial<Plan['driver']>, minimum = 2): Plan => {
  const plan = examplePlan();
  return {
    ...plan,
    amplifier: { ...plan.amplifier, minimum_load_ohm: minimum },
    driver: { ...plan.driver, ...over }
  };
};
/** The findings' own sentences, by code. */
const findings = (plan: Plan, code: string) => {
  const chain = toChain(plan);
  return report(plan, chain, evaluate(chain, { waysOut: false }))
    .findings.filter((finding) => finding.code === code)
    .map(({ text }) => text);
};

test('a value of the sheet is a patch on the driver, and clearing it takes the key out', async () => {
  const { patch } = showForm(DriverForm, withDriver({ mms_g: 160 }), {});
  await enter('Cone area, Sd', '0.085 m2');
  expect(patch()).toEqual([{ op: 'replace', path: '/driver/sd_cm2', value: 850 }]);
  await enter('Moving mass, Mms', '');
  expect(patch()).toEqual([{ op: 'remove', path: '/driver/mms_g' }]);
});

test('out of its range a value is refused in words, and the old one stays in use', async () => {
  const { onedit, plan } = showForm(DriverForm, examplePlan(), {});
  await enter('Resonance, fs', '3');
  expect(onedit).not.toHaveBeenCalled();
  expect(plan().driver.fs_Hz).toBe(21);
  expect(box('Resonance, fs')).toHaveAccessibleDescription(
    /Resonance fs must be 5 to 200 Hz\. Still using 21 Hz/
  );
  // Across keys: the rule that the stop lies beyond the linear travel.
  await enter('Cone stop one way, Xmech', '12');
  expect(onedit).toHaveBeenCalledOnce();
  expect(box('Cone stop one way, Xmech')).toHaveAccessibleDescription(/inside its linear travel/);
});

// By hand (Small 1972): Cms = Vas/(γ·p·Sd²) with γ·p = 1.4 × 101 325 Pa gives 2.256e-4 m/N for 210 L and 810 cm²;
// Mms = 1/((2π·21)²·Cms) = 254.6 g; Bl² = 2π·21·Mms·Re/Qes = 241.0, Bl = 15.52; 1/Qts = 1/5.2 + 1/0.46, Qts = 0.4226.
test('what follows from the sheet stands beside what it leaves out', () => {
  showForm(DriverForm, examplePlan(), {});
  expect(box('Moving mass, Mms')).toHaveAccessibleDescription(/derived 255 g/);
  expect(box('Compliance, Cms')).toHaveAccessibleDescription(/derived 0\.226 mm\/N/);
  expect(box('Force factor, Bl')).toHaveAccessibleDescription(/derived 15\.5 T·m/);
  expect(box('Total Q, Qts')).toHaveAccessibleDescription(/derived 0\.423/);
  expect(box('Mechanical Q, Qms')).not.toHaveAccessibleDescription(/derived/);
});

test('a contradiction and a suspicion stand at their own fields, in the words of the findings', () => {
  const plan = withDriver({ mms_g: 320, xmax_mm: 60, xmech_mm: 80 });
  const [contradiction] = findings(plan, 'driver-contradiction');
  const suspicions = findings(plan, 'driver-suspicious');
  expect(contradiction).toMatch(/^mms_g is given as 320 g/);
  expect(suspicions).toHaveLength(1);
  showForm(DriverForm, plan, {});
  expect(box('Moving mass, Mms').getAttribute('aria-describedby')).toMatch(/contradiction/);
  expect(box('Moving mass, Mms')).toHaveAccessibleDescription(expect.stringContaining(contradiction));
  expect(box('Travel one way, Xmax')).toHaveAccessibleDescription(expect.stringContaining(suspicions[0]));
  expect(box('Resonance, fs').getAttribute('aria-describedby') ?? '').not.toMatch(/contradiction/);
});

test('a second coil and a second driver bring their wiring in the same patch', async () => {
  const { onedit, patch, plan } = showForm(DriverForm, withDriver({ nominal_ohm: 4 }), {});
  expect(screen.queryByRole('radiogroup')).toBeNull();
  await enter('Coils on each', '2');
  // Two coils of 4 ohm in parallel are the 2 ohm this amplifier allows.
  expect(patch()).toEqual([
    { op: 'add', path: '/driver/coils', value: 2 },
    { op: 'add', path: '/driver/coil_wiring', value: 'parallel' }
  ]);
  await enter('Drivers', '2');
  // Another halving would be 1 ohm, below the 2 ohm allowed: in series.
  expect(patch()).toEqual([
    { op: 'add', path: '/driver/count', value: 2 },
    { op: 'add', path: '/driver/driver_wiring', value: 'series' }
  ]);
  expect(onedit).toHaveBeenCalledTimes(2);
  expect(plan().driver).toMatchObject({ coils: 2, count: 2 });
});

test('back to one coil the wiring leaves the plan, and is remembered for the way back', async () => {
  const { plan } = showForm(DriverForm, withDriver({ coils: 2, coil_wiring: 'series', nominal_ohm: 4 }), {});
  await enter('Coils on each', '1');
  expect(plan().driver).not.toHaveProperty('coil_wiring');
  await enter('Coils on each', '2');
  expect(plan().driver.coil_wiring).toBe('series');
});

test('each wiring says its load, and which is below what the amplifier allows', async () => {
  const start = withDriver({ coils: 2, coil_wiring: 'series', nominal_ohm: 4 }, 4);
  const { patch, container } = showForm(DriverForm, start, {});
  const coils = 'Coils of each driver joined';
  expect(radio(coils, 'In series')).toBeChecked();
  expect(radio(coils, 'In series')).toHaveAccessibleDescription('8 ohm');
  expect(radio(coils, 'One coil alone')).toHaveAccessibleDescription('4 ohm');
  expect(radio(coils, 'In parallel')).toHaveAccessibleDescription('2 ohm, below the amplifier’s 4 ohm');
  expect([...container.querySelectorAll('svg title')].map((title) => title.textContent)).toEqual([
    '2 coils in parallel between two terminals',
    'One of 2 coils between two terminals, the others open',
    '2 coils in series between two terminals'
  ]);
  await fireEvent.click(radio(coils, 'In parallel'));
  expect(patch()).toEqual([{ op: 'replace', path: '/driver/coil_wiring', value: 'parallel' }]);
  expect(screen.getByText(/sees a nominal 2 ohm, below the amplifier’s 4 ohm\./)).toBeVisible();
});

test('L2 and R2 go into the plan and out of it together', async () => {
  const { onedit, patch, plan } = showForm(DriverForm, examplePlan(), {});
  await enter('Lossy inductance, L2', '2.2');
  expect(onedit).not.toHaveBeenCalled();
  expect(box('Lossy inductance, L2')).toHaveAccessibleDescription(/Waits for R2/);
  await enter('Resistance beside it, R2', '9');
  expect(patch()).toEqual([
    { op: 'add', path: '/driver/l2_mH', value: 2.2 },
    { op: 'add', path: '/driver/r2_ohm', value: 9 }
  ]);
  await enter('Lossy inductance, L2', '');
  expect(plan().driver).not.toHaveProperty('r2_ohm');
  expect(box('Resistance beside it, R2')).toHaveValue('9');
  expect(box('Resistance beside it, R2')).toHaveAccessibleDescription(/Waits for L2/);
});

test('facing is said or left out', async () => {
  const { patch } = showForm(DriverForm, examplePlan(), {});
  const faces = screen.getByRole('combobox', { name: 'Cone faces' });
  await fireEvent.change(faces, { target: { value: 'down' } });
  expect(patch()).toEqual([{ op: 'add', path: '/driver/facing', value: 'down' }]);
  await fireEvent.change(faces, { target: { value: '' } });
  expect(patch()).toEqual([{ op: 'remove', path: '/driver/facing' }]);
});
