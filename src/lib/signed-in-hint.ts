const key = 'ellwand.signed-in';

/**
 * Whether somebody signed in on this browser and has not signed out since. Only for what is shown before
 * the server has been asked: the server alone knows.
 */
export function signedInHint(): boolean {
  try {
    return localStorage.getItem(key) !== null;
  } catch {
    return false;
  }
}

/** Remembers, where the browser allows it, that somebody is signed in, or no longer is. */
export function hintSignedIn(signedIn: boolean): void {
  try {
    if (signedIn) localStorage.setItem(key, 'yes');
    else localStorage.removeItem(key);
  } catch {
    // Without storage the front page offers signing in, which leads on at once.
  }
}
