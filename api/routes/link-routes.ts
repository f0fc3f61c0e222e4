import { Router, type Request } from 'express';

import type { LinkService, Visitor } from '@/api/services/link-service';

import { open } from './middleware/access';
import { limitByAddress } from './middleware/limit';
import { sendPdf } from './middleware/send-pdf';
import { unlisted } from './middleware/unlisted';

/** What a client's private link reads. A token of any form is looked up, so that every wrong one is answered alike. */
export function linkRoutes(linkService: LinkService): Router {
  const router = Router();
  const guards = [
    unlisted,
    open('a client has no account: whoever has the token may read what was sent'),
    limitByAddress({ tries: 120, minutes: 1, counts: 'all' }),
    limitByAddress({ tries: 40, minutes: 15 }),
  ];
  router.get('/links/:token', ...guards, async (request, response) => {
    response.json(await linkService.open(tokenOf(request), visitorOf(request)));
  });
  router.get('/links/:token/pdf', ...guards, async (request, response) => {
    sendPdf(response, await linkService.pdf(tokenOf(request), visitorOf(request)), 'attachment');
  });
  return router;
}

const tokenOf = ({ params }: Request): string => String(params.token).slice(0, 200);

const visitorOf = (request: Request): Visitor => ({
  address: networkOf(request.ip ?? ''),
  agent: familyOf(request.get('user-agent') ?? ''),
});

/** The network, not the machine: the last part of an address is not kept. */
export function networkOf(address: string): string {
  const plain = address.replace(/^::ffff:/i, '');
  if (/^\d{1,3}(\.\d{1,3}){3}$/.test(plain)) return plain.replace(/\.\d+$/, '.0');
  return plain.includes(':') ? `${plain.split(':').slice(0, 3).join(':')}::`.slice(0, 45) : '';
}

const families: [pattern: RegExp, family: string][] = [
  [/bot|crawl|spider|preview|scan/i, 'robot'],
  [/Edg/, 'Edge'],
  [/Firefox|FxiOS/, 'Firefox'],
  [/Chrome|CriOS/, 'Chrome'],
  [/Safari/, 'Safari'],
];
export const familyOf = (agent: string): string => families.find(([pattern]) => pattern.test(agent))?.[1] ?? 'other';
