import type { ImportProblem } from '@/lib/schemas/import-table';
import type { LineQuestion } from './import-questions';

/** A file that has been read: what is wrong with it, what is asked about, and how to store it whole. */
export type ReadyImport = {
  problems: ImportProblem[];
  questions: LineQuestion[];
  lines: number;
  records: number;
  rowSamples: number;
  store: (importId: string) => Promise<void>;
};
