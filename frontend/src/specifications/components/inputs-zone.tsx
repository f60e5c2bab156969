import { memo } from 'react';
import { ConfigProvider, Form } from 'antd';
import { useForm } from '../hooks/form-context';
import { fieldPath } from '../model/faults';
import { valueAt } from '../model/form';
import { useCatalogue } from '../queries/use-catalogue';
import { ChoiceAt, DateAt, NumberAt } from './fields-at';
import { MechanicalGroup } from './mechanical-group';
import { InsulatorAt, LevelAt, ParallelStringsAt, FrequencyAt } from './looked-up-fields';
import { SharingFields } from './sharing-fields';

const CLOSE = { token: { controlHeight: 28 } };

/** What is known: system, site, string, clearances. Only fields that mean something for the choices made are shown. */
export const InputsZone = memo(function InputsZone() {
  return (
    <section className="zone zone-inputs" aria-label="Inputs">
      <ConfigProvider theme={CLOSE}>
        <Form component={false}>
          <OtherFaults />
          <SystemGroup />
          <SiteGroup />
          <StringGroup />
          <MechanicalGroup />
          <ClearanceGroup />
        </Form>
      </ConfigProvider>
    </section>
  );
});

/** Faults that no field on the page claims are still said. */
function OtherFaults() {
  const { faults } = useForm();
  const unclaimed = faults.filter(({ path }) =>
    /^$|^(input\.)?(mechanical(\.cases(\[\d+\])?)?$|towerHead|midSpan|bay|kind)/.test(fieldPath(path)),
  );
  if (unclaimed.length === 0) return null;
  return (
    <ul className="other-faults" role="alert">
      {unclaimed.map(({ path, message }) => (
        <li key={path + message}>{message}</li>
      ))}
    </ul>
  );
}

function SystemGroup() {
  const { basis } = useForm();
  return (
    <>
      <h2>System {basis && <span>{`from basis ${basis.number} rev ${basis.revision}`}</span>}</h2>
      <ChoiceAt path="basis" />
      <NumberAt path="system.nominalVoltageKv" />
      <NumberAt path="system.highestVoltageKv" />
      <FrequencyAt />
      <ChoiceAt path="system.neutralEarthing" />
      <ChoiceAt path="system.earthFault" />
      <LevelAt />
      <NumberAt path="system.overvoltages.slowFrontPhaseToEarthKvPeak" />
      <NumberAt path="system.overvoltages.slowFrontPhaseToPhaseKvPeak" />
      <NumberAt path="system.faultCurrentKa" />
      <NumberAt path="system.faultDurationS" />
    </>
  );
}

function SiteGroup() {
  const { values } = useForm();
  return (
    <>
      <h2>Site</h2>
      <NumberAt path="site.altitudeM" />
      <ChoiceAt path="site.pollution.class" />
      <ChoiceAt path="site.pollution.type" />
      <ChoiceAt path="site.pollution.contamination" />
      {valueAt(values, 'basis') === null && (
        <p className="zone-note">Choose the basis first: it decides by which scale pollution is told.</p>
      )}
      <ChoiceAt path="site.pollution.basis" />
      <DateAt path="site.pollution.recheckBy" />
    </>
  );
}

function StringGroup() {
  const { values } = useForm();
  const { data: units } = useCatalogue();
  if (valueAt(values, 'kind') === 'bay') return null;
  return (
    <>
      <h2>String {units && <span>{`${units.length} units in the catalogue`}</span>}</h2>
      <InsulatorAt />
      <ChoiceAt path="string.arrangement" />
      <NumberAt path="string.vAngleWindwardDeg" />
      <NumberAt path="string.vAngleLeewardDeg" />
      <NumberAt path="string.postAngleDeg" note="0 stands out from the pole, 90 stands upright" />
      <ParallelStringsAt />
      <NumberAt path="string.rodsInSeries" />
      <ChoiceAt path="string.surroundings" />
      <NumberAt path="string.spareUnits" />
      <ChoiceAt path="string.arcingDevices" />
      <NumberAt path="string.arcGapMm" />
      <NumberAt path="string.hardwareLengthMm" />
      <SharingFields />
    </>
  );
}

function ClearanceGroup() {
  return (
    <>
      <h2>Clearances</h2>
      <ChoiceAt path="clearance.method" />
      <ChoiceAt path="clearance.shapePhaseToEarth" />
      <ChoiceAt path="clearance.shapePhaseToPhase" />
      <ChoiceAt path="clearance.fastFrontFrom" />
      <ChoiceAt path="clearance.enGap" />
      <NumberAt path="clearance.externalClearanceMm" />
      <ChoiceAt path="clearance.safetySource" />
    </>
  );
}
