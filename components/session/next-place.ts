import type { Href } from 'expo-router';

type Inside = Href & string;

/** Where to go after signing in: a path of ours, never another site's. */
const isInside = (path: string): path is Inside => /^\/(?![/\\])/.test(path) && !path.startsWith('/sign-in');

export const nextPlace = (next: unknown): Inside => (typeof next === 'string' && isInside(next) ? next : '/jobs');
