import { contract, type FlashoverRisk, type FlashoverRiskInput } from '@bellgap/common/api';
import { flashoverRiskSchema } from '@bellgap/common/schemas';
import { useState } from 'react';
import { call } from '../../api/client';
import { paths } from '../../app/paths';
import { useSchemaForm } from '../../ui/forms/use-schema-form';
import { Page } from '../../ui/page/page';
import { Sheet } from '../../ui/page/sheet';
import { EmptyState } from '../../ui/states/empty-state';
import { LoadingState } from '../../ui/states/loading-state';
import { RiskAnswer } from '../components/risk-answer';
import { RiskForm } from '../components/risk-form';
import { BLANK, sameValues, type RiskValues } from '../model/form';
import './risk.css';

interface Answered {
  input: FlashoverRiskInput;
  values: RiskValues;
  risk: FlashoverRisk;
}

/** The risk that a surge flashes over one gap and many, for figures of one's own. */
export function RiskPage() {
  const [answered, setAnswered] = useState<Answered | null>(null);
  const form = useSchemaForm<RiskValues>({
    schema: flashoverRiskSchema,
    initialValues: BLANK,
    submit: async (body: FlashoverRiskInput, values) => {
      const risk = await call(contract.flashoverRisk, { body });
      setAnswered({ input: body, values, risk });
    },
  });
  const { isSubmitting, values } = form.formik;
  return (
    <Page
      title="Risk of flashover"
      crumbs={[{ label: 'Tables', to: paths.tables.to() }]}
      lead="How often a surge flashes over one gap, and many under the same surge; nothing is stored"
    >
      <div className="risk">
        <Sheet title="Surge and gaps">
          <RiskForm form={form} />
        </Sheet>
        <div>
          {answered ? (
            <RiskAnswer
              input={answered.input}
              risk={answered.risk}
              isEarlier={!isSubmitting && !sameValues(values, answered.values)}
            />
          ) : (
            <Sheet title="Risk for one surge">
              {isSubmitting ? (
                <LoadingState label="Working out the risk" />
              ) : (
                <EmptyState title="No risk has been worked out on this page">
                  Fill in the stress, by its mean and deviation, and the 50 % flashover voltage of one gap. The server
                  works out the risk of one gap and of many, by both tails.
                </EmptyState>
              )}
            </Sheet>
          )}
        </div>
      </div>
    </Page>
  );
}
