/** The addresses of the places that work. */
export const paths = {
  landing: '/',
  table: '/try',
  signIn: '/sign-in',
  signUp: '/sign-up',
  account: '/account',
  gowns: '/gowns',
  gown: '/gowns/:gownId',
  cards: '/gowns/measure-cards',
  card: '/gowns/measure-cards/:cardId',
} as const;
