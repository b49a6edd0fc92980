/** Seconds as minutes and seconds: 75 is "1:15". Rounded up, so that 0:00 means it is over. */
export function clock(seconds: number): string {
  const whole = Math.ceil(seconds);
  return `${Math.floor(whole / 60)}:${String(whole % 60).padStart(2, "0")}`;
}
