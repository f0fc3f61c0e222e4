import type { Control } from 'react-hook-form';

import type { ContactInput } from '@/api/contracts/contact';
import { FormTextField } from '@/components/forms/form-text-field';
import { Grid } from '@/components/ui/stack';

export const blankContact: ContactInput = { name: '', company: '', email: '', role: '' };

/** Who a revision is sent to. */
export const ContactFields = ({ control }: { control: Control<ContactInput> }) => (
  <Grid column={240}>
    <FormTextField control={control} name="name" label="Name" autoComplete="off" />
    <FormTextField control={control} name="email" label="E-mail" kind="email" inputMode="email" autoComplete="off" />
    <FormTextField control={control} name="company" label="Company" optional autoComplete="off" />
    <FormTextField control={control} name="role" label="What they do" optional autoComplete="off" />
  </Grid>
);
