/** The words around signing in and out, and of pages that are not there. */
export const sessionTexts = {
  signIn: 'Sign in',
  signOut: 'Sign out',
  email: 'E-mail',
  password: 'Password',
  signInHelp: 'No account, or the password is gone? The owner of your account makes you a one-time link.',
  notFound: 'There is nothing at this address',
  notFoundHelp: 'It may belong to somebody else, or the address may be misspelled.',
  toStart: 'To the start page',
  failed: 'This page could not be made',
  failedHelp: 'Nothing was lost. Try again; if it stays, tell the owner of your account.',
  tryAgain: 'Try again',
  chooseOrganisation: 'Where do you want to go?',
  noOrganisation: 'You belong to no account any more',
  noOrganisationHelp: 'Ask the owner of the account for a new one-time link.',
  demoNotice: (today: string) => `Demo, all invented. Today is ${today} here.`,
} as const;
