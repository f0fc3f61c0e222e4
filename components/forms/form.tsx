import { useId, type ReactNode } from 'react';
import { useFormState, type FieldValues } from 'react-hook-form';
import { StyleSheet, View } from 'react-native';

import { space } from '@/components/theme/tokens';
import { useLayout } from '@/components/theme/use-layout';
import { useTheme } from '@/components/theme/use-theme';
import { webStyle } from '@/components/theme/web-style';
import { Button } from '@/components/ui/button';

import { FormBody } from './form-body';
import { LeaveGuard } from './leave-guard';
import type { Saved } from './use-saving';

type FormProps<Input extends FieldValues, Output> = Saved<Input, Output> & {
  /** what the form is for: "Job", "Run R30" */
  label: string;
  /** the verb and its thing: "Save the place" */
  saveLabel: string;
  /** a way out without saving */
  onCancel?: () => void;
  /** further actions, beside saving; on a phone above it */
  actions?: ReactNode;
  children: ReactNode;
};

/** A form on a screen. It keeps what was typed when saving fails, and asks before that is thrown away. */
export function Form<Input extends FieldValues, Output>(props: FormProps<Input, Output>) {
  const { form, onSave, label, saveLabel, onCancel, actions, children } = props;
  const id = useId();
  const theme = useTheme();
  const { isPhone } = useLayout();
  const { isDirty, isSubmitting } = useFormState({ control: form.control });
  return (
    <>
      <FormBody id={id} label={label} form={form} onSave={onSave}>
        {children}
        {isPhone && actions ? <View style={styles.actions}>{actions}</View> : null}
        <View style={[styles.actions, styles.pinned, { backgroundColor: theme.paper, borderTopColor: theme.rule }]}>
          <Button label={saveLabel} busyLabel="Saving" tone="action" submit busy={isSubmitting} full={isPhone} />
          {onCancel ? <Button label="Cancel" onPress={onCancel} /> : null}
          {isPhone ? null : actions}
        </View>
      </FormBody>
      <LeaveGuard isUnsaved={isDirty && !isSubmitting} />
    </>
  );
}

const styles = StyleSheet.create({
  actions: { flexDirection: 'row', flexWrap: 'wrap', gap: space.xs, paddingTop: space.xs },
  pinned: webStyle({
    position: 'sticky',
    bottom: 0,
    paddingTop: space.sm,
    paddingBottom: space.sm,
    borderTopWidth: 1,
    borderTopStyle: 'solid',
  }),
});
