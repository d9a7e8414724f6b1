/** Plans as files: what is stored is what is written, also of a plan this Sealwright cannot read. */
import { serialisePlan } from '$lib/plan/serialise-plan';
import type { Plan } from '$lib/plan/schema';
import { titleOf } from '$lib/words/title';
import { fileName, fileNames } from './file-name';
import type { ShelvedPlan } from './plan-record';
import type { Shelf } from './shelf';

export interface ExportedFile {
  readonly name: string;
  readonly text: string;
}

export const exportPlan = (plan: Plan): ExportedFile => ({
  name: fileName(titleOf(plan)),
  text: serialisePlan(plan)
});

export const exportShelved = (shelved: ShelvedPlan): ExportedFile => ({
  name: fileName(titleOfShelved(shelved)),
  text: textOf(shelved)
});

/** Every plan on the shelf, no two files of one name. */
export async function exportAll(shelf: Pick<Shelf, 'list' | 'get'>): Promise<ExportedFile[]> {
  const shelved: ShelvedPlan[] = [];
  for (const { id } of await shelf.list()) {
    const plan = await shelf.get(id);
    if (plan !== null) shelved.push(plan);
  }
  const names = fileNames(shelved.map(titleOfShelved));
  return shelved.map((plan, i) => ({ name: names[i], text: textOf(plan) }));
}

const titleOfShelved = (shelved: ShelvedPlan): string =>
  shelved.readable ? titleOf(shelved.record.plan) : shelved.summary.title;

const textOf = (shelved: ShelvedPlan): string =>
  shelved.readable ? serialisePlan(shelved.record.plan) : `${JSON.stringify(shelved.raw ?? null, null, 2)}\n`;
