import type { ContactInput } from '@/api/contracts/contact';
import type { FirmInput, MemberInput } from '@/api/contracts/session';

// Invented: firm, people, places and addresses. Mail to .example is never delivered.

export const demoFirm: FirmInput = {
  name: 'Brackwater Lagging and Insulation',
  town: 'Port Harrowmere (fictional)',
  address: '',
  email: 'records@brackwater.example',
  phone: '',
  currency: 'EUR',
  locale: 'en-IE',
  paper: 'A4',
  timeZone: 'Europe/Dublin',
  units: 'SI',
  quotePrefix: 'BLI',
  quoteValidDays: 45,
  recordAddress: 'records@brackwater.example',
};

type Person = Omit<MemberInput, 'password'>;

export const demoOwner: Person = {
  name: 'Hanneke Vossidrow',
  email: 'hanneke.vossidrow@brackwater.example',
  role: 'owner',
  maySend: true,
  seesMargin: true,
};
/** Prepares and sends the first job. */
export const demoEstimator: Person = {
  name: 'Tamsin Orrowby',
  email: 'tamsin.orrowby@brackwater.example',
  role: 'estimator',
  maySend: true,
  seesMargin: true,
};
export const demoPeople: Person[] = [
  demoOwner,
  demoEstimator,
  {
    name: 'Jorun Maplecoate',
    email: 'jorun.maplecoate@brackwater.example',
    role: 'estimator',
    maySend: false,
    seesMargin: false,
  },
  {
    name: 'Dov Kessrick',
    email: 'dov.kessrick@brackwater.example',
    role: 'foreman',
    maySend: false,
    seesMargin: false,
  },
];

export const demoContacts = {
  marisel: {
    name: 'Marisel Quonder',
    company: 'Quonder Mechanical (fictional)',
    email: 'marisel@quonder.example',
    role: 'Mechanical contractor, project manager',
  },
  oskar: {
    name: 'Oskar Thibbel',
    company: 'St Ellowyn Cottage Hospital (fictional)',
    email: 'oskar.thibbel@ellowyn.example',
    role: 'Facility manager',
  },
  ivo: {
    name: 'Ivo Pellandrine',
    company: 'Pellandrine and Sorce, consulting engineers (fictional)',
    email: 'ivo@pellandrine-sorce.example',
    role: 'Engineer',
  },
  brisa: {
    name: 'Brisa Tollemark',
    company: 'Harrowmere Baths Trust (fictional)',
    email: 'brisa.tollemark@harrowmere-baths.example',
    role: 'Building manager',
  },
} as const satisfies Record<string, ContactInput>;
