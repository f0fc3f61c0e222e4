import type { UseFormReturn } from 'react-hook-form';

import { useBound } from '@/components/forms/bound';
import { Select } from '@/components/ui/select';
import { Grid } from '@/components/ui/stack';

import type { CoveringDraft } from './covering-draft';
import { dnText, type CoveringNames } from './covering-words';

type BandFieldsProps = Pick<UseFormReturn<CoveringDraft>, 'control'> & { names: CoveringNames };

/** From which size to which; open at either end. */
export const BandFields = ({ control, names }: BandFieldsProps) => (
  <Grid column={150} gap="sm">
    <DnField control={control} name="fromDn" label="From size" open="The smallest" names={names} />
    <DnField control={control} name="toDn" label="To size" open="The largest" names={names} />
  </Grid>
);

type DnFieldProps = BandFieldsProps & { name: 'fromDn' | 'toDn'; label: string; open: string };
const openEnd = 'open';

function DnField({ control, name, label, open, names }: DnFieldProps) {
  const { ref, value, change, leave, problem } = useBound({ control, name });
  const known = names.sizes.map(({ dn }) => dn);
  // a size that no table has is kept as it was entered
  const dns = value === null || known.includes(value) ? known : [...known, value].sort((a, b) => a - b);
  const options = dns.map((dn) => ({ value: String(dn), label: bothNames(dn, names) }));
  return (
    <Select
      ref={ref}
      label={label}
      options={[{ value: openEnd, label: open }, ...options]}
      value={value === null ? openEnd : String(value)}
      onChange={(chosen) => change(chosen === openEnd ? null : Number(chosen))}
      onBlur={leave}
      problem={problem}
    />
  );
}

/** "DN 40, NPS 1-1/2": the trade says either. */
function bothNames(dn: number, { units, sizes }: CoveringNames): string {
  const nominal = sizes.find((size) => size.dn === dn)?.nominal;
  const parts = units === 'SI' ? [`DN ${dn}`, nominal] : [nominal, `DN ${dn}`];
  return nominal ? parts.join(', ') : dnText(dn, { units, sizes });
}
