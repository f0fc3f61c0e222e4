/** An edition's name in an address; a server takes what follows a full stop for a kind of file. */
export const codeSlug = (id: string): string => id.replaceAll('.', '-');

export const codeHref = (id: string) => `/library/codes/${codeSlug(id)}` as const;
