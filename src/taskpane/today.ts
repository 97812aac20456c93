const two = (number: number) => String(number).padStart(2, "0");

/** The day where the user is, as 2025-03-14. */
export function today(now = new Date()): string {
  return `${now.getFullYear()}-${two(now.getMonth() + 1)}-${two(now.getDate())}`;
}

/** The time of day where the user is, as 09:05. */
export function timeOfDay(now: Date): string {
  return `${two(now.getHours())}:${two(now.getMinutes())}`;
}
