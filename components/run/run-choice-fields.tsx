import { FormSegmented } from '@/components/forms/form-segmented';

import type { RunFormFields } from './run-entry-field';

const orientations = [
  { value: 'horizontal', label: 'Horizontal' },
  { value: 'vertical', label: 'Vertical' },
];
const ends = [
  { value: 'flat', label: 'Flat' },
  { value: 'domed', label: 'Domed' },
  { value: 'none', label: 'None' },
];

export const RunOrientationField = ({ form }: { form: RunFormFields }) => (
  <FormSegmented control={form.control} name="shape.orientation" label="Lies" segments={orientations} />
);

export const RunEndsField = ({ form }: { form: RunFormFields }) => (
  <FormSegmented control={form.control} name="shape.ends" label="Ends" segments={ends} />
);
