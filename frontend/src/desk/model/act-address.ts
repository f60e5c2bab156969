import type { SpecificationRow, Waiting } from '@bellgap/common/api';
import { paths } from '../../app/paths';

/** Where one acts on what waits. */
export function actAddress(why: Waiting, { projectCode, number, label, state }: SpecificationRow): string {
  const specification = paths.specification.to(projectCode, number);
  switch (why) {
    case 'check':
    case 'go-on-checking':
      return paths.check.to(projectCode, number, label);
    case 'approve':
      return paths.approval.to(projectCode, number, label);
    case 'answer':
      return `${specification}#remarks`;
    case 'close':
      if (state === 'in_check') return `${paths.check.to(projectCode, number, label)}#remarks`;
      if (state === 'checked') return `${paths.approval.to(projectCode, number, label)}#remarks`;
      return `${specification}#remarks`;
  }
}
