import type { Plan } from '$lib/plan/schema';

/** What a plan is called. */
export const titleOf = (plan: Plan): string => plan.title || 'Untitled plan';
