import type { Role } from '@/lib/schemas/vocabulary';

/** Everything that may be asked of a person's role within their own organisation. */
export const actions = [
  'farms.read', 'farms.write', 'plantings.read', 'plantings.write', 'settings.read', 'settings.write',
  'trials.read', 'trials.write', 'observations.read', 'observations.write', 'imports.write', 'kept-files.read-in',
  'scores.read', 'comparison.read', 'replant.read', 'replant.write', 'decision.sign', 'decision.read',
  'people.read', 'people.write', 'changes.read',
] as const;
export type Action = (typeof actions)[number];

export type Actor = {
  personId: string;
  name: string;
  organisationId: string;
  role: Role;
  /** The farms a grower or scout is attached to; owners and agronomists see all of them. */
  farmIds: 'all' | readonly string[];
};

/** The one table of who may do what. A scout sees and counts, a grower sees and decides, the owner keeps the account. */
const allowed: Record<Role, readonly Action[]> = {
  owner: actions,
  agronomist: actions.filter((action) => action !== 'people.write' && action !== 'decision.sign'),
  scout: ['farms.read', 'plantings.read', 'trials.read', 'settings.read', 'observations.read', 'observations.write', 'imports.write', 'scores.read'],
  grower: [
    'farms.read', 'plantings.read', 'trials.read', 'settings.read', 'observations.read', 'scores.read', 'comparison.read',
    'replant.read', 'replant.write', 'decision.sign', 'decision.read',
  ],
};

export function can(actor: Actor, action: Action): boolean {
  return allowed[actor.role].includes(action);
}

/** Whether a thing on this farm exists for the actor at all; what is not on their farms is not found, not forbidden. */
export function seesFarm(actor: Actor, farmId: string): boolean {
  return actor.farmIds === 'all' || actor.farmIds.includes(farmId);
}
