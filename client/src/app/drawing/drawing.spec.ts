import { TestBed, type ComponentFixture } from '@angular/core/testing';
import type { Drawing } from '@second-spanner/shared/drawing/shapes';
import { beforeEach, describe, expect, it, vi } from 'vitest';
import { provideIcons } from '../layout/icons';
import { DrawingFigure } from './drawing';

const drawing: Drawing = {
  title: 'Head nuts',
  description: 'Two nuts <side by side>.',
  width: 100,
  height: 50,
  shapes: [
    { kind: 'circle', centre: { x: 10, y: 20 }, radius: 5, pen: 'outline', part: 'nut:1' },
    {
      kind: 'text',
      at: { x: 30, y: 20 },
      content: '<b>2</b>',
      size: 13,
      face: 'figures',
      weight: 500,
      anchor: 'middle',
      ink: 'ink',
      halo: false,
    },
  ],
  table: { columns: ['Nut', 'State'], rows: [['1', 'done']] },
};

describe('a drawing on the page', () => {
  let fixture: ComponentFixture<DrawingFigure>;
  let page: HTMLElement;

  beforeEach(async () => {
    TestBed.configureTestingModule({ providers: [provideIcons()] });
    fixture = TestBed.createComponent(DrawingFigure);
    fixture.componentRef.setInput('of', drawing);
    page = fixture.nativeElement as HTMLElement;
    await fixture.whenStable();
  });

  it('is drawn from its shapes, texts as texts', () => {
    expect(page.querySelector('svg circle')?.getAttribute('r')).toBe('5');
    expect(page.querySelector('svg text')?.textContent).toBe('<b>2</b>');
    expect(page.querySelector('svg b')).toBeNull();
  });

  it('is named and described, and says the same in a table', () => {
    const svg = page.querySelector('svg');
    const named = (svg?.getAttribute('aria-labelledby') ?? '').split(' ');
    expect(named.map((id) => page.querySelector(`#${id}`)?.textContent)).toEqual([
      'Head nuts',
      'Two nuts <side by side>.',
    ]);
    expect([...page.querySelectorAll('td')].map((cell) => cell.textContent)).toEqual(['1', 'done']);
  });

  it('says which part was touched', () => {
    const touched: string[] = [];
    fixture.componentInstance.touched.subscribe((part) => touched.push(part));
    page.querySelector('circle')?.dispatchEvent(new MouseEvent('click', { bubbles: true }));
    page.querySelector('text')?.dispatchEvent(new MouseEvent('click', { bubbles: true }));

    expect(touched).toEqual(['nut:1']);
  });

  it('is printed alone, and the page is whole again afterwards', () => {
    const print = vi.fn();
    vi.stubGlobal('print', print);
    page.querySelector<HTMLButtonElement>('button.print')?.click();

    expect(print).toHaveBeenCalledOnce();
    expect(document.body.dataset['print']).toBe('drawing');
    expect(page.classList.contains('print-alone')).toBe(true);

    dispatchEvent(new Event('afterprint'));
    expect(document.body.dataset['print']).toBeUndefined();
    expect(page.classList.contains('print-alone')).toBe(false);
    vi.unstubAllGlobals();
  });
});
