/** "48 s", "2 min", "2 min 5 s": how long an answer took. */
export function secondsWords(seconds: number): string {
  const whole = Math.round(seconds);
  if (whole < 60) return `${whole} s`;
  const rest = whole % 60;
  return rest === 0 ? `${whole / 60} min` : `${Math.floor(whole / 60)} min ${rest} s`;
}

/** "1 to 25 of 197", "1 of 1", or what to say of none. */
export function rangeWords(from: number, count: number, total: number): string {
  if (count === 0) return '';
  const to = from + count - 1;
  return from === to ? `${from} of ${total}` : `${from} to ${to} of ${total}`;
}
