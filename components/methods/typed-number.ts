import { tryTexts } from '@/lib/texts/method-texts';
import type { TryAnswer } from './try-definition';

type NumberRule = { field: string; what: string; least?: number; most?: number };

/** A plain number as people type it, with a decimal comma or a comma for thousands; or what is wrong with it. */
export function typedNumber(typed: string, { field, what, least, most }: NumberRule): number | TryAnswer {
  const wrong = (message: string): TryAnswer => ({ kind: 'wrong', field, message });
  const text = typed.trim().replace('−', '-');
  const plain = /^-?\d{1,3}(,\d{3})+(\.\d+)?$/.test(text) ? text.replaceAll(',', '') : text.replace(',', '.');
  if (!/^-?(\d+(\.\d+)?|\.\d+)$/.test(plain)) return wrong(tryTexts.typeNumber(what));
  const number = Number(plain);
  if (least !== undefined && number < least) return wrong(tryTexts.notLess(what, least));
  if (most !== undefined && number > most) return wrong(tryTexts.notMore(what, most));
  return number;
}
