import { contract, type CatalogueUnit } from '@bellgap/common/api';
import { drawUnit } from '@bellgap/common/drawing';
import { CHOICE_LABELS } from '@bellgap/common/schemas';
import { useQuery } from '@tanstack/react-query';
import { useMemo } from 'react';
import { Link, useParams } from 'react-router-dom';
import { queryOf } from '../../api/queries';
import { paths } from '../../app/paths';
import { figureText, type Column } from '../../ui/data-table/columns';
import { DataTable } from '../../ui/data-table/data-table';
import { useListState } from '../../ui/data-table/use-list-state';
import { DrawingView } from '../../ui/drawing/drawing-view';
import { Facts } from '../../ui/facts';
import { Ledger } from '../../ui/ledger';
import { Page } from '../../ui/page/page';
import { Sheet } from '../../ui/page/sheet';
import { EmptyState } from '../../ui/states/empty-state';
import { QueryState } from '../../ui/states/query-state';
import { familyText, kindText, materialText, profileText, sourceText } from '../model';
import './catalogue-unit-page.css';

type Flashover = NonNullable<CatalogueUnit['wetFlashover']>[number];

const FLASHOVER_COLUMNS: Column<Flashover>[] = [
  { key: 'units', title: 'Units in the string', value: (row) => row.units, figure: true, sortable: true },
  { key: 'wetKvRms', title: 'Wet flashover, kV rms', value: (row) => row.wetKvRms, figure: true, sortable: true },
];

function FlashoverTable({ code, rows }: { code: string; rows: Flashover[] }) {
  const list = useListState({ defaultSort: 'units', prefix: 'flashover-' });
  return (
    <DataTable
      label="Wet flashover of complete strings"
      name={`wet-flashover-${code}`}
      columns={FLASHOVER_COLUMNS}
      rows={rows}
      rowKey={(row) => String(row.units)}
      list={list}
    />
  );
}

const measure = (value: number | null, unit: string) => (value === null ? null : `${figureText(value)} ${unit}`);

function dimensionsOf(unit: CatalogueUnit): (readonly [string, string | null])[] {
  const disc = unit.kind === 'cap-and-pin';
  return [
    [disc ? 'Spacing' : 'Length between fittings', measure(unit.spacingMm, 'mm')],
    ['Diameter', measure(unit.diameterMm, 'mm')],
    ...(disc ? [] : ([['Average diameter', measure(unit.averageDiameterMm, 'mm')]] as const)),
    [`Creepage, ${unit.creepageIsNominal ? 'nominal' : 'minimum'}`, measure(unit.creepageMm, 'mm')],
    ['Dry arc', measure(unit.dryArcMm, 'mm')],
    ['Mass', measure(unit.massKg, 'kg')],
    ['Failing load', measure(unit.failingLoadKn, 'kN')],
    ...(unit.routineTestLoadKn === null
      ? []
      : ([['Routine test load', measure(unit.routineTestLoadKn, 'kN')]] as const)),
    ...(unit.kind === 'line-post'
      ? ([['Strength in bending', measure(unit.cantileverStrengthKn ?? null, 'kN')]] as const)
      : []),
    ['Coupling', unit.coupling],
  ];
}

/** Symbols as the profile checks write them. */
function shedsOf({ sheds, kind, profile, spacingMm }: CatalogueUnit): (readonly [string, string | null])[] {
  if (!sheds) return [];
  const ofUnit = kind === 'cap-and-pin' && sheds.spacingMm === null;
  return [
    ['Shed spacing, s', ofUnit ? `${measure(spacingMm, 'mm')} of the unit` : measure(sheds.spacingMm, 'mm')],
    [profile === 'alternating' ? 'Overhang, p1' : 'Overhang, p', measure(sheds.overhangMm, 'mm')],
    ...(profile === 'alternating'
      ? ([['Overhang of the smaller sheds, p2', measure(sheds.secondOverhangMm, 'mm')]] as const)
      : []),
    ['Distance between sheds, c', measure(sheds.clearanceMm, 'mm')],
    ['Creepage where it is densest, l', measure(sheds.pathMm, 'mm')],
    ['Distance through air there, d', measure(sheds.pathClearanceMm, 'mm')],
    ['Ribs below', sheds.underRibs === null ? null : CHOICE_LABELS.yesNo[sheds.underRibs ? 'yes' : 'no']],
  ];
}

function UnitView({ unit }: { unit: CatalogueUnit }) {
  const drawing = useMemo(() => drawUnit(unit), [unit]);
  return (
    <Page
      title={unit.code}
      crumbs={[{ label: 'Catalogue', to: paths.catalogue.to() }]}
      lead={unit.withdrawn ? 'Withdrawn: not for new specifications' : (unit.note ?? undefined)}
    >
      <Facts
        facts={[
          ['Family', familyText(unit)],
          ['Kind', kindText(unit)],
          ['Material', materialText(unit) ?? 'not known'],
          ['Profile', profileText(unit)],
          ['Version', <span className="num">{unit.version}</span>],
        ]}
      />
      <div className={drawing ? 'unit-sheets unit-sheets-drawn' : 'unit-sheets'}>
        {drawing && (
          <Sheet title="Outline" note="to scale; the form of cap and shed is not">
            <div className="unit-drawing" style={{ aspectRatio: drawing.widthMm / drawing.heightMm }}>
              <DrawingView drawing={drawing} />
            </div>
          </Sheet>
        )}
        <Sheet title="Dimensions and strength">
          <Ledger rows={dimensionsOf(unit)} />
          {unit.withdrawn && unit.note && <p className="soft">{unit.note}</p>}
        </Sheet>
        {unit.sheds && (
          <Sheet title="Sheds" note="for the checks of the profile">
            <Ledger rows={shedsOf(unit)} />
          </Sheet>
        )}
        <Sheet title="Source">
          <Ledger
            rows={[
              ['Document', unit.source.document],
              ['Edition', unit.source.edition],
              ['Clause', unit.source.clause],
              ['Status', CHOICE_LABELS.status[unit.source.status]],
            ]}
          />
        </Sheet>
      </div>
      {unit.wetFlashover && unit.wetFlashover.length > 0 && (
        <Sheet title="Wet flashover of complete strings" note={`Power frequency; ${sourceText(unit.source)}`} flush>
          <FlashoverTable code={unit.code} rows={unit.wetFlashover} />
        </Sheet>
      )}
    </Page>
  );
}

export function CatalogueUnitPage() {
  const { code = '' } = useParams();
  const unit = useQuery(queryOf(contract.insulator, { params: { code } }));
  return (
    <QueryState
      level={1}
      query={unit}
      what="The unit"
      missing={
        <EmptyState title={`There is no unit ${code}`} level={1}>
          Look for it in the <Link to={paths.catalogue.to()}>catalogue</Link>.
        </EmptyState>
      }
    >
      {(found) => <UnitView unit={found as CatalogueUnit} />}
    </QueryState>
  );
}
