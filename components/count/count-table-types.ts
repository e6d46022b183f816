import type { Findings } from './finding-texts';
import type { RowPlaceFacts } from './row-place-text';

export type TableCount = { id: string; visitedOn: string; visitedAt: string | null; plantsUp: number; doubtful: number; used: boolean; personName: string };

/** One row sample as the table of counts shows it; counts stand in the order of visits. */
export type CountRow = { id: string; label: string; place: RowPlaceFacts; counts: readonly TableCount[]; findings: Findings };
