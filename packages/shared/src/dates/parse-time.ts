/**
 * A time of day as people type it (`16:00`, `16.30`, `4 pm`, `4:30pm`, `1630`, `noon`) to minutes
 * since midnight; null where it says none. A bare hour without am or pm is on the 24-hour clock.
 */
export function parseTime(text: string): number | null {
  const trimmed = text.trim().toLowerCase();
  if (trimmed === 'noon') return 12 * 60;
  if (trimmed === 'midnight') return 0;
  const match = /^(\d{1,2})(?:\s*[:.h]\s*|)?([0-5]\d)?\s*([ap])?\.?\s*(?:m\.?)?$/u.exec(trimmed);
  if (match === null) return null;
  const [, hourText = '', minuteText = '0', half] = match;
  const hour = Number(hourText);
  const minute = Number(minuteText);
  if (half === undefined) return hour <= 23 ? hour * 60 + minute : null;
  if (hour < 1 || hour > 12) return null;
  return (half === 'p' ? (hour % 12) + 12 : hour % 12) * 60 + minute;
}
