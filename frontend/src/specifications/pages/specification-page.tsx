import { useMemo } from 'react';
import { Link, useParams } from 'react-router-dom';
import { paths } from '../../app/paths';
import type { Revision } from '@bellgap/common/api';
import { EmptyState } from '../../ui/states/empty-state';
import { QueryState } from '../../ui/states/query-state';
import { useTitle } from '../../ui/use-title';
import { HiddenSpecification } from '../components/hidden-specification';
import { SpecificationEditor } from '../components/specification-editor';
import { isShown } from '../model/shown-revision';
import { useTakeOver } from '../queries/use-moves';
import { useRevision } from '../queries/use-revision';

/** A specification in its newest revision, or in the one that the address names: inputs, drawing, ledger of results, title block. */
export function SpecificationPage() {
  const { code = '', number = '', label = 'latest' } = useParams();
  const address = useMemo(() => ({ code, number, label }), [code, number, label]);
  const query = useRevision(address);
  const takeOver = useTakeOver(address);
  useTitle(query.data ? `${query.data.number} ${query.data.title}` : number);
  return (
    <QueryState
      query={query}
      what={`Specification ${number}`}
      missing={
        <EmptyState level={1} title={`There is no specification ${number} here`}>
          It may have another number, or you may not see drafts.{' '}
          <Link to={paths.project.to(code)}>See project {code}</Link>
        </EmptyState>
      }
    >
      {(found) => {
        const revision = found as Revision;
        // A revision that has moved on, or has become visible, begins the page anew.
        const key = `${revision.id} ${revision.state} ${revision.label}`;
        return isShown(revision) ? (
          <SpecificationEditor key={key} first={revision} onMoved={takeOver} />
        ) : (
          <HiddenSpecification key={key} revision={revision} onShown={takeOver} />
        );
      }}
    </QueryState>
  );
}
