import type { Remark, SpecificationInput, TraceLine } from '@bellgap/common/api';
import { Button } from 'antd';
import { useMemo, type ReactNode } from 'react';
import { useLocation } from 'react-router-dom';
import { Sheet } from '../page/sheet';
import { QueryState } from '../states/query-state';
import { useRaising, useRaisingHere } from './raising';
import { RaiseForm } from './remark-form';
import { RemarkItem, remarkAnchor } from './remark-item';
import { aboutWords, remarkPlaces } from './remark-words';
import { useRemarkActs, useRemarks, type Remarks, type RemarksAddress } from './use-remarks';
import './remarks.css';

interface Properties {
  address: RemarksAddress;
  input: SpecificationInput;
  /** Lines of the calculation that a remark can be tied to. */
  lines: readonly TraceLine[];
  /** Where on the page a field or a line stands; null where it has no place. */
  hrefOf?: (path: string) => string | null;
}

/** Remarks of check and approval: raised, answered, and closed by who raised them. */
export function RemarksPanel({ address, input, lines, hrefOf }: Properties) {
  const query = useRemarks(address);
  const own = useRaising();
  const raising = useRaisingHere() ?? own;
  const acts = useRemarkActs(address);
  const { data } = query;
  return (
    <div id="remarks">
      <Sheet
        title="Remarks"
        note={data && countWords(data)}
        acts={
          data?.mayRaise &&
          raising.about === undefined && (
            <Button size="small" onClick={() => raising.begin(null)}>
              Raise a remark
            </Button>
          )
        }
      >
        <QueryState query={query} what="The remarks">
          {(remarks) => (
            <>
              {remarks.mayRaise && raising.about !== undefined && (
                <RaiseForm
                  about={raising.about}
                  places={remarkPlaces(input, lines)}
                  submit={acts.raise.mutateAsync}
                  onEnd={raising.end}
                />
              )}
              <RemarkList remarks={remarks} lines={lines} hrefOf={hrefOf} acts={acts} />
            </>
          )}
        </QueryState>
      </Sheet>
    </div>
  );
}

function countWords({ items, open }: Remarks): string {
  if (items.length === 0) return 'none';
  if (open === 0) return `${items.length} closed, none open`;
  return `${open} open${items.length > open ? `, ${items.length - open} closed` : ''}`;
}

interface ListProperties extends Pick<Properties, 'lines' | 'hrefOf'> {
  remarks: Remarks;
  acts: ReturnType<typeof useRemarkActs>;
}

function RemarkList({ remarks: { items }, lines, hrefOf, acts }: ListProperties) {
  const { hash } = useLocation();
  const [open, closed] = useMemo(
    () => [items.filter(({ closedAt }) => !closedAt), items.filter(({ closedAt }) => closedAt)],
    [items],
  );
  if (items.length === 0) {
    return (
      <p className="soft">
        No remarks. They are raised in check and before approval; while one is open, nothing is issued.
      </p>
    );
  }
  const about = ({ path }: Remark): ReactNode => {
    const words = aboutWords(path, lines);
    const href = path === null ? null : (hrefOf?.(path) ?? null);
    return href === null ? words : <a href={href}>{words}</a>;
  };
  const list = (some: Remark[]) => (
    <ul className="remarks">
      {some.map((remark) => (
        <RemarkItem key={remark.id} remark={remark} about={about(remark)} acts={acts} />
      ))}
    </ul>
  );
  return (
    <>
      {open.length > 0 && list(open)}
      {closed.length > 0 && (
        <details open={open.length === 0 || closed.some(({ id }) => hash === `#${remarkAnchor(id)}`)}>
          <summary>{closed.length} closed</summary>
          {list(closed)}
        </details>
      )}
    </>
  );
}
