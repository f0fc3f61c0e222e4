// Mail as a maildir: written whole in tmp/, then moved to new/. One file, one message, its bytes untouched.
import fs from 'node:fs/promises';
import path from 'node:path';
import { simpleParser } from 'mailparser';

let count = 0;

export async function openMaildir(folder) {
  for (const part of ['tmp', 'new', 'cur']) await fs.mkdir(path.join(folder, part), { recursive: true });
  const parsed = new Map();

  async function files() {
    const parts = await Promise.all(
      ['new', 'cur'].map(async (part) => ({ part, names: await fs.readdir(path.join(folder, part)) })),
    );
    return new Map(
      parts.flatMap(({ part, names }) => names.map((name) => [name.split(':')[0], path.join(folder, part, name)])),
    );
  }

  /** Stores one message under its envelope, as delivery does; on the disk before it is acknowledged. */
  async function save(bytes, { from, to }) {
    count += 1;
    const id = `${Date.now()}.${process.pid}-${count}.thickset`;
    const envelope = [`Return-Path: <${from}>`, ...to.map((address) => `Delivered-To: ${address}`), ''].join('\r\n');
    const draft = path.join(folder, 'tmp', id);
    await fs.writeFile(draft, Buffer.concat([Buffer.from(envelope), bytes]), { flush: true });
    await fs.rename(draft, path.join(folder, 'new', id));
    return id;
  }

  async function read(id) {
    const file = (await files()).get(id);
    if (!file) return undefined;
    if (!parsed.has(id)) parsed.set(id, await simpleParser(await fs.readFile(file)));
    return { id, bytes: await fs.readFile(file), mail: parsed.get(id) };
  }

  /** Every message, the newest first. */
  async function list() {
    const ids = [...(await files()).keys()].sort((a, b) => number(b) - number(a) || (a < b ? 1 : -1));
    return (await Promise.all(ids.map(read))).filter((message) => message !== undefined);
  }

  return { save, read, list };
}

const number = (id) => Number(id.split('.')[0]);
