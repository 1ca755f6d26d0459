/** Every zone the runtime knows, with its present offset: "Europe/Bremen (UTC+01:00)". */
export function timeZones(now: Date): { id: string; label: string }[] {
  return ["UTC", ...Intl.supportedValuesOf("timeZone").filter((zone) => zone !== "UTC")].map((zone) => {
    const parts = new Intl.DateTimeFormat("en-GB", { timeZone: zone, timeZoneName: "longOffset" }).formatToParts(now);
    const offset = parts.find((part) => part.type === "timeZoneName")?.value.replace("GMT", "UTC") ?? "";
    return { id: zone, label: zone === "UTC" ? "UTC" : `${zone.replaceAll("_", " ")} (${offset})` };
  });
}
