/** The addresses of the places that work. */
export const paths = {
  landing: '/',
  table: '/try',
  tablePrint: '/try/print',
  signIn: '/sign-in',
  signUp: '/sign-up',
  account: '/account',
  gowns: '/gowns',
  gown: '/gowns/:gownId',
  gownPrint: '/gowns/:gownId/print',
  cards: '/gowns/measure-cards',
  card: '/gowns/measure-cards/:cardId',
} as const;
