import { contract, type Approval, type Revision } from '@bellgap/common/api';
import { useQuery } from '@tanstack/react-query';
import { Button } from 'antd';
import { useState } from 'react';
import { Link, Navigate, useNavigate, useParams } from 'react-router-dom';
import { queryOf } from '../../api/queries';
import { useForget } from '../../api/use-forget';
import { paths } from '../../app/paths';
import { Page } from '../../ui/page/page';
import { EmptyState } from '../../ui/states/empty-state';
import { QueryState } from '../../ui/states/query-state';
import { ApprovalView } from '../components/approval-view';
import { DraftSheetLink } from '../components/draft-sheet-link';

/** Before a sheet leaves the house: what is new, outside, assumed or open, then the signature. */
export function ApprovalPage() {
  const { code = '', number = '', label = '' } = useParams();
  const params = { code, number, label };
  // Both are what was submitted; they are fetched at each visit, so that nobody signs what he saw yesterday.
  const revision = useQuery({ ...queryOf(contract.revision, { params }), staleTime: 0, refetchOnWindowFocus: false });
  const approval = useQuery({ ...queryOf(contract.approval, { params }), staleTime: 0, refetchOnWindowFocus: false });
  const missing = (
    <EmptyState level={1} title={`There is no revision ${label} of ${number} here`}>
      It may have another number, or you may not see drafts. <Link to={paths.project.to(code)}>See project {code}</Link>
    </EmptyState>
  );
  return (
    <QueryState level={1} query={revision} what={`Specification ${number}`} missing={missing}>
      {(foundRevision) => (
        <QueryState level={1} query={approval} what="What is to be looked at" missing={missing}>
          {(foundApproval) => (
            <Found
              key={label}
              revision={foundRevision as Revision}
              approval={foundApproval}
              refresh={() => Promise.all([revision.refetch(), approval.refetch()])}
            />
          )}
        </QueryState>
      )}
    </QueryState>
  );
}

interface FoundProps {
  revision: Revision;
  approval: Approval;
  refresh: () => Promise<unknown>;
}

function Found({ revision, approval, refresh }: FoundProps) {
  const { projectCode, number, title, label, state, sheetId } = revision;
  const forget = useForget();
  const navigate = useNavigate();
  const [left, setLeft] = useState<string | null>(null);
  const leaveFor = async (address: string) => {
    await forget();
    setLeft(address);
  };
  if (left) return <Navigate to={left} replace />;
  if (sheetId !== null) {
    return (
      <EmptyState
        level={1}
        title={`${number} revision ${label} is issued`}
        act={<Button onClick={() => void navigate(paths.issuedSheet.to(sheetId))}>Open the issued sheet</Button>}
      >
        There is nothing left to approve in it.
      </EmptyState>
    );
  }
  if (revision.figuresHidden) {
    return (
      <EmptyState level={1} title={`${number} ${title}`}>
        The figures of the author stay hidden from checkers until they have entered their own.{' '}
        <Link to={paths.specification.to(projectCode, number)}>Open the specification</Link>
      </EmptyState>
    );
  }
  return (
    <Page
      title={`${number} ${title}`}
      tabTitle={`Approve ${number}`}
      lead={
        state === 'checked'
          ? 'Approval: what is new, what lies outside, what rests on an assumption; then your signature'
          : 'Approval, once the check is passed'
      }
      crumbs={[
        { label: projectCode, to: paths.project.to(projectCode) },
        { label: number, to: paths.specification.to(projectCode, number) },
      ]}
      acts={
        <>
          <Button onClick={() => void navigate(paths.specification.to(projectCode, number))}>All figures</Button>
          <DraftSheetLink revision={revision} />
        </>
      }
    >
      <ApprovalView
        approval={approval}
        revision={revision}
        refresh={refresh}
        issued={({ id }) => leaveFor(paths.issuedSheet.to(id))}
        returned={() => leaveFor(paths.desk.to())}
      />
    </Page>
  );
}
