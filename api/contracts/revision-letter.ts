/** 1 is A, 26 is Z, 27 is AA: the letters of a drawing's revisions. */
export function revisionLetter(ordinal: number): string {
  const last = String.fromCharCode(65 + ((ordinal - 1) % 26));
  return ordinal > 26 ? revisionLetter(Math.floor((ordinal - 1) / 26)) + last : last;
}
