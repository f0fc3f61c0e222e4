import { expect, type APIRequestContext } from '@playwright/test';
import type { z } from 'zod';

/** Asks the server as the person whose browser it is; anything but a yes fails the test. */
export async function ask<Shape>(request: APIRequestContext, path: string, schema: z.ZodType<Shape>): Promise<Shape> {
  const response = await request.get(`/api${path}`);
  expect(response.ok(), `GET ${path}: ${response.status()}`).toBe(true);
  return schema.parse(await response.json());
}

type Write<Shape> = { method?: 'POST' | 'PATCH'; path: string; body: unknown; schema: z.ZodType<Shape> };

export async function write<Shape>(request: APIRequestContext, asked: Write<Shape>): Promise<Shape> {
  const { method = 'POST', path, body, schema } = asked;
  const response = await request.fetch(`/api${path}`, { method, data: body, headers: { 'x-thickset': '1' } });
  expect(response.ok(), `${method} ${path}: ${response.status()} ${await response.text()}`).toBe(true);
  return schema.parse(await response.json());
}
