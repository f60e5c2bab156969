import type { Revision } from '@bellgap/common/api';
import { useMemo } from 'react';
import { Ledger } from '../../ui/ledger';
import { Sheet } from '../../ui/page/sheet';
import { inputGroups } from '../model/inputs';

/** The inputs as they were submitted, to count from. */
export function InputsBefore({ revision: { input, context, overrides } }: { revision: Revision }) {
  const groups = useMemo(() => inputGroups(input), [input]);
  const unit = context.insulator;
  return (
    <Sheet title="Inputs" note="as submitted; the figures of the author follow your own">
      <div className="inputs-before">
        {groups.map(({ name, rows }) => (
          <section key={name} aria-label={name}>
            <h3>{name}</h3>
            <Ledger rows={rows.map(({ label, value }) => [label, value] as const)} />
          </section>
        ))}
        {unit && (
          <section aria-label="Catalogue unit">
            <h3>{unit.code}</h3>
            <Ledger
              rows={[
                ['Failing load', `${unit.failingLoadKn} kN`],
                ['Spacing', `${unit.spacingMm} mm`],
                ['Creepage', `${unit.creepageMm} mm`],
                ['Diameter', unit.diameterMm === null ? null : `${unit.diameterMm} mm`],
              ]}
            />
          </section>
        )}
      </div>
      {overrides.length > 0 && (
        <p className="check-lead">
          {overrides.length === 1 ? 'One input departs' : `${overrides.length} inputs depart`} from the design basis,
          each with a reason; see the specification.
        </p>
      )}
    </Sheet>
  );
}
