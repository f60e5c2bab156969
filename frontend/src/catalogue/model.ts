import type { CatalogueUnit } from '@bellgap/common/api';
import { CHOICE_LABELS } from '@bellgap/common/schemas';

export const kindText = (unit: CatalogueUnit) => CHOICE_LABELS.insulatorKind[unit.kind];
export const familyText = (unit: CatalogueUnit) => CHOICE_LABELS.insulatorFamily[unit.family];
export const profileText = (unit: CatalogueUnit) => CHOICE_LABELS.insulatorProfile[unit.profile];
export const materialText = (unit: CatalogueUnit) =>
  unit.material === null ? null : CHOICE_LABELS.insulatorMaterial[unit.material];

export function sourceText({ document, edition, clause }: CatalogueUnit['source']): string {
  return [document, edition, clause].filter(Boolean).join(', ');
}
