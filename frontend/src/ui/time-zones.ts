/** Zones for choosing from: full hours by offset, which need no list of places, then the names that the browser knows. */
export function timeZoneChoices(): { value: string; label: string }[] {
  const offsets = Array.from({ length: 27 }, (_, step) => {
    const hours = step - 12;
    // The names of these zones count the other way round: Etc/GMT-4 is four hours before UTC.
    const value = hours === 0 ? 'Etc/UTC' : `Etc/GMT${hours > 0 ? '-' : '+'}${Math.abs(hours)}`;
    return { value, label: `UTC${hours < 0 ? '-' : '+'}${String(Math.abs(hours)).padStart(2, '0')}:00` };
  });
  const named = Intl.supportedValuesOf('timeZone').filter((zone) => !zone.startsWith('Etc/') && zone !== 'UTC');
  return [...offsets, ...named.map((zone) => ({ value: zone, label: zone.replaceAll('_', ' ') }))];
}

/** A zone as people write it: by its offset, or by its name. */
export function zoneText(zone: string): string {
  return timeZoneChoices().find(({ value }) => value === zone)?.label ?? zone;
}
