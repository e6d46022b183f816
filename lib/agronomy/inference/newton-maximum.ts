export type Maximum = { at: number[]; value: number; information: number[][] };

/**
 * Where is a smooth function of a few numbers at its greatest, and how sharply?
 *
 * Takes the function and where to begin. Returns the place, the value and the observed information (the negative second
 * differences there), or null where no step improves and the slope is not flat. Throws nothing of its own.
 * Method: Newton’s steps from central differences, made uphill by Levenberg’s damping and halved until they improve.
 * It finds the top it stands under: begin near it. Example: −(x − 2)² from 0 gives 2 with information 2.
 */
export function newtonMaximum(f: (at: readonly number[]) => number, begin: readonly number[]): Maximum | null {
  let at = [...begin];
  let value = f(at);
  let damping = 1e-3;
  for (let step = 0; step < 300; step += 1) {
    const { slope, information } = differences(f, at, value);
    const move = damped(information, slope, damping);
    if (move === null) {
      damping = Math.max(1e-6, damping * 10);
      if (damping > 1e12) return null;
      continue;
    }
    const next = at.map((each, index) => each + (move[index] as number));
    const nextValue = f(next);
    if (nextValue >= value) {
      const moved = Math.max(...move.map(Math.abs));
      at = next;
      value = nextValue;
      damping = Math.max(1e-12, damping / 10);
      if (moved < 1e-9) return { at, value, information: differences(f, at, value).information };
    } else {
      damping = Math.max(1e-9, damping * 10);
      // Steps too small to tell apart: this is the top, as far as numbers go.
      if (damping > 1e12) return Math.max(...slope.map(Math.abs)) < 1e-3 ? { at, value, information } : null;
    }
  }
  return null;
}

function differences(f: (at: readonly number[]) => number, at: readonly number[], value: number) {
  const size = at.length;
  const h = at.map((each) => 1e-4 * Math.max(1, Math.abs(each)));
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
