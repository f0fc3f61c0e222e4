/** Changes whenever a result may change; every result carries it. */
export const engineVersion = '1.0.0';
