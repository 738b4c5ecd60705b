import { describe, expect, it } from 'vitest';
import { emptyOrder } from '../draft/empty-order.ts';
import { allowedStep, firstUnfinishedStep, issuesOfStep, stepOfPath } from './check-step.ts';
import { answered } from '../testing/answered.ts';

describe('what a step still needs', () => {
  it('names every missing answer of the day in words of its own', () => {
    const paths = issuesOfStep('day', emptyOrder()).map((issue) => issue.path);
    expect(paths).toEqual(['day.headCount', 'day.occasionId', 'day.date', 'day.windowStart']);
    expect(issuesOfStep('day', emptyOrder())[0]?.message).toContain('whole number');
  });

  it('asks for a coat where it goes, whatever else is missing', () => {
    const values = emptyOrder();
    expect(issuesOfStep('setting', values).map((issue) => issue.path)).toContain('cake.coating');
    expect(issuesOfStep('cake', values).map((issue) => issue.path)).toEqual(['cake.tiers']);
  });

  it('asks for the consent to allergy data only when an allergy is declared', () => {
    const values = answered();
    values.consents.allergyData = false;
    expect(issuesOfStep('you', values)).toEqual([]);
    values.day.allergies = [
      { allergen: 'egg', species: null, text: '', severity: 'allergy', guests: 1 },
    ];
    expect(issuesOfStep('you', values).map((issue) => issue.path)).toEqual([
      'consents.allergyData',
    ]);
  });

  it('has nothing left to ask of a finished order', () => {
    expect(firstUnfinishedStep(answered())).toBeNull();
    expect(allowedStep('check', answered())).toBe('check');
  });

  it('allows going back anywhere and forward as far as the answers go', () => {
    const values = answered();
    values.cake.coating = null;
    expect(firstUnfinishedStep(values)).toBe('setting');
    expect(allowedStep('day', values)).toBe('day');
    expect(allowedStep('check', values)).toBe('setting');
  });

  it('knows which step asks for each part of the form', () => {
    expect(stepOfPath('cake.tiers.1.coating.style')).toBe('setting');
    expect(stepOfPath('cake.tiers.1.widthMm')).toBe('cake');
    expect(stepOfPath('consents.policies')).toBe('you');
    expect(stepOfPath('extras.0.quantity')).toBe('look');
    expect(stepOfPath('seenTotalMinor')).toBe('check');
  });
});
