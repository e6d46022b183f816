// A spreadsheet runs a cell that opens with one of these as a formula, also when it came out of a file.
const opensAsFormula = /^[=+\-@\t\r]/;
const isPlainNumber = /^[+-]?\d[\d,]*(\.\d+)?( ?%)?$/;

function cellText(text: string): string {
  const safe = opensAsFormula.test(text) && !isPlainNumber.test(text) ? `'${text}` : text;
  return /[",\r\n]/.test(safe) ? `"${safe.replaceAll('"', '""')}"` : safe;
}

/** A comma-separated text of what a table shows: one header line, then the rows; lines end as RFC 4180 asks. */
export function csvText(head: readonly string[], rows: readonly (readonly string[])[]): string {
  return [head, ...rows].map((row) => `${row.map(cellText).join(',')}\r\n`).join('');
}
