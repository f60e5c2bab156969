import { contract, type IssuedSheet } from '@bellgap/common/api';
import { CHOICE_LABELS } from '@bellgap/common/schemas';
import { useQuery, useQueryClient } from '@tanstack/react-query';
import { Alert, Button, Modal } from 'antd';
import { useState } from 'react';
import { Link, useNavigate, useParams } from 'react-router-dom';
import { addressOf } from '../../api/client';
import { keyOf, queryOf } from '../../api/queries';
import { maySeeDrafts, mayWriteDrafts, usePerson } from '../../api/session';
import { useForget } from '../../api/use-forget';
import { paths } from '../../app/paths';
import { figureText } from '../../ui/data-table/columns';
import { dayText } from '../../ui/days';
import { Facts } from '../../ui/facts';
import { Ledger } from '../../ui/ledger';
import { Moment } from '../../ui/moment';
import { Page } from '../../ui/page/page';
import { Sheet } from '../../ui/page/sheet';
import { severityText } from '../../ui/specification-rows/specification-columns';
import { EmptyState } from '../../ui/states/empty-state';
import { QueryState } from '../../ui/states/query-state';
import { zoneText } from '../../ui/time-zones';
import { IssuesSheet } from '../components/issues-sheet';
import { StandingHead } from '../components/standing-head';
import { TakenSheet } from '../components/taken-sheet';
import { WithdrawForm } from '../components/withdraw-form';
import '../components/issued-sheet.css';

const signed = ({ name, on }: IssuedSheet['drafted']) => (
  <>
    {name}, <span className="num">{dayText(on)}</span>
  </>
);

function Acts({ sheet, withdraw }: { sheet: IssuedSheet; withdraw: () => void }) {
  const navigate = useNavigate();
  const person = usePerson();
  const { id, projectCode, number, label, standing, mayWithdraw } = sheet;
  return (
    <>
      {maySeeDrafts(person) && (
        <Button onClick={() => void navigate(paths.trail.to({ project: projectCode, specification: number }))}>
          Trail
        </Button>
      )}
      {mayWriteDrafts(person) && standing === 'current' && (
        <Button onClick={() => void navigate(paths.specification.to(projectCode, number))}>Next revision</Button>
      )}
      {mayWithdraw && <Button onClick={withdraw}>Withdraw</Button>}
      <Button
        type="primary"
        href={addressOf(contract.issuedSheetFile, { params: { id } })}
        download={`${number}_${label}.pdf`}
      >
        Sheet as PDF
      </Button>
    </>
  );
}

function Figures({ sheet }: { sheet: IssuedSheet }) {
  const { units, insulatorCode, governedBy, highestVoltageKv, altitudeM, pollutionSeverity, worstMarginPercent } =
    sheet;
  const figure = (value: number | null, unit: string) =>
    value === null ? '—' : <span className="num">{`${figureText(value)} ${unit}`}</span>;
  return (
    <Facts
      facts={[
        ['Units', <span className="num">{units === null ? '—' : `${units} × ${insulatorCode ?? '—'}`}</span>],
        ['Governed by', (CHOICE_LABELS.criterion as Record<string, string>)[governedBy ?? ''] ?? '—'],
        ['Least margin', worstMarginPercent === null ? '—' : figure(Math.round(worstMarginPercent * 10) / 10, '%')],
        ['Um, line to line', figure(highestVoltageKv, 'kV')],
        ['Altitude', figure(altitudeM, 'm')],
        ['Pollution', severityText(pollutionSeverity) ?? '—'],
      ]}
    />
  );
}

function Codes({ sheet }: { sheet: IssuedSheet }) {
  const mono = (text: string) => <span className="num">{text}</span>;
  return (
    <Sheet title="Codes" note="as they stand on the print">
      <Ledger
        rows={[
          ['Content code', mono(sheet.contentCode)],
          [
            'Verification code',
            <Link to={paths.verify.to(sheet.verificationCode)} className="num">
              {sheet.verificationCode}
            </Link>,
          ],
          ['Pages', mono(String(sheet.pages))],
          ['Method edition', mono(sheet.methodEdition)],
          ['Last seal of the trail', sheet.lastSeal === null ? null : mono(sheet.lastSeal)],
          ['Hash of the file, SHA-256', mono(sheet.fileSha256)],
        ]}
      />
      <p className="issued-note">The file is held against its hash each time it is downloaded.</p>
    </Sheet>
  );
}

function Signatures({ sheet }: { sheet: IssuedSheet }) {
  return (
    <Sheet title="Signatures">
      <Ledger
        rows={[
          ['Drawn', signed(sheet.drafted)],
          ['Checked', signed(sheet.checked)],
          ['Approved', signed(sheet.approved)],
          ['Issued', <Moment at={sheet.issuedAt} />],
        ]}
      />
      <p className="issued-note">
        Days of signatures are those at the site, {zoneText(sheet.siteTimeZone)}; the hour of issue is yours.
      </p>
    </Sheet>
  );
}

function SheetView({ sheet }: { sheet: IssuedSheet }) {
  const client = useQueryClient();
  const forget = useForget();
  const [withdrawing, setWithdrawing] = useState(false);
  const withdrawn = async (now: IssuedSheet) => {
    await forget();
    client.setQueryData(keyOf(contract.issuedSheet, { params: { id: sheet.id } }), now);
    setWithdrawing(false);
  };
  return (
    <Page
      title={`${sheet.number} revision ${sheet.label}`}
      lead={sheet.title}
      crumbs={[
        { label: 'Sheets', to: paths.sheets.to() },
        { label: `${sheet.projectCode} ${sheet.projectTitle}`, to: paths.project.to(sheet.projectCode) },
      ]}
      acts={<Acts sheet={sheet} withdraw={() => setWithdrawing(true)} />}
    >
      <StandingHead sheet={sheet} />
      {sheet.cautions.length > 0 && (
        <Alert
          type="warning"
          showIcon
          className="issued-cautions"
          title="Come up since it was issued"
          description={sheet.cautions.map(({ code, text }) => (
            <p key={code + text}>{text}</p>
          ))}
        />
      )}
      <Figures sheet={sheet} />
      <div className="issued-columns">
        <Signatures sheet={sheet} />
        <Codes sheet={sheet} />
      </div>
      <TakenSheet concessions={sheet.concessionList} />
      <IssuesSheet sheet={sheet} />
      <Modal
        open={withdrawing}
        title={`Withdraw ${sheet.number} revision ${sheet.label}`}
        footer={null}
        destroyOnHidden
        onCancel={() => setWithdrawing(false)}
      >
        <WithdrawForm sheet={sheet} cancel={() => setWithdrawing(false)} withdrawn={withdrawn} />
      </Modal>
    </Page>
  );
}

export function IssuedSheetPage() {
  const { id = '' } = useParams();
  const query = useQuery(queryOf(contract.issuedSheet, { params: { id } }));
  return (
    <QueryState
      level={1}
      query={query}
      what="The sheet"
      missing={
        <EmptyState level={1} title="There is no issued sheet at this address">
          It may be one of a project that you do not know. Look for it in the{' '}
          <Link to={paths.sheets.to()}>register</Link>.
        </EmptyState>
      }
    >
      {(sheet) => <SheetView sheet={sheet} />}
    </QueryState>
  );
}
