import type { Snapshot } from '@/api/contracts/revision';
import type { Flow } from '@/api/documents/press/flow';
import type { Locale } from '@/api/documents/locale';

import type { Clarification } from './clarifications';
import type { PrintedKind } from './printed-quantities';

/** What each part of the takeoff prints from, and where it prints. */
export type Sheet = {
  flow: Flow;
  snapshot: Snapshot;
  locale: Locale;
  clarifications: Clarification[];
  quantities: PrintedKind[];
};
