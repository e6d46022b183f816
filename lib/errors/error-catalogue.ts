/**
 * Every way in which Rowrise says no, with its HTTP status and its sentence. A code that is missing here does not
 * compile, and a sentence always says what to do next.
 */
export const errorCatalogue = {
  'not-signed-in': { status: 401, sentence: 'Sign in first. What you typed is still on this page.' },
  'wrong-credentials': { status: 401, sentence: 'E-mail and password do not match. Try again, or ask the owner of the account for a new link.' },
  'other-origin': { status: 403, sentence: 'This request came from another site and was not carried out.' },
  forbidden: { status: 403, sentence: 'Your role does not allow this. Ask the owner of the account.' },
  'not-author': { status: 403, sentence: 'This entry was made by another person and can only be sent as theirs.' },
  'not-found': { status: 404, sentence: 'There is nothing here for you. Check the address, or ask the owner of the account.' },
  'bad-input': { status: 422, sentence: 'Some of what was entered cannot be used. Nothing was stored; mend the named places and send again.' },
  'bad-json': { status: 400, sentence: 'The request could not be read as JSON.' },
  'not-json': { status: 415, sentence: 'Send JSON.' },
  'not-a-picture': { status: 415, sentence: 'Send a JPEG, PNG or WebP picture.' },
  'too-large': { status: 413, sentence: 'That is more than can be taken at once.' },
  'needs-confirmation': { status: 409, sentence: 'Please look again at what is asked below.' },
  conflict: { status: 409, sentence: 'Somebody else changed this since you opened it. Your version is kept; open the page again to see theirs and settle which holds.' },
  'operation-reused': { status: 409, sentence: 'This entry was sent before with other content. Nothing was changed.' },
  'follows-unknown': { status: 409, sentence: 'This entry builds on one that has not arrived. Send that one first.' },
  locked: { status: 409, sentence: 'This was locked before planting and cannot be changed any more.' },
  'already-there': { status: 409, sentence: 'There is one with this name already. Choose another name.' },
  'in-use': { status: 409, sentence: 'Other records rest on this one, so it stays.' },
  'basis-changed': { status: 409, sentence: 'The numbers changed since this page was opened. Read the new answer before signing.' },
  'unknown-kind': { status: 422, sentence: 'This kind or version of entry is not known here. Keep it and update.' },
  'link-used': { status: 410, sentence: 'This link has been used, taken back or is too old. Ask for a new one.' },
  'too-many-tries': { status: 429, sentence: 'Too many tries. Wait a few minutes.' },
  'method-not-allowed': { status: 405, sentence: 'That cannot be done here.' },
  busy: { status: 503, sentence: 'The server is busy or its database is away. Nothing was lost; try again in a moment.' },
  unexpected: { status: 500, sentence: 'Something went wrong on our side. Nothing was stored; try again, and tell us if it stays.' },
} as const satisfies Record<string, { status: number; sentence: string }>;

export type ErrorCode = keyof typeof errorCatalogue;
