/** `stem`, or `stem2`, `stem3`… : the first that `taken` does not hold. Deterministic, so tests and undo agree. */
export function newId(stem: string, taken: Iterable<string>): string {
  const used = new Set(taken);
  if (!used.has(stem)) return stem;
  for (let number = 2; ; number++) {
    const id = `${stem.slice(0, 34)}${number}`;
    if (!used.has(id)) return id;
  }
}

/** `Name`, or `Name 2`, `Name 3`…: a name for people that no other thing of the list bears. */
export function newName(stem: string, taken: Iterable<string>): string {
  const used = new Set(taken);
  if (!used.has(stem)) return stem;
  for (let number = 2; ; number++) {
    const name = `${stem} ${number}`;
    if (!used.has(name)) return name;
  }
}
