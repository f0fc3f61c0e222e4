import type { Express } from 'express';
import { z } from 'zod';

const ruleSchema = z.union([z.object({ permission: z.string() }), z.object({ open: z.string() })]);
const handlerSchema = z.custom<{ rule?: unknown }>((value) => typeof value === 'function');
const layerSchema: z.ZodType<Layer> = z.lazy(() =>
  z.object({
    route: z
      .object({ path: z.string(), stack: z.array(z.object({ handle: handlerSchema, method: z.string() })) })
      .optional(),
    handle: z.custom<{ stack?: unknown }>((value) => typeof value === 'function'),
  }),
);
type Layer = {
  route?: { path: string; stack: { handle: { rule?: unknown }; method: string }[] };
  handle: { stack?: unknown };
};

export type Route = { name: string; method: string; path: string; rule?: z.infer<typeof ruleSchema> };

/** Every route that the app's router knows; routers are mounted without a path, save all of them under /api. */
export const routesOf = (app: Express): Route[] => walk(app.router.stack);

function walk(stack: unknown): Route[] {
  return z
    .array(layerSchema)
    .parse(stack)
    .flatMap(({ route, handle }) => (route ? routesIn(route) : handle.stack ? walk(handle.stack) : []));
}

function routesIn({ path, stack }: NonNullable<Layer['route']>): Route[] {
  const methods = [...new Set(stack.map(({ method }) => method))];
  return methods.map((method) => {
    // a rule stands before the handler that answers, which is the last
    const guards = stack.filter((handler) => handler.method === method).slice(0, -1);
    const rules = guards.map(({ handle }) => ruleSchema.safeParse(handle.rule)).filter(({ success }) => success);
    return { name: `${method.toUpperCase()} ${path}`, method, path, rule: rules[0]?.data };
  });
}

export const isWrite = ({ method }: Route) => !['get', 'head', 'options'].includes(method);
