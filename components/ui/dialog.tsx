import { useId, useLayoutEffect, useRef, type KeyboardEvent, type ReactNode } from 'react';
import { StyleSheet, View } from 'react-native';

import { hairline, radius, space } from '@/components/theme/tokens';
import { useLayout } from '@/components/theme/use-layout';
import { useTheme } from '@/components/theme/use-theme';
import { webStyle } from '@/components/theme/web-style';

import { Button } from './button';
import { Element } from './element';
import { Heading } from './heading';

export type DialogProps = {
  title: string;
  /** Escape, the close button, a phone's back gesture */
  onClose: () => void;
  children: ReactNode;
  /** the actions, always in sight below what scrolls */
  footer?: ReactNode;
  /** narrow for a question, wide for a form, full for a table */
  width?: 'narrow' | 'wide' | 'full';
  /** a question that must be answered has no close button */
  question?: boolean;
};

const widths = { narrow: 440, wide: 640, full: 1040 };

/** Over everything, as long as it is rendered: what is behind cannot be reached; on a phone it rises from the bottom. */
export function Dialog({ title, onClose, children, footer, width = 'narrow', question = false }: DialogProps) {
  const theme = useTheme();
  const { isPhone } = useLayout();
  const id = useId();
  const dialog = useRef<HTMLDialogElement>(null);
  useLayoutEffect(() => openModal(dialog.current), []);
  const closeOnEscape = (event: KeyboardEvent) => {
    if (event.key !== 'Escape') return;
    event.preventDefault();
    event.stopPropagation();
    onClose();
  };
  const colours = { backgroundColor: theme.sheet, borderColor: theme.rule, color: theme.ink };
  return (
    <Element
      tag="dialog"
      ref={dialog}
      role={question ? 'alertdialog' : undefined}
      aria-labelledby={id}
      onKeyDown={closeOnEscape}
      onCancel={(event) => {
        event.preventDefault();
        onClose();
      }}
      style={[styles.dialog, colours, isPhone ? styles.sheet : [styles.centre, { maxWidth: widths[width] }]]}
    >
      <View style={styles.inside}>
        <View style={styles.head}>
          <View style={styles.title}>
            <Heading id={id}>{title}</Heading>
          </View>
          {question ? null : <Button label="Close" onPress={onClose} />}
        </View>
        <View style={styles.body}>{children}</View>
        {footer ? <Foot>{footer}</Foot> : null}
      </View>
    </Element>
  );
}

function Foot({ children }: { children: ReactNode }) {
  const theme = useTheme();
  return (
    <Element tag="footer" role="none" style={[styles.footer, { borderTopColor: theme.rule }]}>
      {children}
    </Element>
  );
}

/** Opens over everything and takes the focus; closing gives it back to where it was. */
function openModal(dialog: HTMLDialogElement | null): (() => void) | undefined {
  if (!dialog) return undefined;
  const before = document.activeElement;
  // A test's document knows the element but not how to open it.
  if (typeof dialog.showModal === 'function') dialog.showModal();
  else dialog.setAttribute('open', '');
  firstStop(dialog)?.focus();
  return () => {
    if (typeof dialog.close === 'function') dialog.close();
    if (before instanceof HTMLElement && before.isConnected) before.focus();
  };
}

/** What is to be filled in first; else the first action of the foot, which never is the dangerous one. */
const firstStop = (dialog: HTMLDialogElement) =>
  dialog.querySelector<HTMLElement>('input, select, textarea') ??
  dialog.querySelector<HTMLElement>('footer button') ??
  dialog.querySelector<HTMLElement>('button, a');

const styles = StyleSheet.create({
  dialog: webStyle({
    boxSizing: 'border-box',
    padding: 0,
    borderWidth: hairline,
    borderStyle: 'solid',
    overflow: 'hidden',
    width: '100%',
  }),
  centre: webStyle({
    width: 'calc(100% - 48px)',
    maxHeight: 'min(85dvh, 900px)',
    borderRadius: radius.md,
    margin: 'auto',
  }),
  sheet: webStyle({
    marginTop: 'auto',
    marginBottom: 0,
    maxWidth: '100%',
    maxHeight: '92dvh',
    borderTopLeftRadius: radius.md,
    borderTopRightRadius: radius.md,
    paddingBottom: 'env(safe-area-inset-bottom)',
  }),
  inside: webStyle({ display: 'flex', flexDirection: 'column', maxHeight: 'inherit' }),
  head: {
    flexDirection: 'row',
    alignItems: 'center',
    gap: space.sm,
    paddingHorizontal: space.lg,
    paddingTop: space.md,
    paddingBottom: space.xs,
  },
  title: { flex: 1 },
  body: webStyle({
    overflowY: 'auto',
    paddingLeft: space.lg,
    paddingRight: space.lg,
    paddingBottom: space.lg,
    gap: space.md,
  }),
  footer: webStyle({
    display: 'flex',
    flexDirection: 'row',
    flexWrap: 'wrap',
    justifyContent: 'flex-end',
    flexShrink: 0,
    gap: space.xs,
    paddingTop: space.sm,
    paddingBottom: space.sm,
    paddingLeft: space.lg,
    paddingRight: space.lg,
    borderTopWidth: hairline,
    borderTopStyle: 'solid',
  }),
});
