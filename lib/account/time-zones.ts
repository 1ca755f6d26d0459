/** Every time zone of this computer's data, with its offset now, for a list to choose from. */
export function timeZones(now = new Date()): { id: string; label: string; description: string }[] {
  const names = Intl.supportedValuesOf("timeZone");
  const all = names.includes("UTC") ? names : ["UTC", ...names];
  return all.map((id) => ({ id, label: id.replaceAll("_", " "), description: offset(id, now) }));
}

function offset(zone: string, now: Date): string {
  const parts = new Intl.DateTimeFormat("en-GB", { timeZone: zone, timeZoneName: "longOffset" }).formatToParts(now);
  const name = parts.find((part) => part.type === "timeZoneName")?.value ?? "";
  return name === "GMT" ? "UTC" : name.replace("GMT", "UTC ").replace("-", "−");
}
