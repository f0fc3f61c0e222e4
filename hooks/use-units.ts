import { useSWRConfig } from 'swr';

import { show, showWithUnit, unitLabel, type QuantityKind, type UnitSystem } from '@/api/contracts/quantities';
import { sessionSchema, type Session } from '@/api/contracts/session';
import { request, sessionPath } from '@/hooks/request';
import { useSession } from '@/hooks/use-session';

/** The person's units, and how numbers read in them. Outside of a session: SI. */
export function useUnits() {
  const { session } = useSession();
  const units: UnitSystem = session?.member.units ?? 'SI';
  return {
    units,
    /** the number alone, for a column that has its unit in the head */
    show: (kind: QuantityKind, value: number, digits?: number) => show(kind, value, { units, digits }),
    showWithUnit: (kind: QuantityKind, value: number, digits?: number) => showWithUnit(kind, value, { units, digits }),
    unitLabel: (kind: QuantityKind) => unitLabel(kind, units),
  };
}

/** Returns a function that switches the person's units: at once on the screen, then on the server. @throws RequestFailed after switching back */
export function useSwitchUnits() {
  const { mutate } = useSWRConfig();
  const { session: before } = useSession();
  return async (units: UnitSystem): Promise<void> => {
    const switched = (session?: Session) => session && { ...session, member: { ...session.member, units } };
    await mutate<Session>(sessionPath, switched, { revalidate: false });
    try {
      const saved = await request(sessionPath, sessionSchema, { method: 'PATCH', body: { units } });
      await mutate<Session>(sessionPath, saved, { revalidate: false });
    } catch (error) {
      await mutate(sessionPath, before, { revalidate: false });
      throw error;
    }
  };
}
