/** The first statement of a sentence and what it goes on with: "38 mm is not enough." / " It would reach 63.0 °C…". */
export function leadAndRest(text: string): [lead: string, rest: string] {
  const end = /(\.(?=\s|$)|;\s|:\s)/.exec(text);
  if (!end) return [text, ''];
  const at = end.index + (end[0] === '.' ? 1 : 0);
  return [text.slice(0, at), text.slice(at)];
}
