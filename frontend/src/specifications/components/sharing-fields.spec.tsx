import type { InsulatorUnit, SpecificationInput } from '@bellgap/common/api';
import { compositeUnit, discUnit } from '@bellgap/common/drawing/fixtures';
import { fireEvent, render, screen } from '@testing-library/react';
import { Form } from 'antd';
import { FormContext } from '../hooks/form-context';
import { useSpecificationForm } from '../hooks/use-specification-form';
import { inputOf } from '../model/form';
import { aRevision } from '../testing/fake-server';
import { SharingFields } from './sharing-fields';

let held: SpecificationInput['string'];
const FIRST = aRevision();

function Fields({ unit = discUnit(), faults = [] as { path: string; message: string }[] }) {
  const form = useSpecificationForm(FIRST, null);
  held = inputOf(form.values, unit as InsulatorUnit).string;
  const rest = { basis: null, unit, readOnly: false, faults, marks: [], leave: () => undefined };
  return (
    <FormContext value={{ ...form, ...rest }}>
      <Form component={false}>
        <SharingFields />
      </Form>
    </FormContext>
  );
}

describe('capacitances of the voltage sharing', () => {
  it('are folded away and left out until one is entered', () => {
    render(<Fields />);
    const fold = screen.getByRole('group');
    expect(fold).not.toHaveAttribute('open');
    expect(fold).toHaveTextContent('Voltage sharing usual capacitances');
    expect(held).not.toHaveProperty('sharing');
    fireEvent.change(screen.getByLabelText(/^Pin to earth/), { target: { value: '0.15' } });
    expect(held?.sharing).toEqual({ pinToEarthRatio: 0.15, pinToLineRatio: null });
    expect(fold).toHaveTextContent('capacitances entered');
  });

  it('stand open where one of them cannot be read', () => {
    const faults = [{ path: 'input.string.sharing.pinToLineRatio', message: 'must be at most 1' }];
    render(<Fields faults={faults} />);
    expect(screen.getByRole('group')).toHaveAttribute('open');
    expect(screen.getByText('must be at most 1')).toBeInTheDocument();
  });

  it('are not asked of a rod', () => {
    const { container } = render(<Fields unit={compositeUnit()} />);
    expect(container).toBeEmptyDOMElement();
    expect(held).not.toHaveProperty('sharing');
  });
});
