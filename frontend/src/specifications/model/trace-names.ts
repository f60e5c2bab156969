import type { TraceLine } from '@bellgap/common/api';

/** Lines of the working by the figure that they lead to; a line's id is "topic.name" or "topic.name:use". */
const LINES: readonly (readonly [figure: RegExp, line: RegExp])[] = [
  [
    /^string\.(criteria\.pollution|creepageRequiredMm|uscdRequiredMmPerKv)$/,
    /^pollution\.|^atmosphere\.[^:]+:.*creepage|^string\.units-by-creepage|^string\.count:pollution/,
  ],
  [/^string\.creepageVoltageKv$/, /^pollution\.voltage/],
  [/^string\.creepageProvidedMm$/, /^string\.units-by-creepage|^string\.count:pollution/],
  [
    /^string\.criteria\.lightning$/,
    /:(string )?lightning$|^string\.gap-factor|^air-gaps\.(fast-front-gap-factor|deviation-factor):string|^air-gaps\.lightning-dry-arc/,
  ],
  [
    /^string\.criteria\.switching$/,
    /:(string )?switching$|^string\.gap-factor|^air-gaps\.insulator-gap-factor:string|^air-gaps\.switching-dry-arc/,
  ],
  [/^string\.criteria\.power-frequency$/, /:(string )?power[ -]frequency$|^string\.wet-flashover/],
  [
    /^string\.criteria\.minimum$/,
    /:minimum$|^string\.(company-minimum|suspension-level|dielectric-factor|minimum-other-unit|units-in-thin-air)/,
  ],
  [/^string\.units$/, /^string\.(count|units-by|extra|company-minimum|suspension-level)/],
];
export const hasTrace = (name: string): boolean => LINES.some(([figure]) => figure.test(name));
export function traceLinesOf(name: string, lines: readonly TraceLine[]): TraceLine[] {
  const wanted = LINES.filter(([figure]) => figure.test(name)).map(([, line]) => line);
  return lines.filter(({ id }) => wanted.some((line) => line.test(id)));
}
