import { screen } from '@testing-library/react';
import { useState } from 'react';
import { describe, expect, it } from 'vitest';
import { renderAt } from '#web/testing/render-at.tsx';
import { Dialog } from './dialog.tsx';

function Page() {
  const [open, setOpen] = useState(false);
  return (
    <>
      <button type="button" onClick={() => setOpen(true)}>
        Withdraw
      </button>
      <Dialog open={open} onClose={() => setOpen(false)} title="Withdraw order No. 2421?">
        <button type="button" onClick={() => setOpen(false)}>
          Keep my order
        </button>
      </Dialog>
    </>
  );
}

describe('Dialog', () => {
  it('is a named modal that closes by its own actions and by its cross', async () => {
    const { user } = renderAt('/', <Page />);
    expect(screen.queryByRole('dialog')).not.toBeInTheDocument();

    await user.click(screen.getByRole('button', { name: 'Withdraw' }));
    expect(screen.getByRole('dialog', { name: 'Withdraw order No. 2421?' })).toBeVisible();
    await user.click(screen.getByRole('button', { name: 'Keep my order' }));
    expect(screen.queryByRole('dialog')).not.toBeInTheDocument();

    await user.click(screen.getByRole('button', { name: 'Withdraw' }));
    await user.click(screen.getByRole('button', { name: 'Close' }));
    expect(screen.queryByRole('dialog')).not.toBeInTheDocument();
  });

  it('asks its owner when Escape cancels it', async () => {
    const { user } = renderAt('/', <Page />);
    await user.click(screen.getByRole('button', { name: 'Withdraw' }));
    // What the browser sends for Escape.
    screen.getByRole('dialog').dispatchEvent(new Event('cancel', { cancelable: true }));
    expect(await screen.findByRole('button', { name: 'Withdraw' })).toBeVisible();
    expect(screen.queryByRole('dialog')).not.toBeInTheDocument();
  });
});
