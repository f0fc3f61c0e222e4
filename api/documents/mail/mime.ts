import MailComposer from 'nodemailer/lib/mail-composer';

import type { MailPreview } from '@/api/contracts/sending';

export type Letter = {
  from: { name: string; address: string };
  to: { name: string; address: string };
  replyTo: { name: string; address: string };
  mail: MailPreview;
  attachment: { fileName: string; bytes: Buffer };
  messageId: string;
  date: Date;
};

/** The exact bytes of a mail, as they are stored and sent. */
export function composeMime({ from, to, replyTo, mail, attachment, messageId, date }: Letter): Promise<Buffer> {
  const composer = new MailComposer({
    from: oneLine(from),
    to: oneLine(to),
    replyTo: oneLine(replyTo),
    subject: inOneLine(mail.subject),
    text: mail.text,
    html: mail.html,
    messageId,
    date,
    attachments: [{ filename: attachment.fileName, content: attachment.bytes, contentType: 'application/pdf' }],
    disableFileAccess: true,
    disableUrlAccess: true,
    newline: '\r\n',
  });
  return composer.compile().build();
}

type Address = { name: string; address: string };
const oneLine = ({ name, address }: Address): Address => ({ name: inOneLine(name), address: inOneLine(address) });
// the contracts let no line break through; a header must not depend on that alone
const inOneLine = (text: string) => text.replace(/[\p{Cc}\p{Zl}\p{Zp}]+/gu, ' ').trim();
