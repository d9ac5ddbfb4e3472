import { ChangeDetectionStrategy, Component, computed, input } from '@angular/core';
import type { SpecEdition } from '@second-spanner/shared/contracts/spec';
import type { SpecRow } from '@second-spanner/shared/spec/spec-rows';
import { VerdictLine } from '../../verdict/verdict';

/** Beside the values: what the edition rests on, and which values have no source. */
@Component({
  selector: 'ss-edition-aside',
  imports: [VerdictLine],
  changeDetection: ChangeDetectionStrategy.OnPush,
  template: `
    <h2>Rests on</h2>
    <p>{{ spec().restsOn }}</p>
    <h2>Sources</h2>
    @if (withoutSource() === 0) {
      <ss-verdict of="pass" sentence="Every value has its source." />
    } @else {
      <ss-verdict of="doubtful" [sentence]="missing()" />
    }
    <p class="hash caption">
      Content hash <span class="f">{{ spec().hash }}</span>
    </p>
  `,
  styles: `
    h2 {
      margin: var(--ss-4) 0 6px;
      padding-bottom: 6px;
      font: var(--ss-t-strong);
      border-bottom: var(--ss-hair) solid var(--ss-rule);
    }

    p {
      font: var(--ss-t-small);
      color: var(--ss-ink-2);
    }

    .hash {
      margin-top: var(--ss-5);
      overflow-wrap: anywhere;
    }
  `,
})
export class EditionAside {
  readonly spec = input.required<SpecEdition>();
  readonly rows = input.required<readonly SpecRow[]>();

  protected readonly withoutSource = computed(
    () => this.rows().filter(({ source }) => source === undefined).length,
  );
  protected readonly missing = computed(() => {
    const count = this.withoutSource();
    return count === 1 ? '1 value has no source.' : `${count} values have no source.`;
  });
}
