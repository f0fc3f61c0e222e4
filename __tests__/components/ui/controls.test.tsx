import { fireEvent, render, screen } from '@testing-library/react';
import { useState } from 'react';

import { Button } from '@/components/ui/button';
import { Checkbox } from '@/components/ui/checkbox';
import { Mark } from '@/components/ui/mark';
import { Progress } from '@/components/ui/progress';
import { Segmented } from '@/components/ui/segmented';
import { Select } from '@/components/ui/select';
import { TextField } from '@/components/ui/text-field';

describe('Button', () => {
  it('does what it says, but not twice while it is at work', () => {
    const press = jest.fn();
    const { rerender } = render(<Button label="Freeze" onPress={press} />);
    fireEvent.click(screen.getByRole('button', { name: 'Freeze' }));
    rerender(<Button label="Freeze" busyLabel="Freezing" onPress={press} busy />);
    const button = screen.getByRole('button', { name: 'Freezing' });
    button.focus();
    fireEvent.click(button);
    expect(press).toHaveBeenCalledTimes(1);
    expect(document.activeElement).toBe(button);
    expect(button.getAttribute('aria-busy')).toBe('true');
  });
});

describe('TextField', () => {
  it('is found by its label, and ties hint, unit and problem to it', () => {
    render(
      <TextField
        label="Length"
        hint="Along the centre line"
        problem="Must be more than 0 m"
        unit="m"
        value="0"
        onChange={() => undefined}
      />,
    );
    const field = screen.getByLabelText('Length');
    const words = field.getAttribute('aria-describedby')?.split(' ') ?? [];
    expect(words.map((id) => document.getElementById(id)?.textContent)).toEqual([
      'm',
      'Along the centre line',
      'Must be more than 0 m',
    ]);
    expect(field.getAttribute('aria-invalid')).toBe('true');
    expect(screen.getByRole('alert').textContent).toBe('Must be more than 0 m');
  });

  it('gives what was typed, on one line or several', () => {
    const change = jest.fn();
    const { rerender } = render(<TextField label="Note" value="" onChange={change} />);
    fireEvent.change(screen.getByLabelText('Note'), { target: { value: 'valve' } });
    rerender(<TextField label="Note" multiline={3} value="" onChange={change} />);
    fireEvent.change(screen.getByLabelText('Note'), { target: { value: 'valve\npit' } });
    expect(change.mock.calls).toEqual([['valve'], ['valve\npit']]);
  });
});

describe('Select', () => {
  const options = [
    { value: 'steam', label: 'Steam', group: 'Hot' },
    { value: 'chilled', label: 'Chilled water', group: 'Cold' },
  ];
  it('offers its options under their groups and gives the value chosen', () => {
    const change = jest.fn();
    render(<Select label="Service" value="" options={options} onChange={change} />);
    expect(screen.getByRole('group', { name: 'Cold' }).textContent).toBe('Chilled water');
    fireEvent.change(screen.getByRole('combobox', { name: 'Service' }), { target: { value: 'chilled' } });
    expect(change).toHaveBeenCalledWith('chilled');
  });
  it('cannot go back to nothing once something is chosen', () => {
    render(<Select label="Service" value="steam" options={options} onChange={() => undefined} />);
    expect(screen.getAllByRole('option').map(({ textContent }) => textContent)).toEqual(['Steam', 'Chilled water']);
  });
});

describe('Checkbox', () => {
  it('is turned by its words as well', () => {
    const change = jest.fn();
    render(<Checkbox label="Outdoors" checked={false} onChange={change} />);
    fireEvent.click(screen.getByText('Outdoors'));
    expect(change).toHaveBeenCalledWith(true);
    expect(screen.getByRole('checkbox', { name: 'Outdoors' })).toBeTruthy();
  });
});

function Looks() {
  const [value, setValue] = useState('light');
  const segments = ['auto', 'light', 'night'].map((one) => ({ value: one, label: one }));
  return <Segmented label="Appearance" value={value} segments={segments} onChange={setValue} />;
}

describe('Segmented', () => {
  it('is one stop for Tab, and arrows walk round and choose', () => {
    render(<Looks />);
    const group = screen.getByRole('radiogroup', { name: 'Appearance' });
    const chosen = () => screen.getByRole('radio', { checked: true });
    expect(screen.getAllByRole('radio').filter(({ tabIndex }) => tabIndex === 0)).toEqual([chosen()]);
    fireEvent.keyDown(group, { key: 'ArrowRight' });
    expect(chosen().textContent).toBe('night');
    expect(document.activeElement).toBe(chosen());
    fireEvent.keyDown(group, { key: 'ArrowDown' });
    expect(chosen().textContent).toBe('auto');
    fireEvent.keyDown(group, { key: 'ArrowLeft' });
    expect(chosen().textContent).toBe('night');
  });
});

describe('Mark', () => {
  it.each([
    ['pass', '✓'],
    ['caution', '!'],
    ['fail', '✗'],
    ['none', '–'],
  ] as const)('tells %s by a sign and words, of which the words are read', (verdict, sign) => {
    const { container } = render(<Mark verdict={verdict} words="touch, code" />);
    expect(container.textContent).toBe(`${sign}\u00a0touch, code`);
    expect(container.querySelector('[aria-hidden="true"]')?.textContent).toBe(`${sign}\u00a0`);
  });
});

describe('Progress', () => {
  it('says how far it is, or that nobody knows', () => {
    const { rerender } = render(<Progress label="Rendering" done={0.3} words="12 of 40 pages" />);
    const bar = () => screen.getByRole('progressbar', { name: 'Rendering' });
    expect(bar().getAttribute('aria-valuenow')).toBe('30');
    expect(bar().getAttribute('aria-valuetext')).toBe('12 of 40 pages');
    rerender(<Progress label="Rendering" />);
    expect(bar().hasAttribute('aria-valuenow')).toBe(false);
  });
});
