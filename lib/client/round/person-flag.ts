const key = 'rowrise-round-asks-first';

/**
 * Somebody signed in or out at the desk pages of this browser: the field page must learn who it is before it shows
 * anybody's rows again.
 */
export function askFirst(): void {
  try {
    localStorage.setItem(key, 'yes');
  } catch {
    // Without storage the field page keeps nobody in mind anyway.
  }
}

export function asksFirst(): boolean {
  try {
    return localStorage.getItem(key) === 'yes';
  } catch {
    return false;
  }
}

export function personConfirmed(): void {
  try {
    localStorage.removeItem(key);
  } catch {
    // Nothing was kept.
  }
}
