/** The addresses of the places that work. */
export const paths = {
  landing: '/',
  table: '/try',
  tablePrint: '/try/print',
  tableReplay: '/try/replay',
  signIn: '/sign-in',
  signUp: '/sign-up',
  account: '/account',
  gowns: '/gowns',
  gown: '/gowns/:gownId',
  gownPrint: '/gowns/:gownId/print',
  gownReplay: '/gowns/:gownId/replay',
  cards: '/gowns/measure-cards',
  card: '/gowns/measure-cards/:cardId',
  classes: '/classes',
  class: '/class/:token',
} as const;
