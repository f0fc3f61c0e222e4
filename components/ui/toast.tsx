import { createContext, useContext, useEffect, useState, type ReactNode } from 'react';
import { StyleSheet, View } from 'react-native';

import { radius, space } from '@/components/theme/tokens';
import { useTheme } from '@/components/theme/use-theme';
import { webStyle } from '@/components/theme/web-style';

import { Button } from './button';
import { Text } from './text';

/** What has just happened, and the way back where there is one. */
export type Toast = { text: string; action?: { label: string; onPress: () => void } };
type Shown = Toast & { key: number };

const ToastContext = createContext<(toast: Toast) => void>(() => undefined);

/** Returns a function that says in passing what has happened. Failures are not said in passing: they stay where they belong. */
export const useToast = () => useContext(ToastContext);

const seconds = { plain: 6, withAction: 12 };

export function ToastProvider({ children }: { children: ReactNode }) {
  const [shown, setShown] = useState<Shown>();
  const show = (toast: Toast) => setShown((before) => ({ ...toast, key: (before?.key ?? 0) + 1 }));
  return (
    <ToastContext value={show}>
      {children}
      {/* always there, so that a screen reader hears what comes into it */}
      <View role="status" aria-live="polite" style={styles.place}>
        {shown ? <ToastLine key={shown.key} toast={shown} onGone={() => setShown(undefined)} /> : null}
      </View>
    </ToastContext>
  );
}

function ToastLine({ toast, onGone }: { toast: Toast; onGone: () => void }) {
  const theme = useTheme();
  const [held, setHeld] = useState(false);
  const wait = toast.action ? seconds.withAction : seconds.plain;
  useEffect(() => {
    if (held) return undefined;
    const timer = setTimeout(onGone, wait * 1000);
    return () => clearTimeout(timer);
  }, [held, onGone, wait]);
  const act = () => {
    toast.action?.onPress();
    onGone();
  };
  return (
    <View
      onPointerEnter={() => setHeld(true)}
      onPointerLeave={() => setHeld(false)}
      onFocus={() => setHeld(true)}
      onBlur={() => setHeld(false)}
      style={[styles.toast, { backgroundColor: theme.sheet, borderColor: theme.ink }]}
    >
      <View style={styles.words}>
        <Text>{toast.text}</Text>
      </View>
      {toast.action ? <Button label={toast.action.label} onPress={act} /> : null}
      <Button label="Close" onPress={onGone} />
    </View>
  );
}

const styles = StyleSheet.create({
  place: webStyle({
    position: 'fixed',
    left: 0,
    right: 0,
    bottom: 'calc(72px + env(safe-area-inset-bottom))',
    alignItems: 'center',
    paddingLeft: space.md,
    paddingRight: space.md,
    pointerEvents: 'none',
    zIndex: 10,
  }),
  toast: webStyle({
    flexDirection: 'row',
    alignItems: 'center',
    gap: space.xs,
    maxWidth: 560,
    paddingLeft: space.md,
    paddingRight: space.xs,
    paddingTop: space.xs,
    paddingBottom: space.xs,
    borderWidth: 1,
    borderRadius: radius.md,
    pointerEvents: 'auto',
  }),
  words: { flexShrink: 1, flexGrow: 1 },
});
