/** The words that every form shares: what is asked before saving, what a conflict leaves, and how a thing is removed. */
export const formTexts = {
  yes: 'Yes, that is what I saw',
  yesToAll: 'Save with these answers',
  askedLead: 'Nothing is saved yet. Say yes to each of these, or change what you typed.',
  askedLeadOne: 'Nothing is saved yet. Say yes, or change what you typed.',
  saving: 'Saving',
  removing: 'Removing',
  cancel: 'Leave it',
  optional: 'may stay empty',
  showStanding: 'Show what stands now',
  standingShown: 'What stands now is named beside each place where yours differs. Save again to make yours hold.',
  standsNow: (text: string) => `Stands now: ${text}`,
  nothing: 'nothing',
  remove: 'Remove',
  change: 'Change',
  save: 'Save',
  saved: 'Saved.',
} as const;
