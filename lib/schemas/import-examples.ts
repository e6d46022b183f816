import type { ImportKind } from './vocabulary';

const countsHead = 'row_sample,date,time,so_far,doubtful,marker';
const tapeHead = 'row_sample,date,tape,place,marker,kind,leaf_stage';
const unlabeled = ['S1-1', 'S1-2'];

/** An example file of each kind, on the planting's own labels and days where it has them; the numbers are invented. */
export function importExample(kind: ImportKind, labels: readonly string[], days: readonly [string, string]): string {
  const [first, second] = [labels[0] ?? unlabeled[0], labels[1] ?? unlabeled[1]];
  const lines =
    kind === 'counts'
      ? [countsHead, `${first},${days[0]},07:30,11,0,white`, `${first},${days[1]},07:45,24,2,red`, `${second},${days[0]},08:00,9,0,white`, `${second},${days[1]},08:10,26,1,red`]
      : [tapeHead, `${first},${days[1]},in,3,white,,2`, `${first},${days[1]},in,9 1/2,white,,2`, `${first},${days[1]},in,16,red,late,1`, `${first},${days[1]},in,22,,missing,`];
  return lines.map((line) => `${line}\r\n`).join('');
}
