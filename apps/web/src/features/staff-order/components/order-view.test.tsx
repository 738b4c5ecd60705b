import { screen, within } from '@testing-library/react';
import { describe, expect, it } from 'vitest';
import { menuFixture } from '#shared/kitchen/testing/menu-fixture.ts';
import { startApiServer } from '#web/testing/api-server.ts';
import { renderAt } from '#web/testing/render-at.tsx';
import { eggStop, nothingAllowed, staffOrderFixture } from '#web/testing/staff-order.ts';
import { OrderView } from './order-view.tsx';

startApiServer();

function show(order = staffOrderFixture()) {
  return renderAt('/staff/orders/2431', <OrderView order={order} menu={menuFixture} />);
}

const egg = {
  id: 'a1',
  allergen: 'egg',
  species: null,
  text: '',
  severity: 'allergy',
  guests: 1,
  answer: null,
};

const soyChange = {
  id: 'c1',
  at: '2027-06-01T14:00:00.000Z',
  changes: ['It contains soy now: in Vanilla sponge.'],
  cause: 'The label of Soft wheat flour',
  by: 'Noor Haddad',
  clashes: ['Contains soy: Vanilla sponge. Declared: allergy, 1 guest.'],
  mailAt: '2027-06-01T14:10:00.000Z',
  mailLate: false,
  acknowledged: null,
  told: null,
};

describe('the order’s page', () => {
  it('says what is in it now, against what it is, and until when nobody may hand it over', () => {
    show(staffOrderFixture({ contentChanges: [soyChange] }));
    const block = screen.getByRole('region', { name: 'What is in it has changed' });
    expect(block).toHaveTextContent('The label of Soft wheat flour, changed by Noor Haddad');
    expect(block).toHaveTextContent('Against what guests told:Contains soy: Vanilla sponge.');
    expect(block).toHaveTextContent('neither marked ready nor handed over. Our e-mail goes out');
    expect(block).toHaveTextContent('No baker has seen to it yet.');
  });

  it('offers nothing that the server does not allow', () => {
    show(staffOrderFixture({ allergies: [egg], blockers: [eggStop] }));
    const actions = screen.queryAllByRole('button');
    expect(actions).toEqual([]);
    expect(screen.getByText(/nothing left to do/)).toBeVisible();
  });

  it.each([
    ['confirm', 'Confirm'],
    ['decline', 'Decline'],
    ['move', 'Move the pickup'],
    ['start', 'Start making it'],
    ['ready', 'Mark ready'],
    ['collect', 'Hand over'],
    ['uncollected', 'Not collected'],
    ['write', 'Send the message'],
    ['renewLink', 'Renew the private link'],
    ['addPhotos', 'Add a photo'],
    ['answerAllergy', 'Record the talk'],
    ['liftStop', 'Take it all the same'],
    ['tellContents', 'I have told them'],
    ['acknowledgeContents', 'Say what you do about it'],
  ] as const)('offers %s alone where only that is allowed', (right, name) => {
    show(
      staffOrderFixture({
        allergies: [egg],
        blockers: [eggStop],
        contentChanges: [soyChange],
        can: { ...nothingAllowed, [right]: true },
      }),
    );
    expect(screen.getAllByRole('button').map((it) => it.textContent)).toEqual([name]);
  });

  it('offers to record a talk about heat to whoever may, and says where an allergy’s is kept', () => {
    const can = { ...nothingAllowed, recordTalk: true, liftStop: true };
    const sun = {
      ...eggStop,
      code: 'sun',
      about: 'sun:buttercream-swiss',
      waitsFor: 'talk',
    } as const;
    show(
      staffOrderFixture({
        can,
        allergies: [egg],
        blockers: [
          { ...eggStop, waitsFor: 'talk' },
          { ...sun, plain: 'Stands in direct sun.' },
          { ...eggStop, about: 'allergen:milk', plain: 'Contains milk.', waitsFor: 'nothing' },
        ],
      }),
    );
    expect(screen.getAllByRole('button').map((it) => it.textContent)).toEqual(['Record the talk']);
    expect(screen.getByText(/record it at the allergy/)).toBeVisible();
    expect(screen.getByText(/No reason lifts this/)).toBeVisible();
  });

  it('shows a lifted stop with its reason, and whether the customer has accepted it', () => {
    const lifted = {
      id: 'l1',
      code: 'allergen',
      about: eggStop.about,
      sentence: eggStop.sentence,
      plain: eggStop.plain,
      reason: 'She brings her own dessert.',
      by: 'Ida Thorne',
      at: '2027-06-10T14:00:00.000Z',
      acceptedAt: null,
    };
    show(
      staffOrderFixture({
        allergies: [egg],
        blockers: [{ ...eggStop, waitsFor: 'customer' }],
        lifted: [lifted],
      }),
    );
    const block = screen.getByRole('region', { name: 'Allergies at the table' });
    expect(within(block).getAllByText(eggStop.plain)).toHaveLength(1);
    expect(within(block).getByText(/She brings her own dessert/)).toBeVisible();
    expect(within(block).getByText(/has not read and accepted it yet/)).toBeVisible();
  });

  it('puts the allergies before the cake, with what was settled', () => {
    show(
      staffOrderFixture({
        allergies: [
          {
            ...egg,
            answer: {
              text: 'They bring a cake of their own.',
              by: 'Ida Thorne',
              at: '2027-06-10T14:00:00.000Z',
            },
          },
        ],
      }),
    );
    const headings = screen.getAllByRole('heading', { level: 2 }).map((it) => it.textContent);
    expect(headings[0]).toBe('Allergies at the table');
    const block = screen.getByRole('region', { name: 'Allergies at the table' });
    expect(within(block).getByText('Egg: allergy, 1 guest')).toBeVisible();
    expect(within(block).getByText(/They bring a cake of their own/)).toBeVisible();
    expect(within(block).getByText(/Thursday 10 June, 10:00/)).toBeVisible();
  });

  it('unfolds the talk’s form into focus, and folds it up to where it was', async () => {
    const { user } = show(
      staffOrderFixture({ allergies: [egg], can: { ...nothingAllowed, answerAllergy: true } }),
    );
    await user.click(screen.getByRole('button', { name: 'Record the talk' }));
    expect(screen.getByRole('textbox', { name: 'What was said and settled' })).toHaveFocus();
    await user.click(screen.getByRole('button', { name: 'Not yet' }));
    expect(screen.getByRole('button', { name: 'Record the talk' })).toHaveFocus();
  });
});
