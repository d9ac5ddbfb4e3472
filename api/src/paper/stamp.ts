const dayMonth = new Intl.DateTimeFormat('en-GB', {
  day: 'numeric',
  month: 'short',
  year: 'numeric',
  timeZone: 'UTC',
});
const hours = new Intl.DateTimeFormat('en-GB', { hour: '2-digit', minute: '2-digit', timeZone: 'UTC' });

/** `1 Dec 2026`, in UTC. */
export const dayOf = (iso: string): string => dayMonth.format(new Date(iso));

/** `1 Dec 2026, 14:52`, in UTC as the record has it. */
export const stamp = (iso: string): string => `${dayOf(iso)}, ${hours.format(new Date(iso))}`;
