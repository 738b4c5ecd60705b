import { screen } from '@testing-library/react';
import { useForm } from 'react-hook-form';
import { describe, expect, it } from 'vitest';
import { renderAt } from '#web/testing/render-at.tsx';
import { Button } from './button.tsx';
import { FormProblems, errorOf } from './form-problems.tsx';
import { TextField } from './text-field.tsx';

function Form() {
  const form = useForm({
    defaultValues: { you: { name: '', email: 'tess' } },
    shouldFocusError: false,
  });
  const { errors } = form.formState;
  return (
    <form noValidate onSubmit={(event) => void form.handleSubmit(() => undefined)(event)}>
      <FormProblems form={form} failure={null} />
      <TextField
        {...form.register('you.name', { required: 'Tell us your name.' })}
        label="Name"
        error={errorOf(errors, 'you.name')}
      />
      <TextField
        {...form.register('you.email', {
          pattern: { value: /@/, message: 'Write the address like name@example.com.' },
        })}
        label="E-mail"
        hint="We answer there."
        error={errorOf(errors, 'you.email')}
      />
      <Button type="submit">Send</Button>
    </form>
  );
}

describe('a form with something to look at again', () => {
  it('moves the focus to a summary that links to each field, keeping what was typed', async () => {
    const { user } = renderAt('/', <Form />);
    await user.click(screen.getByRole('button', { name: 'Send' }));

    const summary = await screen.findByRole('alert');
    expect(summary).toHaveFocus();
    expect(summary).toHaveTextContent('Tell us your name.');

    await user.click(
      screen.getByRole('link', { name: 'Write the address like name@example.com.' }),
    );
    const email = screen.getByLabelText('E-mail');
    expect(email).toHaveFocus();
    expect(email).toHaveValue('tess');
    expect(email).toBeInvalid();
    expect(email).toHaveAccessibleDescription(
      'We answer there. Write the address like name@example.com.',
    );
  });

  it('lets a corrected field go without stealing the focus back', async () => {
    const { user } = renderAt('/', <Form />);
    await user.click(screen.getByRole('button', { name: 'Send' }));
    await user.type(screen.getByLabelText('Name'), 'Tess');
    expect(screen.getByLabelText('Name')).toHaveFocus();
    expect(screen.queryByRole('link', { name: 'Tell us your name.' })).not.toBeInTheDocument();
  });
});
