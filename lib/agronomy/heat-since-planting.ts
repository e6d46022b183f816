import { degreeDaysCelsius, degreeDaysFahrenheit } from './degree-days';
import { ImpossibleInput, insufficient, value, type Outcome } from './outcome';
import { requiredNumber } from './required-number';

/** A day's air temperatures in °F or in °C, `day` being 0 on the planting day, 1 on the next. */
export type WeatherDay = { day: number; highF: number; lowF: number } | { day: number; highC: number; lowC: number };

const FAHRENHEIT_PER_CELSIUS = 1.8;

/**
 * `through-yesterday`: what a morning count goes by. `by-the-hour`: the day of the visit brings its part up to then.
 */
export type HeatConvention = 'through-yesterday' | 'by-the-hour';

export type Heat = { degreeDaysF: number; degreeDaysC: number; convention: HeatConvention; plantingDayShare: number };

type HeatAsked = {
  weather: readonly WeatherDay[];
  /** The part of the planting day that was over when the seed went in, 0 to 1; null counts the whole day. */
  plantedAtPart: number | null;
  visitDay: number;
  /** The part of the day of the visit that was over, 0 to 1; 0.5 where no time was noted. */
  visitPart: number;
  convention: HeatConvention;
};

/**
 * How much heat had a field had between planting and a visit?
 *
 * Takes daily highs and lows in °F or °C by day since planting, in any order, when on the planting day it was planted, and the
 * day and part of day of the visit. Returns degree days in both units with the convention that made them. Insufficient where a day
 * that is needed has no weather: the answer names those days. Throws ImpossibleInput for a day given twice, parts outside
 * 0 to 1, a visit before planting, and temperatures as degreeDaysFahrenheit does.
 * Method: 86/50 degree days summed. The planting day counts from planting on, in proportion to what was left of it. Both
 * conventions are in use and differ by up to one day's heat, so the one used is printed beside every figure.
 * A missing day is never guessed. Air temperature is not soil temperature.
 * Example: days of 6, 11.5, 23.5 and 2.5 degree days, planted at the beginning of the first: 41 through the morning of day 3.
 */
export function heatSincePlanting(asked: HeatAsked): Outcome<Heat> {
  const { weather, plantedAtPart, visitDay, visitPart, convention } = asked;
  requiredNumber(visitDay, 'visitDay', { atLeast: 0 });
  requiredNumber(visitPart, 'visitPart', { atLeast: 0, atMost: 1 });
  const plantingDayShare = plantedAtPart === null ? 1 : 1 - requiredNumber(plantedAtPart, 'plantedAtPart', { atLeast: 0, atMost: 1 });
  if (!Number.isInteger(visitDay)) throw new ImpossibleInput('The day of a visit is a whole number of days after planting.', 'visitDay');
  const byDay = heatByDay(weather);
  const lastDay = convention === 'through-yesterday' ? visitDay - 1 : visitDay;
  const missing: number[] = [];
  let degreeDaysF = 0;
  for (let day = 0; day <= lastDay; day += 1) {
    const heat = byDay.get(day);
    if (heat === undefined) missing.push(day);
    else degreeDaysF += heat * shareOfDay(day);
  }
  if (missing.length > 0) return insufficient('weather-missing', `the weather of every day from 0 to ${lastDay}`, `none of day ${missing.join(', ')}`);
  return value({ degreeDaysF, degreeDaysC: degreeDaysF / FAHRENHEIT_PER_CELSIUS, convention, plantingDayShare });

  function shareOfDay(day: number): number {
    const until = day === visitDay ? visitPart : 1;
    const from = day === 0 ? 1 - plantingDayShare : 0;
    return Math.max(0, until - from);
  }
}

function heatByDay(weather: readonly WeatherDay[]): Map<number, number> {
  const byDay = new Map<number, number>();
  for (const weatherDay of weather) {
    const { day } = weatherDay;
    if (!Number.isInteger(day)) throw new ImpossibleInput('Weather is given by whole days after planting.', 'day');
    if (byDay.has(day)) throw new ImpossibleInput(`Day ${day} has its weather twice.`, 'day');
    byDay.set(day, 'highF' in weatherDay ? degreeDaysFahrenheit(weatherDay.highF, weatherDay.lowF) : FAHRENHEIT_PER_CELSIUS * degreeDaysCelsius(weatherDay.highC, weatherDay.lowC));
  }
  return byDay;
}
