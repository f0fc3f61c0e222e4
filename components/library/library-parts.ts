import type { Href } from 'expo-router';

export type LibraryPart = { title: string; text: string; href: Href };

/** What the library holds, in the order in which a job asks for it. */
export const libraryParts: readonly LibraryPart[] = [
  {
    title: 'Materials',
    text: 'What they are, between which temperatures they are used, and how well they insulate at each.',
    href: '/library/materials',
  },
  {
    title: 'Made thicknesses',
    text: 'Which thicknesses each material can be bought in.',
    href: '/library/thicknesses',
  },
  { title: 'Finishes', text: 'Jackets and facings, with their emittance as new and aged.', href: '/library/finishes' },
  {
    title: 'Pipes and tubes',
    text: 'Nominal sizes with their outside diameters and walls.',
    href: '/library/pipes',
  },
  {
    title: 'Energy codes',
    text: 'The tables as entered, with their exemptions; verify them against the adopted edition.',
    href: '/library/codes',
  },
  {
    title: 'Touch temperatures',
    text: 'Where a touch limit may begin, and the thresholds behind it.',
    href: '/library/touch',
  },
];
