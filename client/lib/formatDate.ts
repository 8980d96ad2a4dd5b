const day = new Intl.DateTimeFormat("en-GB", { day: "numeric", month: "long", year: "numeric" });
const deadline = new Intl.DateTimeFormat("en-GB", {
  weekday: "long",
  day: "numeric",
  month: "long",
  hour: "2-digit",
  minute: "2-digit",
  timeZoneName: "short",
});

/** "1 December 2026", in the reader's own zone. */
export const formatDay = (time: string): string => day.format(new Date(time));

/** "Tuesday 1 December at 14:05 CET": a deadline, with its zone. */
export const formatDeadline = (time: string): string => deadline.format(new Date(time));

/** "leaves today", "leaves in 1 day", "leaves in 18 days". */
export function dispatchWords(days: number): string {
  if (days === 0) return "leaves today";
  return `leaves in ${days} ${days === 1 ? "day" : "days"}`;
}
