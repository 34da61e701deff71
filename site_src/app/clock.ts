// Takes dates; gives them as text with the UTC offset (RFC 3339, with a space for the T), and reads such text back.
// site.ts and sheet.ts come next.

/** How long site conditions hold: one shift. */
export const SHIFT_MS = 12 * 3_600_000;

const PATTERN = /^(\d{4}-\d{2}-\d{2})[T ](\d{2}:\d{2})(?::\d{2})?\s*(Z|[+-]\d{2}:\d{2})$/;

function two(value: number): string {
  return String(Math.floor(value)).padStart(2, "0");
}

function offset(date: Date): string {
  const minutes = -date.getTimezoneOffset();
  const size = Math.abs(minutes);
  return `${minutes < 0 ? "-" : "+"}${two(size / 60)}:${two(size % 60)}`;
}

/** Such as "2026-01-31 07:10 +01:00". */
export function stamp(date: Date): string {
  const day = `${date.getFullYear()}-${two(date.getMonth() + 1)}-${two(date.getDate())}`;
  return `${day} ${two(date.getHours())}:${two(date.getMinutes())} ${offset(date)}`;
}

/** The RFC 3339 form of a typed time, or nothing when it is not one. */
export function toStandard(text: string): string | undefined {
  const parts = PATTERN.exec(text.trim().replace("−", "-"));
  if (!parts) return undefined;
  const standard = `${parts[1]}T${parts[2]}:00${parts[3]}`;
  return Number.isNaN(Date.parse(standard)) ? undefined : standard;
}

/** Hours and minutes of a time written by `stamp`, or the text itself. */
export function hours(text: string): string {
  return PATTERN.exec(text)?.[2] ?? text;
}

/** Whether a time lies further back than one shift; a time that cannot be read does too. */
export function isOld(text: string, now: Date): boolean {
  const standard = toStandard(text);
  return standard === undefined || now.getTime() - Date.parse(standard) > SHIFT_MS;
}

/** When what was read at that time stops holding. */
export function endOfShift(text: string): string {
  const standard = toStandard(text);
  return standard === undefined ? "" : stamp(new Date(Date.parse(standard) + SHIFT_MS));
}
