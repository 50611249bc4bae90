/** Of this machine's clock, with its distance from universal time, so that a record can be placed later. */
export function localTime(date: Date): string {
  const two = (value: number) => String(value).padStart(2, "0");
  const day = `${date.getFullYear()}-${two(date.getMonth() + 1)}-${two(date.getDate())}`;
  const minutes = -date.getTimezoneOffset();
  const zone = `UTC${minutes < 0 ? "−" : "+"}${two(Math.floor(Math.abs(minutes) / 60))}:${two(Math.abs(minutes) % 60)}`;
  return `${day} ${two(date.getHours())}:${two(date.getMinutes())} ${zone}`;
}
