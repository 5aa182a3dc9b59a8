const months = [
  'January',
  'February',
  'March',
  'April',
  'May',
  'June',
  'July',
  'August',
  'September',
  'October',
  'November',
  'December',
];

/** `2026-11-14` as `14 November 2026`; anything else as it stands. */
export function dayInWords(day: string): string {
  const [, year, month, date] = /^(\d{4})-(\d{2})-(\d{2})$/.exec(day) ?? [];
  const name = months[Number(month) - 1];
  return year && date && name ? `${Number(date)} ${name} ${year}` : day;
}
