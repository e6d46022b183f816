import { register } from '@/lib/agronomy/register';
import { inferenceRegister } from '@/lib/agronomy/register-inference';

/** What a formula is called where it is read; a frozen basis may name one that has gone, which keeps its id. */
export function formulaName(id: string): string {
  return [...Object.values(register), ...inferenceRegister].find((entry) => entry.id === id)?.name ?? id;
}
