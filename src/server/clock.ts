let read: () => number = Date.now;

/** Now, UTC milliseconds. */
export function now(): number {
  return read();
}

/** Tests and tools set their own time; no argument gives the machine's back. */
export function setClock(clock?: () => number): void {
  read = clock ?? Date.now;
}
