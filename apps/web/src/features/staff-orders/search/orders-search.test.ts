import fc from 'fast-check';
import { describe, expect, test } from 'vitest';
import { orderStatuses } from '#shared/contracts/vocabulary.ts';
import { readOrdersSearch, sortedBy, withStatus, writeOrdersSearch } from './orders-search.ts';

const read = (search: string) => readOrdersSearch(new URLSearchParams(search));

describe('the address of the orders', () => {
  test('says what is found, filtered, sorted and which page', () => {
    expect(
      read(
        'find=osei&status=asked&status=ready&allergies=true&from=2027-06-01&sort=total&order=desc&page=3',
      ),
    ).toEqual({
      find: 'osei',
      status: ['asked', 'ready'],
      allergies: true,
      from: '2027-06-01',
      sort: 'total',
      order: 'desc',
      page: 3,
    });
  });

  test('leaves out what makes no sense and keeps the rest', () => {
    expect(
      read('find=osei&status=lost&from=2027-02-30&sort=colour&page=minus&perPage=9999'),
    ).toEqual({
      find: 'osei',
    });
  });

  test('reads a range that ends before it begins the other way round', () => {
    expect(read('from=2027-06-30&to=2027-06-01')).toEqual({ from: '2027-06-01', to: '2027-06-30' });
  });

  test('comes back the same from what it wrote', () => {
    const query = fc.record(
      {
        find: fc
          .string({ minLength: 1, maxLength: 100 })
          .map((it) => it.trim())
          .filter((it) => it !== ''),
        status: fc.subarray([...orderStatuses], { minLength: 1 }),
        from: fc.constant('2027-06-01'),
        to: fc.constant('2027-06-30'),
        allergies: fc.constant(true),
        sort: fc.constantFrom('pickup', 'number', 'status', 'customer', 'total', 'created'),
        order: fc.constantFrom('asc', 'desc'),
        page: fc.integer({ min: 2, max: 1000 }),
        perPage: fc.constantFrom(10, 50, 100),
      } as const,
      { requiredKeys: [] },
    );
    fc.assert(
      fc.property(query, (it) => {
        expect(read(writeOrdersSearch(it))).toEqual(it);
      }),
    );
  });
});

describe('changing what is shown', () => {
  test('a column sorts its useful way first, then turns round; the list starts at its first page', () => {
    const once = sortedBy({ page: 4 }, 'total');
    expect(once).toMatchObject({ sort: 'total', order: 'desc', page: undefined });
    expect(sortedBy(once, 'total')).toMatchObject({ order: 'asc' });
    expect(sortedBy(once, 'pickup')).toMatchObject({ sort: 'pickup', order: 'asc' });
  });

  test('the last status taken away shows all again', () => {
    const asked = withStatus({}, 'asked');
    expect(asked.status).toEqual(['asked']);
    expect(withStatus(asked, 'asked').status).toBeUndefined();
  });
});
