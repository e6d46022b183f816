/** So little to gain moves a place by a hundred-thousandth of its standard error. */
const LEAST_GAIN = 1e-10;
/** A gain below this share of the value itself is lost in its rounding. */
const LEAST_GAIN_OF_VALUE = 1e-13;

/** Of central differences: the same wherever it stands, for a place far from 0 can still be sharp. */
const STEP = 1e-4;

export type Maximum = { at: number[]; value: number; information: number[][] };

/**
 * Where is a smooth function of a few numbers at its greatest, and how sharply?
 *
 * Takes the function and where to begin. Returns the place, the value and the observed information (the negative second
 * differences there), or null where no step improves and the slope is not flat. Throws nothing of its own.
 * Method: Newton’s steps from central differences, made uphill by Levenberg’s damping, which grows until a step improves. It
 * is the top only where an undamped step would no longer gain anything: a short step under heavy damping shows nothing.
 * It finds the top it stands under: begin near it, in numbers that matter by about 1. Example: −(x − 2)² from 0 gives 2 with information 2.
 */
export function newtonMaximum(f: (at: readonly number[]) => number, begin: readonly number[]): Maximum | null {
  let at = [...begin];
  let value = f(at);
  let damping = 1e-3;
  for (let step = 0; step < 300 && damping < 1e12; step += 1) {
    const { slope, information } = differences(f, at, value);
    const whole = damped(information, slope, 0);
    if (whole && gainOf(whole, slope) < Math.max(LEAST_GAIN, LEAST_GAIN_OF_VALUE * Math.abs(value))) return { at, value, information };
    for (let improved = false; !improved && damping < 1e12; ) {
      const move = damped(information, slope, damping);
      const next = at.map((each, index) => each + (move?.[index] ?? NaN));
      const nextValue = move ? f(next) : NaN;
      improved = nextValue > value;
      if (improved) [at, value] = [next, nextValue];
      damping = improved ? Math.max(1e-9, damping / 10) : damping * 10;
    }
  }
  return null;
}

/** What a move along this slope would gain. */
const gainOf = (move: readonly number[], slope: readonly number[]) => move.reduce((sum, each, index) => sum + each * (slope[index] as number), 0);

function differences(f: (at: readonly number[]) => number, at: readonly number[], value: number) {
  const size = at.length;
  const h = at.map(() => STEP);
  const shifted = (first: number, by: number, second = -1, bySecond = 0) =>
    f(at.map((each, index) => each + (index === first ? by : 0) + (index === second ? bySecond : 0)));
  const slope = at.map((_, i) => (shifted(i, h[i] as number) - shifted(i, -(h[i] as number))) / (2 * (h[i] as number)));
  const information = Array.from({ length: size }, () => new Array<number>(size).fill(0));
  for (let i = 0; i < size; i += 1) {
    for (let j = i; j < size; j += 1) {
      const [a, b] = [h[i] as number, h[j] as number];
      const curve =
        i === j
          ? (shifted(i, a) - 2 * value + shifted(i, -a)) / (a * a)
          : (shifted(i, a, j, b) - shifted(i, a, j, -b) - shifted(i, -a, j, b) + shifted(i, -a, j, -b)) / (4 * a * b);
      (information[i] as number[])[j] = -curve;
      (information[j] as number[])[i] = -curve;
    }
  }
  return { slope, information };
}

/** Solves (information + damping × its own diagonal) × move = slope; null where that is not positive definite. */
function damped(information: number[][], slope: number[], damping: number): number[] | null {
  const size = slope.length;
  const work = information.map((row, i) => [...row.map((each, j) => (i === j ? each + damping * Math.max(1, Math.abs(each)) : each)), slope[i] as number]);
  for (let pivot = 0; pivot < size; pivot += 1) {
    const row = work[pivot] as number[];
    const head = row[pivot] as number;
    if (!(head > 0)) return null;
    for (let below = pivot + 1; below < size; below += 1) {
      const other = work[below] as number[];
      const factor = (other[pivot] as number) / head;
      for (let column = pivot; column <= size; column += 1) other[column] = (other[column] as number) - factor * (row[column] as number);
    }
  }
  const move = new Array<number>(size).fill(0);
  for (let row = size - 1; row >= 0; row -= 1) {
    const line = work[row] as number[];
    let rest = line[size] as number;
    for (let column = row + 1; column < size; column += 1) rest -= (line[column] as number) * (move[column] as number);
    move[row] = rest / (line[row] as number);
  }
  return move.every(Number.isFinite) ? move : null;
}
