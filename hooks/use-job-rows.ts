import useSWR, { useSWRConfig } from 'swr';
import { z } from 'zod';

import type { rowSchema } from '@/api/contracts/text';
import { request, type RequestFailed } from '@/hooks/request';

type Row = z.infer<typeof rowSchema>;
/** One noun's rows: where they are read and written, and what each looks like. */
export type Rows<Shape extends Row> = { path: string; schema: z.ZodType<Shape> };

export function useRows<Shape extends Row>({ path, schema }: Rows<Shape>) {
  const { data, error, mutate } = useSWR<Shape[], RequestFailed>(path, (at: string) => request(at, schema.array()));
  return { rows: data, problem: error?.problem, reload: () => void mutate() };
}

/** What can be done with rows; the list shows each write at once, and all that follows from it is read again. */
export function useRowActions<Input, Shape extends Row & Input>({ path, schema }: Rows<Shape>, follows: string) {
  const { mutate } = useSWRConfig();
  const shown = async (change: (rows: Shape[]) => Shape[]) => {
    await mutate<Shape[]>(path, (rows) => rows && change(rows), { revalidate: false });
    void mutate((key) => typeof key === 'string' && key.startsWith(follows));
  };
  return {
    async create(input: Input): Promise<Shape> {
      const row = await request(path, schema, { method: 'POST', body: input });
      await shown((rows) => [...rows, row]);
      return row;
    },
    /** `seen` is the row that the edit began from: when it is no longer the newest, the answer is a problem with that one. */
    async change(seen: Row, input: Input): Promise<Shape> {
      const body = { ...input, version: seen.version };
      const row = await request(`${path}/${seen.id}`, schema, { method: 'PATCH', body });
      await shown((rows) => rows.map((other) => (other.id === row.id ? row : other)));
      return row;
    },
    async remove(seen: Row): Promise<void> {
      await request(`${path}/${seen.id}?version=${seen.version}`, z.undefined(), { method: 'DELETE' });
      await shown((rows) => rows.filter(({ id }) => id !== seen.id));
    },
  };
}
export type RowActions<Input, Shape extends Row & Input> = ReturnType<typeof useRowActions<Input, Shape>>;
