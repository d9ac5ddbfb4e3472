import { httpResource } from '@angular/common/http';
import { computed, inject, type Signal } from '@angular/core';
import { toSignal } from '@angular/core/rxjs-interop';
import { ActivatedRoute } from '@angular/router';
import type { CarSummary } from '@second-spanner/shared/contracts/car-files';
import type { KeptWorking } from '@second-spanner/shared/contracts/kept-workings';
import { map } from 'rxjs';

/** In the address, beside the case: which kept working it is, as `car,working`. A changed case drops it. */
const keptName = 'kept';

export interface KeptCase {
  readonly title: string;
  readonly car: Pick<CarSummary, 'id' | 'name'>;
}

/** What opens a kept working: its case, and that it is kept. */
export const keptQuery = ({ id, carId, typed }: KeptWorking): Readonly<Record<string, string>> => ({
  ...typed,
  [keptName]: `${carId},${id}`,
});

/**
 * The kept working that the address opens, by the name that it was kept under; null for a case that is not kept or
 * not this person's to read. Call in an injection context.
 */
export function keptCase(): Signal<KeptCase | null> {
  const named = toSignal(
    inject(ActivatedRoute).queryParamMap.pipe(map((query) => query.get(keptName) ?? '')),
    {
      initialValue: '',
    },
  );
  const place = computed(() => {
    const [carId, id] = named().split(',');
    return carId && id && /^[\w-]+$/.test(carId) ? { carId, id } : null;
  });
  const file = (rest: string): string | undefined => {
    const at = place();
    return at === null ? undefined : `/api/cars/${at.carId}${rest}`;
  };
  const car = httpResource<CarSummary>(() => file(''));
  const kept = httpResource<{ readonly items: readonly KeptWorking[] }>(() => file('/workings'));
  return computed(() => {
    if (!car.hasValue() || !kept.hasValue()) return null;
    const found = kept.value().items.find(({ id }) => id === place()?.id);
    return found === undefined ? null : { title: found.title, car: car.value() };
  });
}
