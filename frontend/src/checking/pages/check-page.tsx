import { CHECK_CATEGORY_LABELS, type Check, type Evaluation, type Revision } from '@bellgap/common/api';
import { useMemo } from 'react';
import { Link, useParams } from 'react-router-dom';
import { paths } from '../../app/paths';
import { dayText } from '../../ui/days';
import { Page } from '../../ui/page/page';
import { Sheet } from '../../ui/page/sheet';
import { RemarksPanel } from '../../ui/remarks';
import { RevisionStateMark } from '../../ui/revision-state';
import { EmptyState } from '../../ui/states/empty-state';
import { LoadingState } from '../../ui/states/loading-state';
import { QueryState } from '../../ui/states/query-state';
import { DecidedCheck } from '../components/decided-check';
import { InputsBefore } from '../components/inputs-before';
import { OwnFiguresForm } from '../components/own-figures-form';
import { RunningCheck } from '../components/running-check';
import { useCheck, useCheckActs, useCheckedRevision, type CheckAddress } from '../queries/use-check';
import '../components/checking.css';

/** The check of a submission: own figures first, then what was seen, then the verdict. */
export function CheckPage() {
  const { code = '', number = '', label = '' } = useParams();
  const address = useMemo(() => ({ code, number, label }), [code, number, label]);
  const revision = useCheckedRevision(address);
  const check = useCheck(address);
  const missing = (
    <EmptyState level={1} title={`There is no revision ${label} of ${number} here`}>
      It may have another letter, or you may not see it. <Link to={paths.project.to(code)}>See project {code}</Link>
    </EmptyState>
  );
  return (
    <QueryState level={1} query={revision} what={`Specification ${number}`} missing={missing}>
      {(found) => (
        <Page
          title={`Check of ${number} revision ${label}`}
          lead={<Standing revision={found as Revision} />}
          crumbs={[
            { label: code, to: paths.project.to(code) },
            { label: number, to: paths.specification.to(code, number) },
            { label: `revision ${label}`, to: paths.revision.to(code, number, label) },
          ]}
        >
          <div className="check">
            <QueryState query={check} what="The check">
              {(data) => <Steps revision={found as Revision} check={data as Check} address={address} />}
            </QueryState>
          </div>
        </Page>
      )}
    </QueryState>
  );
}

function Standing({ revision }: { revision: Revision }) {
  const { state, title, submitted } = revision;
  return (
    <>
      <RevisionStateMark state={state} /> {title}
      {submitted && (
        <>
          {' '}
          · submitted by {submitted.name} on {dayText(submitted.on)}, category{' '}
          {CHECK_CATEGORY_LABELS[submitted.checkCategory] ?? submitted.checkCategory}
          {submitted.dueOn !== null && `, wanted by ${dayText(submitted.dueOn)}`}
          {submitted.note && (
            <>
              {' '}
              · note: <q>{submitted.note}</q>
            </>
          )}
        </>
      )}
    </>
  );
}

interface StepsProperties {
  revision: Revision;
  check: Check;
  address: CheckAddress;
}

const hasFigures = (revision: Revision): revision is Revision & { evaluation: Evaluation } =>
  revision.evaluation !== null;

function Steps({ revision, check, address }: StepsProperties) {
  const { enter } = useCheckActs(address);
  const { mine, mayCheck, why, decided, cards } = check;
  if (mayCheck && mine === null) {
    return (
      <>
        <InputsBefore revision={revision} />
        <OwnFiguresForm cards={cards} kind={revision.input.kind} submit={enter.mutateAsync} />
      </>
    );
  }
  if (mayCheck && mine !== null && mine.decidedAt === null) {
    // The figures follow the own ones, in an answer of their own.
    if (!hasFigures(revision)) return <LoadingState />;
    return (
      <>
        <RunningCheck key={mine.id} revision={revision} record={mine} address={address} />
        <DecidedChecks check={check} />
      </>
    );
  }
  const { code, number, label } = address;
  return (
    <>
      <Sheet title={decided.length > 0 ? 'Where it stands' : 'No check here'}>
        <p className="check-lead">{why ?? 'There is nothing to check now.'}</p>
        <p>
          <Link to={paths.revision.to(code, number, label)}>See the specification</Link>
          {revision.state === 'checked' && (
            <>
              {' · '}
              <Link to={paths.approval.to(code, number, label)}>Approval page</Link>
            </>
          )}
        </p>
      </Sheet>
      <DecidedChecks check={check} />
      {!revision.figuresHidden && (
        <RemarksPanel address={address} input={revision.input} lines={revision.evaluation?.trace ?? []} />
      )}
    </>
  );
}

function DecidedChecks({ check: { decided, cards } }: { check: Check }) {
  return decided.map((record) => <DecidedCheck key={record.id} record={record} cards={cards} />);
}
