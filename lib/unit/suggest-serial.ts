/** CODE-01, CODE-02 …: the next after the highest number given so far, archived units included. */
export function suggestSerial(code: string, serials: readonly string[]): string {
  const numbers = serials.map((serial) => {
    const tail = serial.startsWith(`${code}-`) ? serial.slice(code.length + 1) : "";
    return /^\d{1,6}$/.test(tail) ? Number(tail) : 0;
  });
  return `${code}-${String(Math.max(0, ...numbers) + 1).padStart(2, "0")}`;
}
