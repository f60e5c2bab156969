import { Button } from 'antd';
import { useRaisingHere } from './raising';

/** Begins a remark on one field or line; nothing where remarks cannot be raised. */
export function RemarkButton({ path, about }: { path: string; about: string }) {
  const raising = useRaisingHere();
  if (!raising) return null;
  return (
    <Button type="link" size="small" aria-label={`Remark on ${about}`} onClick={() => raising.begin(path)}>
      Remark
    </Button>
  );
}
