import { altitudeConventions } from '../altitude-conventions';
import type { TableConfirmation } from '../model';
import { cite } from '../sources';
import { C37_30_ALTITUDE } from '../standards';
import { fromTable, type SourceDifference } from './difference';
import { NELSON } from './documents';

const TOPIC = 'Altitude';
/** Where the ways of the sources are compared; a table page shows them at any altitude. */
const COMPARED_AT_M = 2000;

const sideBySide = (confirmations: readonly TableConfirmation[]): SourceDifference => ({
  id: 'altitude.required-at-2000',
  topic: TOPIC,
  quantity: `What is required at ${COMPARED_AT_M} m over what is required at 1000 m`,
  unit: '',
  figures: altitudeConventions(COMPARED_AT_M, confirmations).flatMap(({ id, title, increaseFactor, source }) =>
    increaseFactor === null
      ? []
      : [
          {
            figure: Number(increaseFactor.toFixed(3)),
            figureUpTo: null,
            printedFor: title,
            source,
            entryKey: null,
            key: null,
            isUsed: !/^(rptd|china)/.test(id),
          },
        ],
  ),
  choice:
    'Each figure has one way: the exponents for levels and creepage, Table E.4 for the line methods, the percentage where RD 337/2014 is chosen, the divisor on the North American basis. Two are never put on one figure.',
});

const thinAir = (altitudeFt: number, altitudeM: number): SourceDifference => {
  const isAsked = (row: { altitudeFt: number }) => row.altitudeFt === altitudeFt;
  return {
    id: `altitude.dielectric-${altitudeM}`,
    topic: TOPIC,
    quantity: `Strength of external insulation at ${altitudeM} m over that at 1000 m, North American practice`,
    unit: '',
    figures: [
      fromTable(C37_30_ALTITUDE, isAsked, (row) => row.dielectricFactor, {
        printedFor: `${altitudeFt} ft`,
        isUsed: true,
      }),
      {
        ...fromTable(C37_30_ALTITUDE, isAsked, (row) => row.secondSourceFactor, {
          printedFor: `${altitudeM} m`,
          isUsed: false,
          statusOf: (row) => row.statusSecondSource,
          source: cite(NELSON, 'Table III', 'seen'),
        }),
        key: null,
      },
    ],
    choice: 'C37.30, the factor of the station practice; the second source confirms it within 0.02.',
  };
};

export const altitudeDifferences = (confirmations: readonly TableConfirmation[]): readonly SourceDifference[] => [
  sideBySide(confirmations),
  thinAir(5000, 1500),
  thinAir(10000, 3000),
];
