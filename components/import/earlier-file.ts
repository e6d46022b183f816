import type { ImportKind } from '@/lib/schemas/vocabulary';

export type EarlierFile = {
  id: string;
  kind: ImportKind;
  fileName: string;
  lines: number;
  records: number;
  createdAt: string;
  personName: string;
  takenBack: boolean;
};
