/** Keeps a number and its unit on one line. */
export const unbroken = (text: string): string => text.replace(/(\d) (?=(?:°|K\b|mm\b|in\b|W\/|m\b|Btu))/g, '$1\u00a0');
