/** The last entry of each build that was opened in this browser, so that reading goes on where it stopped. */
const keyFor = (buildId: string) => `reading-place:${buildId}`;

export function keepPlace(buildId: string, entryId: string): void {
  try {
    localStorage.setItem(keyFor(buildId), entryId);
  } catch {
    // Storage is full or switched off: reading works without it.
  }
}

/** Id of the entry last opened; null when there is none or storage is switched off. */
export function placeKept(buildId: string): string | null {
  try {
    return localStorage.getItem(keyFor(buildId));
  } catch {
    return null;
  }
}
