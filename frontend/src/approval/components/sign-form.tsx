import {
  contract,
  TRANSITIONS,
  type Approval,
  type BodyOf,
  type IssuedSheet,
  type Revision,
} from '@bellgap/common/api';
import { ApiError } from '../../api/api-error';
import { call } from '../../api/client';
import { SchemaFormView } from '../../ui/forms/schema-form';
import { LongTextField, PasswordField, TextField } from '../../ui/forms/text-fields';
import { UnsavedGuard } from '../../ui/forms/unsaved-guard';
import { useSchemaForm } from '../../ui/forms/use-schema-form';
import { approvalSchema, firstValues, toIssueBody, type ApprovalValues } from '../model/approval-values';
import { Matters } from './matters';

interface SignFormProps {
  approval: Approval;
  revision: Revision;
  /** Fetches the revision and what there is to look at anew. */
  refresh: () => Promise<unknown>;
  issued: (sheet: IssuedSheet) => unknown;
}

/** Reasons, concessions and the signature that issues. */
export function SignForm({ approval, revision, refresh, issued }: SignFormProps) {
  const { projectCode: code, number, label, lockVersion } = revision;
  const { acceptances, fails, laterChanges, nextLabel, mayIssue } = approval;
  const asksForWaitingReason = laterChanges.length > 0;
  const form = useSchemaForm<ApprovalValues>({
    schema: approvalSchema(asksForWaitingReason),
    initialValues: firstValues(approval),
    toBody: (values) => toIssueBody(values, asksForWaitingReason),
    submit: async (body: BodyOf<typeof contract.issueRevision>) => {
      try {
        const sheet = await call(contract.issueRevision, {
          params: { code, number, label },
          body,
          ifMatch: lockVersion,
        });
        await issued(sheet);
      } catch (error) {
        // The page then shows what has changed meanwhile; the reasons that were typed stay in their fields.
        if (error instanceof ApiError && error.status !== 0) await refresh();
        throw error;
      }
    },
  });
  return (
    <SchemaFormView
      form={form}
      label={TRANSITIONS.issue.label}
      submitLabel={`${TRANSITIONS.issue.label} as revision ${nextLabel}`}
      submitDisabled={!mayIssue}
    >
      <Matters
        anchor="acceptances"
        title="Outside limits"
        asks="Accept each with a reason; it stands on the sheet under your name."
        severity="acceptance"
        matters={acceptances}
        fields={(index) => <LongTextField form={form} path={`acceptances[${index}].reason`} label="Reason" rows={2} />}
      />
      <Matters
        anchor="fails"
        title="Failing"
        asks="Give each a concession with its last day; you are told before it ends."
        severity="fail"
        matters={fails}
        fields={(index) => (
          <>
            <LongTextField form={form} path={`concessions[${index}].reason`} label="Reason" rows={2} />
            <TextField form={form} path={`concessions[${index}].validUntil`} label="Valid until" type="date" nullable />
          </>
        )}
      />
      <Matters
        anchor="later"
        title="Newer since it was submitted"
        asks="Say why you do not wait, or return it."
        severity="caution"
        matters={laterChanges}
      >
        <LongTextField form={form} path="laterChangesReason" label="Reason for not waiting" rows={2} />
      </Matters>
      <section className="matters">
        <h3>Sign</h3>
        <p className="soft">
          Issues revision {label} as it was checked, unchanged, as revision {nextLabel}
          {approval.inForce && `; revision ${approval.inForce.label} is superseded`}.
        </p>
        <PasswordField form={form} path="password" label="Password" autoComplete="current-password" />
      </section>
      <UnsavedGuard unsaved={form.formik.dirty && !form.formik.isSubmitting} />
    </SchemaFormView>
  );
}
