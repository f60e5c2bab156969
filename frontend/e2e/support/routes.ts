import type { Role } from '@bellgap/common/api';
import { paths } from '../../src/app/paths';

type RouteName = keyof typeof paths;

/** One picture: a route of the product with real things in it, and who may open it. */
export interface Stop {
  /** File name of the picture, without person, width and theme. */
  name: string;
  route: RouteName;
  path: string;
  /** Links to follow from there, by the beginning of their addresses: what has no address that is known beforehand. */
  follow?: readonly string[];
  /** Roles that may open it; absent means everybody who is signed in. */
  roles?: readonly Role[];
}

const ENGINEERING: readonly Role[] = ['engineer', 'checker', 'approver', 'administrator'];

function specification(code: string, number: string): Stop {
  return {
    name: `specification-${number}`,
    route: 'specification',
    path: paths.specification.to(code, number),
    roles: ENGINEERING,
  };
}

/** Every route with demo data behind it; a test proves that no route of the product is missing here. */
export const SIGNED_IN_STOPS: readonly Stop[] = [
  { name: 'desk', route: 'desk', path: paths.desk.to() },
  { name: 'projects', route: 'projects', path: paths.projects.to() },
  { name: 'project', route: 'project', path: paths.project.to('KL221') },
  { name: 'project-old-line', route: 'project', path: paths.project.to('KL132') },
  { name: 'basis', route: 'designBasis', path: paths.designBasis.to('KL221'), roles: ENGINEERING },
  specification('KL221', 'INS-221-001'),
  specification('KL221', 'INS-221-002'),
  specification('KL221', 'INS-221-003'),
  specification('KL221', 'INS-221-004'),
  specification('KL221', 'INS-221-005'),
  {
    name: 'revision',
    route: 'revision',
    path: paths.revision.to('KL221', 'INS-221-003', 'A'),
    roles: ENGINEERING,
  },
  { name: 'check', route: 'check', path: paths.check.to('KL221', 'INS-221-003', 'A'), roles: ENGINEERING },
  specification('KL132', 'INS-132-001'),
  specification('KL132', 'INS-132-002'),
  specification('KL132', 'INS-132-003'),
  {
    name: 'approval',
    route: 'approval',
    path: paths.approval.to('KL132', 'INS-132-003', 'latest'),
    roles: ENGINEERING,
  },
  { name: 'sheets', route: 'sheets', path: paths.sheets.to() },
  { name: 'sheet', route: 'issuedSheet', path: `${paths.sheets.to()}?standing=current`, follow: ['/sheets/'] },
  {
    name: 'sheet-superseded',
    route: 'issuedSheet',
    path: `${paths.sheets.to()}?standing=superseded`,
    follow: ['/sheets/'],
  },
  { name: 'concessions', route: 'concessions', path: paths.concessions.to(), roles: ENGINEERING },
  {
    name: 'verify-current',
    route: 'verify',
    path: `${paths.sheets.to()}?standing=current`,
    follow: ['/sheets/', '/verify/'],
  },
  {
    name: 'verify-superseded',
    route: 'verify',
    path: `${paths.sheets.to()}?standing=superseded`,
    follow: ['/sheets/', '/verify/'],
  },
  { name: 'catalogue', route: 'catalogue', path: paths.catalogue.to() },
  { name: 'catalogue-unit', route: 'catalogueUnit', path: paths.catalogueUnit.to('U160BL') },
  { name: 'catalogue-rod', route: 'catalogueUnit', path: paths.catalogueUnit.to('C120-132') },
  { name: 'tables', route: 'tables', path: paths.tables.to() },
  { name: 'table', route: 'table', path: paths.table.to('iec-60071-1:a1') },
  { name: 'formula', route: 'table', path: paths.table.to('atmosphere.altitude-factor') },
  { name: 'known-answers', route: 'knownAnswers', path: paths.knownAnswers.to() },
  { name: 'risk', route: 'risk', path: paths.risk.to() },
  { name: 'account', route: 'account', path: paths.account.to() },
  { name: 'trail', route: 'trail', path: paths.trail.to(), roles: ENGINEERING },
  { name: 'administration', route: 'administration', path: paths.administration.to(), roles: ['administrator'] },
];

export const SIGNED_OUT_STOPS: readonly Stop[] = [
  { name: 'sign-in', route: 'signIn', path: paths.signIn.to() },
  { name: 'invitation', route: 'invitation', path: `${paths.invitation.to()}#not-a-real-token` },
  { name: 'verify', route: 'verify', path: paths.verify.to() },
  { name: 'verify-unknown', route: 'verify', path: paths.verify.to('7K2M-94QX-HV3N-C8TA') },
  { name: 'reset-request', route: 'reset', path: paths.reset.to() },
  { name: 'reset', route: 'reset', path: `${paths.reset.to()}#not-a-real-token` },
];

/** A demo person for each role. */
export const PERSON_OF: Record<Role, string> = {
  engineer: 't.orvelle@kigc.example',
  checker: 'r.castellary@kigc.example',
  approver: 'a.holvenstein@kigc.example',
  procurement: 'l.brant@kigc.example',
  reader: 'o.grebe@kigc.example',
  administrator: 'w.tollarsson@kigc.example',
};
