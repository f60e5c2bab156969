import type { CompanyRuleCard, PollutionClass, RuleOfThumbRow } from '../model';
import { isKnown } from '../quantities';
import { cite, COMPANY } from '../sources';
import { complete, discReason, roundHalfUp, type Checked } from './card';

/** Units of a company card: voltage share, altitude share and dirty classes together, rounded half up. */
export function companyCardUnits(
  card: CompanyRuleCard,
  {
    nominalVoltageKv,
    altitudeM,
    pollutionClass,
  }: { nominalVoltageKv: number; altitudeM: number; pollutionClass: PollutionClass | null },
): number {
  const byAltitude = isKnown(card.metresPerExtraUnit)
    ? Math.max(0, altitudeM - card.altitudeOriginM) / card.metresPerExtraUnit
    : 0;
  const dirty = pollutionClass !== null && card.dirtyClasses.includes(pollutionClass) ? card.dirtyExtraUnits : 0;
  return roundHalfUp(nominalVoltageKv / card.kvPerUnit + byAltitude + dirty);
}

/** A card that the company's administrator has written. */
export function companyCard(card: CompanyRuleCard, checked: Checked): RuleOfThumbRow {
  const { situation, pollutionClass, string, settings } = checked;
  const { nominalVoltageKv, altitudeM } = situation;
  const outside =
    nominalVoltageKv !== null && (nominalVoltageKv < card.minimumVoltageKv || nominalVoltageKv > card.maximumVoltageKv)
      ? `The card holds from ${card.minimumVoltageKv} to ${card.maximumVoltageKv} kV.`
      : null;
  const needsClass = card.dirtyClasses.length > 0 && card.dirtyExtraUnits > 0 && pollutionClass === null;
  const why =
    discReason(checked) ??
    outside ??
    (isKnown(card.metresPerExtraUnit) ? situation.altitudeWhyNot : null) ??
    (needsClass ? 'The card needs a pollution class.' : null);
  return complete({
    id: `company-${card.id}`,
    rule: card.text,
    estimate:
      why === null && nominalVoltageKv !== null
        ? companyCardUnits(card, { nominalVoltageKv, altitudeM: altitudeM ?? 0, pollutionClass })
        : null,
    given: string?.units ?? null,
    unit: 'units',
    band: card.bandUnits,
    why,
    source: cite(COMPANY, `card ${card.id}, version ${settings.version}`, 'practice'),
  });
}
