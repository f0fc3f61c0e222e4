import type { Response } from 'express';

export type PdfFile = { fileName: string; bytes: Buffer; hash: string };

/** Answers with a document's bytes; its hash is its ETag, so that one that was read is not sent again. */
export function sendPdf(response: Response, { fileName, bytes, hash }: PdfFile, shown: 'inline' | 'attachment'): void {
  response.setHeader('Content-Disposition', `${shown}; filename="${fileName}"`);
  response.setHeader('ETag', `"${hash}"`);
  response.type('application/pdf').send(bytes);
}
