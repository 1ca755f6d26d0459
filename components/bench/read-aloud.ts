const KEY = "boardwake-read-aloud";

/** The spoken form of symbols that speech engines leave out or spell. */
const SPOKEN: readonly [RegExp, string][] = [
  [/±/g, " plus or minus "],
  [/≤/g, " at most "],
  [/≥/g, " at least "],
  [/</g, " below "],
  [/>/g, " above "],
  [/…/g, " to "],
  [/(\d)\s?kΩ/g, "$1 kilohm"],
  [/(\d)\s?MΩ/g, "$1 megohm"],
  [/(\d)\s?mΩ/g, "$1 milliohm"],
  [/(\d)\s?Ω/g, "$1 ohm"],
  [/(\d)\s?mV\b/g, "$1 millivolt"],
  [/(\d)\s?V\b/g, "$1 volt"],
  [/(\d)\s?mA\b/g, "$1 milliamp"],
  [/(\d)\s?[µμ]A\b/g, "$1 microamp"],
  [/(\d)\s?A\b/g, "$1 amp"],
  [/(\d)\s?[µμ]s\b/g, "$1 microseconds"],
  [/(\d)\s?ns\b/g, "$1 nanoseconds"],
];

export function spoken(text: string): string {
  return SPOKEN.reduce((said, [symbol, words]) => said.replace(symbol, words), text)
    .replace(/\s+/g, " ")
    .trim();
}

export function canReadAloud(): boolean {
  return "speechSynthesis" in window;
}

/** Says the text, breaking off what was being said before. */
export function readAloud(text: string): void {
  if (!canReadAloud()) return;
  speechSynthesis.cancel();
  const utterance = new SpeechSynthesisUtterance(spoken(text));
  utterance.lang = "en-GB";
  speechSynthesis.speak(utterance);
}

export function stopReading(): void {
  if (canReadAloud()) speechSynthesis.cancel();
}

export function readsAloud(): boolean {
  try {
    return localStorage.getItem(KEY) === "on";
  } catch {
    return false;
  }
}

export function setReadsAloud(on: boolean): void {
  try {
    localStorage.setItem(KEY, on ? "on" : "off");
  } catch {
    // The choice lasts as long as the page.
  }
}
