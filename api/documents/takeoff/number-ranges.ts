/** Run numbers as a person lists them: `R01 to R04, R07`; three or more that follow each other are a range. */
export function numberRanges(numbers: readonly string[]): string {
  const groups: string[][] = [];
  for (const number of numbers) {
    const group = groups.at(-1);
    if (group && follows(group.at(-1) ?? '', number)) group.push(number);
    else groups.push([number]);
  }
  return groups.map((group) => (group.length > 2 ? `${group[0]} to ${group.at(-1)}` : group.join(', '))).join(', ');
}

const counted = /^(.*?)(\d{1,9})$/;

function follows(before: string, number: string): boolean {
  const [, prefix, digits = ''] = counted.exec(before) ?? [];
  const [, otherPrefix, otherDigits = ''] = counted.exec(number) ?? [];
  if (prefix === undefined || prefix !== otherPrefix || Number(otherDigits) !== Number(digits) + 1) return false;
  return digits.length === otherDigits.length || !digits.startsWith('0');
}
