/** What a screen shows when a number is opened: where it comes from, in plain words. */
export type RegisterEntry = {
  id: string;
  /** Changes when the formula does; kept with every stored figure. */
  version: string;
  name: string;
  /** What the figure says, in one sentence. */
  sentence: string;
  equation: string;
  source: string;
  /** What it can be figured for. */
  domain: string;
  /** What it does not tell. */
  limits: string;
  workedExample: WorkedExample;
};

export type WorkedExample = {
  /** In words, for the reader. */
  given: string;
  result: string;
  /** The same as numbers, for the test that figures it again. */
  inputs: Readonly<Record<string, number | string | readonly number[]>>;
  expected: Readonly<Record<string, number>>;
  /** How far the figured result may lie from the expected one: half of the last digit printed. */
  tolerance: number;
  /** Where the example comes from; `own arithmetic` is no outside evidence and says so. */
  source: string;
};
