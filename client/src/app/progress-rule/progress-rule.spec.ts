import { TestBed } from '@angular/core/testing';
import { expect, it } from 'vitest';
import { ProgressRule } from './progress-rule';

// Fourteen fields, as drawn; the field in hand shows that something is left to do.
it.each([
  { done: 0, of: 118, solid: 0, inHand: 0 },
  { done: 1, of: 118, solid: 0, inHand: 1 },
  { done: 63, of: 126, solid: 7, inHand: 1 },
  { done: 117, of: 118, solid: 13, inHand: 1 },
  { done: 118, of: 118, solid: 14, inHand: 0 },
  { done: 0, of: 0, solid: 0, inHand: 0 },
])('rules $done of $of as $solid solid fields and $inHand in hand', async ({ done, of, solid, inHand }) => {
  const fixture = TestBed.createComponent(ProgressRule);
  fixture.componentRef.setInput('done', done);
  fixture.componentRef.setInput('of', of);
  await fixture.whenStable();

  const rule = fixture.nativeElement as HTMLElement;
  expect(rule.querySelectorAll('.done')).toHaveLength(solid);
  expect(rule.querySelectorAll('.in-hand')).toHaveLength(inHand);
  expect(rule.getAttribute('aria-valuetext')).toBe(`${done} of ${of}`);
});
