import type { DecisionChoice } from '@/lib/schemas/vocabulary';

/** The words around the signature: cautions, buttons, dialog, and what was signed. */
export const decisionTexts = {
  title: 'Decide',
  cautionsTitle: 'Before you press',
  cautions: [
    'Get your insurer’s consent before a stand is destroyed.',
    'Herbicide and seed treatment labels limit what may be planted now, and when.',
    'These are averages of published research from other places and years. Your local extension service and a licensed adviser come first.',
    'When you replant: stop the engine, lower or block the planter and relieve air pressure before reaching into a row unit. Follow the operator’s manual.',
  ],
  alsoAsk: 'Also ask',
  alsoAskLines: [
    'What made the stand poor, and is it mended? A second stand in the same ground can fail the same way.',
    'Hoe or wait first? Sound sprouts under a crust count; after frost, hail or water look again in 3 to 5 days.',
    'What are the seed supplier’s terms for replanting, and is an earlier hybrid to be had?',
    'Who has the planter, and when?',
  ],
  choices: { keep: 'Keep', replant: 'Replant' } satisfies Record<DecisionChoice, string>,
  awaits: 'This awaits the grower’s signature',
  awaitsHelp: 'The grower of this farm signs it, or the owner of the account.',
  dialogTitle: { keep: 'Keep this stand', replant: 'Replant' } satisfies Record<DecisionChoice, string>,
  againstAnswer:
    'That is not what the figures say. It is yours to decide; the answer you read is kept beside your signature.',
  otherPart: (part: string) => `This is about ${part}.`,
  answerRead: 'The answer you read:',
  freezes:
    'Your signature keeps the figures, counts and sentences of this page as they stand. A later change of mind is a new decision.',
  name: 'Your name',
  nameHint: 'Type it to sign.',
  sign: { keep: 'Sign: keep', replant: 'Sign: replant' } satisfies Record<DecisionChoice, string>,
  signing: 'Signing',
  back: 'Back',
  changedTitle: 'What changed since you opened this page',
  readAnew: 'Read the new answer',

  signedFirst: {
    keep: (name: string, day: string) => `Keep. Signed by ${name} on ${day}.`,
    replant: (name: string, day: string) => `Replant. Signed by ${name} on ${day}.`,
  } satisfies Record<DecisionChoice, (name: string, day: string) => string>,
  signedAs: (name: string, person: string) => (name === person ? '' : `Signed in as ${person}.`),
  answerThen: 'The answer that was read:',
  unchanged: 'Nothing it rested on has changed since.',
  changed: 'What it rested on has changed since. The signed numbers stay as they were.',
  restedOn: 'What it rested on',
  now: 'As the records stand now',
  decideAnew: 'Decide anew',
  decideAnewHelp: 'A later change is a new decision. What was signed before stays below.',
  others: 'Signed decisions',
  otherLine: (part: string, choice: string, name: string, day: string) =>
    `${part}: ${choice}, signed by ${name} on ${day}`,

  was: (label: string, before: string, after: string) => `${label} was ${before}, is ${after} now.`,
  isNew: (label: string, after: string) => `${label} is new: ${after}.`,
  isGone: (label: string, before: string) => `${label} is gone; it was ${before}.`,
  sameNumbers: 'Something it rests on was made anew with the same numbers.',
  more: (count: string) => `And ${count} more.`,
} as const;
