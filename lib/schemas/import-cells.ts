import { calendarDaySchema, timeOfDaySchema } from './operation';
import type { ImportLine, ImportProblem } from './import-table';

/** Reads the cells of one line and collects what is wrong with them. */
export class ImportCells {
  readonly problems: ImportProblem[] = [];
  private readonly source: ImportLine;

  constructor(source: ImportLine) {
    this.source = source;
  }

  text(column: string): string {
    return this.source.cells[column] ?? '';
  }

  wrong(column: string, message: string): undefined {
    this.problems.push({ line: this.source.line, column, message });
    return undefined;
  }

  required(column: string, what: string, most: number): string | undefined {
    const text = this.text(column);
    if (text === '') return this.wrong(column, `Write ${what}.`);
    return text.length > most ? this.wrong(column, `Use at most ${most} characters.`) : text;
  }

  optional(column: string, most: number): string | null | undefined {
    const text = this.text(column);
    if (text === '') return null;
    return text.length > most ? this.wrong(column, `Use at most ${most} characters.`) : text;
  }

  /** Only the form that can be read one way: in 5/6/2026 nobody can tell the month from the day. */
  date(column: string): string | undefined {
    const text = this.text(column);
    if (text === '') return this.wrong(column, 'Write the date of the visit, such as 2026-05-18.');
    return calendarDaySchema.safeParse(text).success ? text : this.wrong(column, `"${text.slice(0, 30)}" is no date as year-month-day. Write it such as 2026-05-18.`);
  }

  time(column: string): string | null | undefined {
    const text = this.text(column);
    if (text === '') return null;
    const [, hour, minute] = /^(\d{1,2}):(\d{2})(?::00)?$/.exec(text) ?? [];
    const padded = `${(hour ?? '').padStart(2, '0')}:${minute ?? ''}`;
    return timeOfDaySchema.safeParse(padded).success ? padded : this.wrong(column, `"${text.slice(0, 30)}" is no time of day. Write it such as 07:30, or leave it empty.`);
  }

  wholeNumber(column: string, what: string, most: number, whenEmpty?: number): number | undefined {
    const text = this.text(column);
    if (text === '' && whenEmpty !== undefined) return whenEmpty;
    if (text === '') return this.wrong(column, `Write ${what} as a whole number; 0 where there were none.`);
    if (!/^\d{1,9}$/.test(text)) return this.wrong(column, `"${text.slice(0, 30)}" is no whole number. Write ${what}, such as 24.`);
    return Number(text) > most ? this.wrong(column, `More than ${most.toLocaleString('en-US')} in one row sample cannot be right.`) : Number(text);
  }
}
