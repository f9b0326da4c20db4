const key = 'backmark-session';

/**
 * Whether this browser has signed somebody in and not out again. The cookies themselves cannot be read by a script;
 * without the hint a stranger's first request would be an error in the console.
 */
export const sessionHint = {
  isSet(): boolean {
    try {
      return localStorage.getItem(key) !== null;
    } catch {
      // A browser that keeps nothing is asked about its session every time.
      return true;
    }
  },
  set(): void {
    try {
      localStorage.setItem(key, 'begun');
    } catch {
      return;
    }
  },
  clear(): void {
    try {
      localStorage.removeItem(key);
    } catch {
      return;
    }
  },
};
