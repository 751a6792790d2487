/** Those of the United States, from east to west. */
export const commonZones = [
  'America/New_York',
  'America/Chicago',
  'America/Denver',
  'America/Phoenix',
  'America/Los_Angeles',
  'America/Anchorage',
  'Pacific/Honolulu',
  'America/Puerto_Rico',
];

/** All others the browser knows. */
export const otherZones = (): string[] => Intl.supportedValuesOf('timeZone').filter((zone) => !commonZones.includes(zone));

/** "Central Time", without the half of the year. */
export function zoneName(zone: string, language: string): string {
  const parts = new Intl.DateTimeFormat(language, { timeZone: zone, timeZoneName: 'longGeneric' }).formatToParts();
  const name = parts.find(({ type }) => type === 'timeZoneName')?.value ?? zone;
  return name.charAt(0).toLocaleUpperCase(language) + name.slice(1);
}
