import { createContext, useContext, type ReactNode } from 'react';

import type { UnitSystem } from '@/api/contracts/quantities';

const FieldUnits = createContext<UnitSystem>('SI');

/** The units in which quantity fields below it are read and shown: the person's. */
export const FieldUnitsProvider = ({ units, children }: { units: UnitSystem; children: ReactNode }) => (
  <FieldUnits value={units}>{children}</FieldUnits>
);

export const useFieldUnits = (): UnitSystem => useContext(FieldUnits);
