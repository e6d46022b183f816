import { referenceJson } from './reference-designs';

type OneDifference = {
  difference: number;
  se: number;
  df: number;
  mse: number;
  lower: number;
  upper: number;
};
type Test = { F: number; p: number };

export type ReferenceEnvironments = {
  input: { y: number[]; setting: string[]; environment: string[] };
  block: string[];
  first: string;
  second: string;
  expected: {
    interaction: Test & { ss: number; df: number };
    error: { ms: number; df: number };
    settings_against_error: Test;
    settings_against_interaction: Test;
    without: Test & { ms: number; df: number };
    without_difference: OneDifference;
    environments: string[];
    each: OneDifference[];
    others: { mean: number; se: number; df: number; p: number; lower: number; upper: number };
    these: { se: number; df: number; p: number; lower: number; upper: number };
  };
};

type TrialComparison = {
  environments: Record<'immer' | 'barley' | 'immer_lost', ReferenceEnvironments>;
  row_units: Record<
    'complete' | 'lost',
    {
      input: { y: number[]; strip: string[]; unit: string[] };
      expected: {
        units: string[];
        less_others: number[];
        se: number[];
        p: number[];
        p_holm: number[];
        df: number;
        F: number;
        F_p: number;
      };
    }
  >;
  residue: Record<
    'trees' | 'lost',
    {
      input: { y: number[]; x: number[]; block: string[] };
      expected: { slope: number; se: number; p: number; lower: number; upper: number; df: number };
    }
  >;
  noncentral_f: Record<'f' | 'd1' | 'd2' | 'ncp' | 'p', number[]>;
  paired: { blocks: number; power_of_1: number; delta_at_80: number }[];
  needed: { delta: number; n: number }[];
  blocks: {
    settings: number;
    blocks: number;
    power_of_1: Record<'any' | 'holm' | 'tukey', number>;
    delta_at_80: Record<'any' | 'holm' | 'tukey', number>;
  }[];
  strip_sd: { sd: number; df: number; lower: number; upper: number };
};

/** Printed by tests/reference/r/trial-comparison.R in R 4.2.2. */
export const trialComparison = referenceJson<TrialComparison>('trial-comparison.json');
