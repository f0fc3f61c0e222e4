import type { MailContent } from './takeoff-mail';

const ink = '#1B242D';
const soft = '#54606B';
const rule = '#D8D2C6';
const oxide = '#9E3A1C';
const type = "font-family:'Source Sans 3','Segoe UI',Helvetica,Arial,sans-serif";

/** The laid-out form: tables and inline styles, nothing from elsewhere, readable with images off. */
export function mailHtml(content: MailContent): string {
  const { subject, firm, issue } = content;
  return [
    '<!doctype html>',
    '<html lang="en"><head><meta charset="utf-8">',
    '<meta name="viewport" content="width=device-width, initial-scale=1">',
    `<title>${escaped(subject)}</title></head>`,
    `<body style="margin:0;padding:0;background:#F6F3EC;color:${ink}">`,
    `<table role="presentation" width="100%" cellpadding="0" cellspacing="0" style="background:#F6F3EC"><tr><td align="center" style="padding:24px 12px">`,
    `<table role="presentation" width="100%" cellpadding="0" cellspacing="0" style="max-width:600px;background:#FFFFFF;border:1px solid ${rule};border-radius:10px;${type};font-size:16px;line-height:24px;color:${ink}">`,
    head(firm.name, issue),
    cell(content.paragraphs.map(paragraph).join(''), '8px 28px 4px'),
    cell(facts(content), '4px 28px 8px'),
    cell(action(content), '8px 28px 20px'),
    cell(foot(content), `16px 28px 24px;border-top:1px solid ${rule}`),
    '</table></td></tr></table></body></html>',
    '',
  ].join('\n');
}

const cell = (inner: string, padding: string) => `<tr><td style="padding:${padding}">${inner}</td></tr>`;

const head = (name: string, issue: string) =>
  cell(
    `<table role="presentation" width="100%" cellpadding="0" cellspacing="0"><tr>` +
      `<td style="font-size:17px;font-weight:700;color:${ink}">${escaped(name)}</td>` +
      `<td align="right" style="font-size:14px;font-weight:600;color:${ink};white-space:nowrap">${escaped(issue)}</td>` +
      '</tr></table>',
    `20px 28px 14px;border-bottom:2px solid ${oxide}`,
  );

const paragraph = (words: string) => `<p style="margin:12px 0">${escaped(words).replace(/\n/g, '<br>')}</p>`;

function facts({ facts: rows }: MailContent): string {
  const row = ([name, value]: MailContent['facts'][number]) =>
    `<tr><th align="left" valign="top" style="padding:6px 16px 6px 0;font-weight:400;color:${soft};white-space:nowrap">${escaped(name)}</th>` +
    `<td valign="top" style="padding:6px 0">${escaped(value)}</td></tr>`;
  return `<table cellpadding="0" cellspacing="0" style="font-size:15px;line-height:22px">${rows.map(row).join('')}</table>`;
}

const action = ({ link, fileName }: MailContent) =>
  `<table role="presentation" cellpadding="0" cellspacing="0"><tr><td style="background:${oxide};border-radius:4px">` +
  `<a href="${escaped(link)}" style="display:inline-block;padding:12px 24px;color:#FFFFFF;font-weight:600;text-decoration:none">Open the takeoff</a>` +
  `</td></tr></table>` +
  `<p style="margin:12px 0 0;font-size:14px;line-height:20px;color:${soft}">This link is yours alone: whoever has it can read the takeoff. ` +
  `The same document is attached: ${escaped(fileName)}</p>`;

function foot({ caution, sender, firm }: MailContent): string {
  const lines = [sender.name, firm.name, firm.address || firm.town, firm.phone].filter((line) => line !== '');
  const small = `margin:0 0 12px;font-size:14px;line-height:20px;color:${soft}`;
  return (
    `<p style="${small}">${escaped(caution)}</p>` +
    `<p style="${small}">${lines.map(escaped).join('<br>')}<br>Answers go to ${escaped(sender.email)}</p>`
  );
}

const signs: Record<string, string> = { '&': '&amp;', '<': '&lt;', '>': '&gt;', '"': '&quot;', "'": '&#39;' };
/** Text as text, whatever was typed into a name. */
export const escaped = (text: string): string => text.replace(/[&<>"']/g, (sign) => signs[sign] ?? sign);
