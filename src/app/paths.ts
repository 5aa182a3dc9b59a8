/** The addresses of the places that work. */
export const paths = { landing: '/', table: '/try' } as const;
