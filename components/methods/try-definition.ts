export type TryChoice = { value: string; label: string };

export type TryField = {
  key: string;
  label: string;
  unit?: string;
  kind: 'number' | 'lines' | 'choice';
  choices?: readonly TryChoice[];
  /** What the form opens with: a published example. */
  initial: string;
};

export type TryValues = Readonly<Record<string, string>>;

/** What the formula says: an answer with its facts, too little to say, or a field to mend. */
export type TryAnswer =
  | { kind: 'answer'; text: string; facts?: readonly { name: string; text: string }[]; detail?: string }
  | { kind: 'insufficient'; text: string }
  | { kind: 'wrong'; field: string; message: string };

/** A formula to try: its fields, and what it makes of what is typed. */
export type TryDefinition = {
  id: string;
  title: string;
  source: string;
  fields: readonly TryField[];
  answer: (values: TryValues) => TryAnswer;
};
