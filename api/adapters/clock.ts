/** The only way to the present moment; tests and seeds hand in their own. */
export type Clock = () => Date;

export const systemClock: Clock = () => new Date();
