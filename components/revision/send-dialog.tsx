import { useState } from 'react';
import { useForm, useWatch } from 'react-hook-form';

import type { Contact } from '@/api/contracts/contact';
import type { Revision } from '@/api/contracts/revision';
import { sendInputSchema, type MailPreview, type SendInput } from '@/api/contracts/sending';
import { FormDialog } from '@/components/forms/form-dialog';
import { FormTextField } from '@/components/forms/form-text-field';
import { plainResolver } from '@/components/forms/plain-resolver';
import { problemOf } from '@/components/forms/show-problem';
import { Button } from '@/components/ui/button';
import { Notice } from '@/components/ui/notice';
import { useToast } from '@/components/ui/toast';

import { MailPreviewCard } from './mail-preview-card';
import { RecipientsField } from './recipients-field';

type SendDialogProps = {
  revision: Revision;
  contacts: readonly Contact[];
  defaults: Pick<SendInput, 'subject' | 'words'>;
  onPreview: (input: SendInput) => Promise<MailPreview>;
  onSend: (input: SendInput) => Promise<unknown>;
  onClose: () => void;
};

/** To whom, with which subject and covering words; how it reads can be seen before it goes. */
export function SendDialog({ revision, contacts, defaults, onPreview, onSend, onClose }: SendDialogProps) {
  const toast = useToast();
  const form = useForm<SendInput>({
    resolver: plainResolver(sendInputSchema),
    defaultValues: { ...defaults, contactIds: contacts.slice(0, 1).map(({ id }) => id) },
  });
  const [preview, setPreview] = useState<MailPreview>();
  const [failed, setFailed] = useState('');
  const already = repeated(revision, useWatch({ control: form.control, name: 'contactIds' }));
  const look = form.handleSubmit(async (input) => {
    setFailed('');
    await onPreview(input).then(setPreview, (error: unknown) => setFailed(problemOf(error)?.detail ?? 'No preview.'));
  });
  const send = async (input: SendInput) => {
    await onSend({ ...input, again: already.length > 0 });
    toast({ text: `Revision ${revision.letter} is on its way. You can leave; its state stands beside it.` });
    onClose();
  };
  return (
    <FormDialog
      title={`Send Revision ${revision.letter}`}
      saveLabel="Send"
      form={form}
      onSave={send}
      onClose={onClose}
      actions={<Button label="How it reads" onPress={() => void look()} />}
    >
      <RecipientsField form={form} contacts={contacts} />
      {already.length > 0 ? (
        <Notice title="Sent before">{`${already.join(', ')} had this revision already, and would get it once more.`}</Notice>
      ) : null}
      <FormTextField control={form.control} name="subject" label="Subject" />
      <FormTextField control={form.control} name="words" label="Covering words" multiline={7} optional />
      {failed ? (
        <Notice tone="fail" title="No preview">
          {failed}
        </Notice>
      ) : null}
      {preview ? <MailPreviewCard preview={preview} /> : null}
    </FormDialog>
  );
}

/** Who among the recipients has this revision, or is about to get it. */
const repeated = ({ messages }: Revision, contactIds: readonly string[]) =>
  messages
    .filter(({ contactId, state }) => contactIds.includes(contactId) && state !== 'refused' && state !== 'not-sent')
    .map(({ to }) => to.name)
    .filter((name, index, all) => all.indexOf(name) === index);
