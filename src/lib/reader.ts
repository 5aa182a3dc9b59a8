/** Where the reader is at home, as far as the browser says. */
const region = (): string | undefined => new Intl.Locale(navigator.language).region;

/** Whether the reader's country measures in inches. */
export const measuresInInches = (): boolean => region() === 'US';

/** Whether the reader's country prints on Letter paper. */
export const printsOnLetter = (): boolean => ['US', 'CA', 'MX', 'PH'].includes(region() ?? '');
