import { Link, useParams } from 'react-router-dom';
import { paths } from '../../app/paths';
import type { Revision } from '@bellgap/common/api';
import { EmptyState } from '../../ui/states/empty-state';
import { QueryState } from '../../ui/states/query-state';
import { useTitle } from '../../ui/use-title';
import { SpecificationEditor } from '../components/specification-editor';
import { isShown } from '../model/shown-revision';
import { useRevision } from '../queries/use-revision';

/** A specification in its newest revision: inputs, drawing, ledger of results, title block. */
export function SpecificationPage() {
  const { code = '', number = '', label = 'latest' } = useParams();
  const query = useRevision({ code, number, label });
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
        return isShown(revision) ? (
          <SpecificationEditor key={revision.id} first={revision} />
        ) : (
          <EmptyState level={1} title={`${revision.number} ${revision.title}`}>
            The figures of the author stay hidden from checkers until they have entered their own.
          </EmptyState>
        );
      }}
    </QueryState>
  );
}
