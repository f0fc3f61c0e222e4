import type { KeyboardEvent, ReactNode } from 'react';
import type { FieldValues } from 'react-hook-form';
import { StyleSheet } from 'react-native';

import { space } from '@/components/theme/tokens';
import { webStyle } from '@/components/theme/web-style';
import { Element } from '@/components/ui/element';

import { FormProblem } from './form-problem';
import { useSaving, type Saved } from './use-saving';

type FormBodyProps<Input extends FieldValues, Output> = Saved<Input, Output> & {
  id: string;
  /** what the form is for, for those who jump from form to form */
  label: string;
  children: ReactNode;
};

/** The form itself: Enter and Ctrl+Enter save; the problem with the whole stands at its head. */
export function FormBody<Input extends FieldValues, Output>(props: FormBodyProps<Input, Output>) {
  const { id, label, form, onSave, children } = props;
  const save = useSaving({ form, onSave });
  const saveByKey = (event: KeyboardEvent<HTMLFormElement>) => {
    if (event.key !== 'Enter' || !(event.ctrlKey || event.metaKey)) return;
    event.preventDefault();
    event.currentTarget.requestSubmit();
  };
  return (
    <Element
      tag="form"
      id={id}
      aria-label={label}
      noValidate
      onSubmit={(event) => {
        // a dialog's form is a child of the one around it, though not in the page
        event.stopPropagation();
        void save(event);
      }}
      onKeyDown={saveByKey}
      style={styles.form}
    >
      <FormProblem control={form.control} />
      {children}
    </Element>
  );
}

const styles = StyleSheet.create({
  form: webStyle({ display: 'flex', flexDirection: 'column', gap: space.md, margin: 0, minWidth: 0 }),
});
