import { soilCelsiusLeast, soilCelsiusMost, soilFahrenheitLeast, soilFahrenheitMost } from './field-limits';
import { plainTyping } from './plain-typing';
import type { TemperatureUnit } from './vocabulary';

export type SoilTemperature = { typed: string; unit: TemperatureUnit; thousandths: number };
export type ParsedSoilTemperature = { ok: true; temperature: SoilTemperature } | { ok: false; message: string };

const typedMost = 20;

/** Reads a soil temperature as typed, such as 52 or -1.5. Apart from the other readings, because it may lie below zero. */
export function parseSoilTemperature(text: string, unit: TemperatureUnit): ParsedSoilTemperature {
  const typed = text.trim();
  const plain = plainTyping(typed);
  if (plain === '') return { ok: false, message: 'Type the soil temperature.' };
  if (typed.length > typedMost || !/^[-+]?(\d+([.,]\d{1,2})?|[.,]\d{1,2})$/.test(plain)) {
    return { ok: false, message: `Write the soil temperature as a number such as ${unit === 'F' ? '52' : '11.5'}.` };
  }
  const degrees = Number(plain.replace(',', '.'));
  const [least, most] = unit === 'F' ? [soilFahrenheitLeast, soilFahrenheitMost] : [soilCelsiusLeast, soilCelsiusMost];
  if (degrees < least || degrees > most) {
    return { ok: false, message: `The soil temperature is expected between ${least} and ${most} °${unit}; this says ${typed}. Check the number and the unit.` };
  }
  return { ok: true, temperature: { typed, unit, thousandths: Math.round(degrees * 1000) } };
}
