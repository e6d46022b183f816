import type { UnitSystem } from '@/lib/schemas/vocabulary';
import { moneyAmount } from './money-amount';
import { moneyText, type MoneyOptions } from './money-text';
import { shownInUnits } from './shown-in-units';
import { unitName } from './unit-name';

/** `moneyPerAreaText('97.4', 'us')` is "$97 per acre", in metric "$241 per hectare". */
export function moneyPerAreaText(
  dollarsPerAcre: string | number,
  units: UnitSystem,
  { withUnit = true, ...options }: MoneyOptions & { withUnit?: boolean } = {},
): string {
  const shown = shownInUnits(moneyAmount(dollarsPerAcre), 'money-per-area', units);
  const amount = moneyText(shown, options);
  return withUnit ? `${amount} ${unitName('money-per-area', units)}` : amount;
}
