import type { RevisionAddress } from '../specifications/specifications.service';

export interface RevisionParams {
  code: string;
  number: string;
  label: string;
}

export const addressOf = ({ code, number, label }: RevisionParams): RevisionAddress => ({
  projectCode: code,
  number,
  label,
});
