import { useRouter } from 'expo-router';
import { StyleSheet, View } from 'react-native';

import type { UnitSystem } from '@/api/contracts/quantities';
import type { Session } from '@/api/contracts/session';
import { space } from '@/components/theme/tokens';
import { Button } from '@/components/ui/button';
import { Segmented } from '@/components/ui/segmented';
import { Text } from '@/components/ui/text';
import { useToast } from '@/components/ui/toast';
import { RequestFailed } from '@/hooks/request';
import { useAppearance, type Appearance } from '@/hooks/use-appearance';
import { useSignOut } from '@/hooks/use-session';
import { useSwitchUnits } from '@/hooks/use-units';

const units: { value: UnitSystem; label: string; name: string }[] = [
  { value: 'SI', label: 'm °C', name: 'SI: metres, degrees Celsius' },
  { value: 'IP', label: 'ft °F', name: 'Inch-pound: feet, degrees Fahrenheit' },
];
const looks: { value: Appearance; label: string; name: string }[] = [
  { value: 'system', label: 'Auto', name: 'As the device' },
  { value: 'light', label: 'Light', name: 'Light' },
  { value: 'night', label: 'Night', name: 'Night' },
];

/** Who is signed in, how they read numbers, how this device shows them, and the way out. */
export function PersonPanel({ session }: { session: Session }) {
  const { member, firm } = session;
  const { appearance, pin } = useAppearance();
  const switchUnits = useSwitchUnits();
  const signOut = useSignOut();
  const toast = useToast();
  const router = useRouter();
  const say = (error: unknown) => {
    if (!(error instanceof RequestFailed)) throw error;
    toast({ text: error.message });
  };
  const leave = () => signOut().then(() => router.replace('/sign-in'), say);
  return (
    <View style={styles.panel}>
      <View>
        <Text weight="strong">{member.name}</Text>
        <Text size="small" tone="inkSoft">{`${roleWords[member.role]}, ${firm.name}`}</Text>
      </View>
      <Segmented
        label="Units"
        hideLabel
        value={member.units}
        segments={units}
        onChange={(next) => void switchUnits(next).catch(say)}
        fill
      />
      <Segmented label="Appearance" hideLabel value={appearance} segments={looks} onChange={pin} fill />
      <Button label="Sign out" tone="plain" onPress={() => void leave()} />
    </View>
  );
}

const roleWords = { owner: 'Owner', estimator: 'Estimator', foreman: 'Foreman' } as const;

const styles = StyleSheet.create({ panel: { gap: space.xs } });
