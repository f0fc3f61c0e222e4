import { useId, useState, type ReactNode } from 'react';
import { useFormState, type FieldValues } from 'react-hook-form';

import { Button } from '@/components/ui/button';
import { Dialog, type DialogProps } from '@/components/ui/dialog';

import { FormBody } from './form-body';
import { DiscardDialog, LeaveGuard } from './leave-guard';
import type { Saved } from './use-saving';

type FormDialogProps<Input extends FieldValues, Output> = Saved<Input, Output> & {
  title: string;
  saveLabel: string;
  onClose: () => void;
  width?: DialogProps['width'];
  /** further actions, at the left of the foot: "Remove" */
  actions?: ReactNode;
  children: ReactNode;
};

/** A form over the screen; closing it with changes in it asks first. Whoever renders it closes it when saving went well. */
export function FormDialog<Input extends FieldValues, Output>(props: FormDialogProps<Input, Output>) {
  const { form, onSave, title, saveLabel, onClose, width = 'wide', actions, children } = props;
  const id = useId();
  const [asking, setAsking] = useState(false);
  const { isDirty, isSubmitting } = useFormState({ control: form.control });
  const close = () => (isDirty ? setAsking(true) : onClose());
  return (
    <Dialog
      title={title}
      width={width}
      onClose={close}
      footer={
        <>
          {actions}
          <Button label={saveLabel} busyLabel="Saving" tone="action" submit formId={id} busy={isSubmitting} />
        </>
      }
    >
      <FormBody id={id} label={title} form={form} onSave={onSave}>
        {children}
      </FormBody>
      {asking ? <DiscardDialog onKeep={() => setAsking(false)} onDiscard={onClose} /> : null}
      <LeaveGuard isUnsaved={isDirty && !isSubmitting} />
    </Dialog>
  );
}
