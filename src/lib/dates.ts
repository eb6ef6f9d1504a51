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

/**
 * `3 May 2026` of an ISO time. In UTC and in words of our own, so that the server and every browser say the same and a
 * kept sheet stays true.
 */
export function dayOf(time: string): string {
  const date = new Date(time);
  if (Number.isNaN(date.getTime())) return 'an unknown day';
  return `${String(date.getUTCDate())} ${months[date.getUTCMonth()] ?? ''} ${String(date.getUTCFullYear())}`;
}
