import { badField } from '@/lib/errors/app-error';

/** Two settings of one name could not be told apart on any picture. */
export function assertNameFree(name: string, standing: readonly { id: string; name: string }[], ownId?: string): void {
  const taken = standing.some((each) => each.id !== ownId && each.name.toLowerCase() === name.toLowerCase());
  if (taken) throw badField('name', `There is a setting ${name} already. Choose another name.`);
}
