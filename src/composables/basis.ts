/** The short name of a design basis. */
export const basisShort = (id: string): string => id;
