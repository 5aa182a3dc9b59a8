const day = new Intl.DateTimeFormat('en-GB', { day: 'numeric', month: 'long', year: 'numeric' });
const time = new Intl.DateTimeFormat('en-GB', { hour: '2-digit', minute: '2-digit' });

/** A moment as people say it, on this device's clock: `today, 14:05`, `14 November 2026, 09:30`. */
export function momentWords(moment: string, now = new Date()): string {
  const at = new Date(moment);
  const on = day.format(at) === day.format(now) ? 'today' : day.format(at);
  return `${on}, ${time.format(at)}`;
}
