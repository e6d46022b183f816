// @vitest-environment jsdom
import { cleanup, fireEvent, render, screen } from '@testing-library/react';
import { afterEach, describe, expect, it, vi } from 'vitest';
import { Button } from '@/components/ui/button';
import { DataTable } from '@/components/ui/data-table';
import { Field } from '@/components/ui/field';
import { NumberInput } from '@/components/ui/number-input';
import { RadioGroup } from '@/components/ui/radio-group';

afterEach(cleanup);

const described = (element: HTMLElement) =>
  (element.getAttribute('aria-describedby') ?? '')
    .split(' ')
    .filter(Boolean)
    .map((id) => document.getElementById(id)?.textContent);

describe('a field', () => {
  it('reads out its unit, hint and error with the control, and marks it as invalid', () => {
    render(
      <Field label="Row spacing" unit="in" hint="From row to row." error="It must be more than 0.">
        {(wiring) => <NumberInput {...wiring} />}
      </Field>,
    );
    const input = screen.getByLabelText('Row spacing, in');
    expect(described(input)).toEqual(['From row to row.', 'It must be more than 0.']);
    expect(input.getAttribute('aria-invalid')).toBe('true');
  });

  it('points at nothing when there is neither hint nor error', () => {
    render(<Field label="Name">{(wiring) => <NumberInput {...wiring} />}</Field>);
    expect(screen.getByLabelText('Name').hasAttribute('aria-describedby')).toBe(false);
  });

  it('keeps a reading that is no plain number as it was typed', () => {
    render(<Field label="Length">{(wiring) => <NumberInput {...wiring} />}</Field>);
    const input = screen.getByLabelText<HTMLInputElement>('Length');
    fireEvent.change(input, { target: { value: '17 ft 5 1/4 in' } });
    expect(input.value).toBe('17 ft 5 1/4 in');
    expect(input.inputMode).toBe('decimal');
  });
});

describe('a group of choices', () => {
  it('names the group and reads out its error', () => {
    render(
      <RadioGroup
        legend="The far end is"
        name="end"
        error="Choose one."
        options={[
          { value: 'mark', label: 'A mark' },
          { value: 'plant', label: 'A plant' },
        ]}
      />,
    );
    expect(described(screen.getByRole('group', { name: 'The far end is' }))).toEqual(['Choose one.']);
    expect(screen.getAllByRole('radio')).toHaveLength(2);
  });
});

describe('a button', () => {
  it('cannot be pressed twice while pending, and keeps the focus and its own words in place', () => {
    const pressed = vi.fn();
    render(
      <Button pending pendingText="Saving" onClick={pressed}>
        Keep
      </Button>,
    );
    const button = screen.getByRole('button');
    button.focus();
    fireEvent.click(button);
    expect(pressed).not.toHaveBeenCalled();
    expect(document.activeElement).toBe(button);
    expect(button.textContent).toBe('KeepSaving');
  });

  it('does not send its form again while pending', () => {
    const sent = vi.fn((event: { preventDefault: () => void }) => event.preventDefault());
    render(
      <form onSubmit={sent}>
        <Button type="submit" pending>
          Keep
        </Button>
      </form>,
    );
    fireEvent.click(screen.getByRole('button'));
    expect(sent).not.toHaveBeenCalled();
  });
});

describe('a table', () => {
  it('says which column it is sorted by, and turns the order at the second press', () => {
    render(
      <DataTable
        caption="Strips"
        emptyText="No strip yet."
        columns={[
          { key: 'name', head: 'Strip' },
          { key: 'plants', head: 'Plants', align: 'number' },
        ]}
        rows={[
          { id: '1', cells: { name: { text: 'One' }, plants: { text: '9', sort: 9 } } },
          { id: '2', cells: { name: { text: 'Two' }, plants: { text: '31', sort: 31 } } },
        ]}
      />,
    );
    const head = screen.getByRole('columnheader', { name: 'Plants' });
    const names = () => screen.getAllByRole('rowheader').map((cell) => cell.textContent);
    expect(head.hasAttribute('aria-sort')).toBe(false);
    fireEvent.click(screen.getByRole('button', { name: 'Plants' }));
    expect(head.getAttribute('aria-sort')).toBe('ascending');
    fireEvent.click(screen.getByRole('button', { name: 'Plants' }));
    expect(head.getAttribute('aria-sort')).toBe('descending');
    expect(names()).toEqual(['Two', 'One']);
  });

  it('says so when it has no rows', () => {
    render(
      <DataTable caption="Strips" emptyText="No strip yet." columns={[{ key: 'a', head: 'A' }]} rows={[]} />,
    );
    expect(screen.getByText('No strip yet.')).toBeTruthy();
  });
});
