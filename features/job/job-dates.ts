/** 1 December 2026, 10:42, in the job's time zone. */
export const dateTimeText = (atMs: number, timeZone: string): string =>
  new Intl.DateTimeFormat('en-GB', { dateStyle: 'long', timeStyle: 'short', timeZone })
    .format(atMs)
    .replace(' at ', ', ')
