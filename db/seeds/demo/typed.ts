import { readQuantity, type Quantity, type QuantityKind } from '@/api/contracts/quantities';

/** A quantity as a person types it into a field: the value counts, the words are kept. */
export function typed(kind: QuantityKind, text: string): Quantity {
  const reading = readQuantity(kind, text, 'SI');
  if ('problem' in reading) throw new Error(`${text}: ${reading.problem}`);
  return reading.quantity;
}

export const metres = (text: string) => typed('length', `${text} m`);
export const millimetres = (text: string) => typed('dimension', `${text} mm`);
export const celsius = (value: number) => typed('temperature', `${value} °C`);
