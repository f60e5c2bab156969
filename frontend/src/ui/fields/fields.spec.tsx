import { fireEvent, render, screen } from '@testing-library/react';
import userEvent from '@testing-library/user-event';
import { useState } from 'react';
import { ChoiceField, DateField, NumberField } from './index';

const user = userEvent.setup({ delay: null, pointerEventsCheck: 0 });

function speakIn(language: string) {
  jest.spyOn(navigator, 'language', 'get').mockReturnValue(language);
}
afterEach(() => jest.restoreAllMocks());

interface Held {
  value: number | null;
  unread: string | undefined;
}
function Altitude({ start = null as number | null, onHeld = (_: Held) => {} }) {
  const [held, setHeld] = useState<Held>({ value: start, unread: undefined });
  return (
    <>
      <NumberField
        id="altitude"
        path="site.altitudeM"
        label="Altitude"
        unit="m"
        value={held.value}
        unread={held.unread}
        onChange={(_, value, unread) => {
          setHeld({ value, unread });
          onHeld({ value, unread });
        }}
      />
      <button onClick={() => setHeld({ value: 900, unread: undefined })}>back</button>
    </>
  );
}
const field = () => screen.getByLabelText(/Altitude/) as HTMLInputElement;

describe('number field', () => {
  it('keeps the text exactly as typed and gives the figure behind it', async () => {
    const onHeld = jest.fn();
    render(<Altitude onHeld={onHeld} />);
    await user.type(field(), '2.2250');
    expect(field().value).toBe('2.2250');
    expect(onHeld).toHaveBeenLastCalledWith({ value: 2.225, unread: undefined });
  });

  it('takes the decimal comma of the browser and shows stored figures with it', async () => {
    speakIn('de-DE');
    const onHeld = jest.fn();
    render(<Altitude start={2.5} onHeld={onHeld} />);
    expect(field().value).toBe('2,5');
    await user.clear(field());
    await user.type(field(), '12,4');
    expect(field().value).toBe('12,4');
    expect(onHeld).toHaveBeenLastCalledWith({ value: 12.4, unread: undefined });
  });

  it('keeps a text that cannot be read, says why on leaving, and leaves the figure alone', async () => {
    const onHeld = jest.fn();
    render(<Altitude start={900} onHeld={onHeld} />);
    await user.clear(field());
    await user.type(field(), '1,234');
    await user.tab();
    expect(field().value).toBe('1,234');
    expect(field()).toHaveAttribute('aria-invalid', 'true');
    expect(screen.getByText(/can mean 1234 or 1\.234/)).toBeInTheDocument();
    expect(onHeld).toHaveBeenLastCalledWith(expect.objectContaining({ unread: '1,234' }));
  });

  it('offers a foreign unit as a conversion and takes it only when accepted', async () => {
    const onHeld = jest.fn();
    render(<Altitude onHeld={onHeld} />);
    await user.type(field(), '4659 ft');
    expect(onHeld).toHaveBeenLastCalledWith(expect.objectContaining({ unread: '4659 ft' }));
    expect(screen.getByText(/4659 ft is 1420\.0632 m/)).toBeInTheDocument();
    await user.click(screen.getByText('Use 1420.0632 m'));
    expect(field().value).toBe('1420.0632');
    expect(onHeld).toHaveBeenLastCalledWith({ value: 1420.0632, unread: undefined });
  });

  it('does nothing on the wheel and on the arrow keys', async () => {
    const onHeld = jest.fn();
    render(<Altitude start={900} onHeld={onHeld} />);
    await user.click(field());
    fireEvent.wheel(field(), { deltaY: 100 });
    await user.keyboard('{ArrowUp}{ArrowDown}{PageUp}');
    expect(field().value).toBe('900');
    expect(field().type).toBe('text');
    expect(onHeld).not.toHaveBeenCalled();
  });

  it('follows the form when the figure is set from outside', async () => {
    render(<Altitude start={900} />);
    await user.clear(field());
    await user.type(field(), 'abc');
    await user.click(screen.getByText('back'));
    expect(field().value).toBe('900');
  });
});

describe('date field', () => {
  it('keeps an unfinished day and refuses one that does not exist', async () => {
    const onChange = jest.fn();
    render(<DateField id="day" path="d" label="Re-check by" value={null} unread="2027-02-30" onChange={onChange} />);
    expect(screen.getByLabelText('Re-check by')).toHaveValue('2027-02-30');
    expect(screen.getByText(/year-month-day, such as/)).toBeInTheDocument();
  });
});

describe('choice field', () => {
  it('preselects nothing and gives the value chosen', async () => {
    const onChange = jest.fn();
    const choices = [
      { value: 'a', label: 'a, very light' },
      { value: 'b', label: 'b, light' },
    ];
    render(
      <ChoiceField id="class" path="c" label="Pollution class" value={null} choices={choices} onChange={onChange} />,
    );
    expect(screen.getByText('choose')).toBeInTheDocument();
    await user.click(screen.getByLabelText('Pollution class'));
    await user.click(screen.getByText('b, light'));
    expect(onChange).toHaveBeenCalledWith('c', 'b');
  });
});
