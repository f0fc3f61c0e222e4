import type { Quantity } from '@/api/contracts/quantities';

type Typed = NonNullable<Quantity['typed']>;

/** A quantity from its two columns: the value, and what was typed for it. */
export const toQuantity = (value: number, typed: Typed | null): Quantity => (typed ? { value, typed } : { value });

export const toQuantityOrNull = (value: number | null, typed: Typed | null): Quantity | null =>
  value === null ? null : toQuantity(value, typed);

/** The column beside the value, as json. */
export const typedOf = (quantity: Quantity | null): string | null =>
  quantity?.typed ? JSON.stringify(quantity.typed) : null;
export type TypedColumn = Typed | null;
