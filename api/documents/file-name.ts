/** A file's name that every mail program and disk takes: BLI-0417-Rev-A-takeoff-2026-12-01.pdf */
export function takeoffFileName({
  number,
  letter,
  date,
}: {
  number: string;
  letter: string | null;
  date: string;
}): string {
  const issue = letter === null ? 'DRAFT' : `Rev-${letter}`;
  return `${plain(number) || 'job'}-${issue}-takeoff-${date}.pdf`;
}

const plain = (text: string): string =>
  text
    .normalize('NFKD')
    .replace(/[^A-Za-z0-9]+/g, '-')
    .replace(/^-+|-+$/g, '')
    .slice(0, 40);
