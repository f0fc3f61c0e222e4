import type { Session } from '@/api/contracts/session';

/** Who is signed in, in tests of the client. */
export const session: Session = {
  member: {
    accountId: '7d5b3c1e-0a58-4d2f-9c5e-1f6f2a3b4c01',
    name: 'Ines Varga',
    email: 'ines@brackwater.example',
    role: 'estimator',
    maySend: true,
    seesMargin: false,
    units: 'SI',
  },
  firm: {
    id: '7d5b3c1e-0a58-4d2f-9c5e-1f6f2a3b4c02',
    name: 'Brackwater Lagging',
    town: 'Port Harrowmere',
    currency: 'EUR',
    locale: 'en-IE',
    paper: 'A4',
    timeZone: 'Europe/Dublin',
  },
};
