import type { SpecificationInput } from '@bellgap/common/api';
import { fireEvent, render, screen } from '@testing-library/react';
import { Form } from 'antd';
import { FormContext } from '../hooks/form-context';
import { useSpecificationForm } from '../hooks/use-specification-form';
import { inputOf } from '../model/form';
import { aRevision } from '../testing/fake-server';
import { MechanicalGroup } from './mechanical-group';

let held: SpecificationInput['mechanical'];
const FIRST = aRevision();

function Group({ readOnly = false }) {
  const form = useSpecificationForm(FIRST, null);
  held = inputOf(form.values, null).mechanical;
  const rest = { basis: null, unit: null, readOnly, faults: [], marks: [], leave: () => undefined };
  return (
    <FormContext value={{ ...form, ...rest }}>
      <Form component={false}>
        <MechanicalGroup />
      </Form>
    </FormContext>
  );
}

const write = (label: RegExp, text: string) =>
  fireEvent.change(screen.getByLabelText(label), { target: { value: text } });

describe('mechanical loads', () => {
  it('are left out, added with a case, taken case by case, and taken out again', () => {
    render(<Group />);
    expect(held).toBeUndefined();
    fireEvent.click(screen.getByText('Add loads'));
    write(/^Wind span/, '400');
    write(/^Wind pressure/, '600');
    write(/^Name/, 'Wind');
    expect(held).toMatchObject({ windSpanM: 400, cases: [{ name: 'Wind', windPressurePa: 600 }] });
    fireEvent.click(screen.getByText('Add a case'));
    expect(held?.cases).toHaveLength(2);
    fireEvent.click(screen.getByLabelText('Remove case 1'));
    expect(held?.cases).toMatchObject([{ name: null, windPressurePa: null }]);
    fireEvent.click(screen.getByText('take the loads out'));
    expect(held).toBeUndefined();
  });

  it('cannot be added by who only reads', () => {
    render(<Group readOnly />);
    expect(screen.queryByText('Add loads')).not.toBeInTheDocument();
    expect(screen.getByText('not filled in')).toBeInTheDocument();
  });
});
