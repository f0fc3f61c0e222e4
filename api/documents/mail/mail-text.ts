import type { MailContent } from './takeoff-mail';

/** The plain form: everything that the other form says. */
export function mailText({ paragraphs, firm, issue, facts, link, fileName, caution, sender }: MailContent): string {
  const widest = Math.max(...facts.map(([name]) => name.length));
  const address = [firm.address || firm.town, firm.phone].filter((line) => line !== '');
  const parts = [
    ...paragraphs,
    [issue, ...facts.map(([name, value]) => `${`${name}:`.padEnd(widest + 1)} ${value}`)].join('\n'),
    `Open it on a phone or at a desk:\n${link}\nThis link is yours alone: whoever has it can read the takeoff.`,
    `Attached: ${fileName}`,
    caution,
    ['-- ', sender.name, firm.name, ...address, `Answers go to ${sender.email}`].join('\n'),
  ];
  return `${parts.filter((part) => part !== '').join('\n\n')}\n`;
}
