const clock = new Intl.DateTimeFormat("en-GB", { hour: "2-digit", minute: "2-digit", timeZoneName: "short" });
const moment = new Intl.DateTimeFormat("en-GB", {
  day: "numeric",
  month: "long",
  year: "numeric",
  hour: "2-digit",
  minute: "2-digit",
  timeZoneName: "short",
});
const day = new Intl.DateTimeFormat("en-GB", { weekday: "long", day: "numeric", month: "long" });

/** "1 December 2026 at 14:05 CET", in the reader's own zone. */
export const formatMoment = (time: string): string => moment.format(new Date(time));

/** A deadline as near as it is: "14:05 CET" today, else "Wednesday 2 December, 00:20 CET". */
export function formatUntil(time: string, now: Date): string {
  const at = new Date(time);
  const words = clock.format(at);
  return at.toDateString() === now.toDateString() ? words : `${day.format(at)}, ${words}`;
}
