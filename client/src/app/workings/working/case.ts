import {
  begunFrom,
  type FieldSection,
  type Working,
  type WorkingAnswer,
  type WorkingCase,
} from '@second-spanner/shared/workings/working';

/** The texts of a case that the working has fields for, and what it was begun from; an address may hold anything. */
export function onlyOwn(working: Working, typed: WorkingCase): WorkingCase {
  const own = working.sections.flatMap(({ fields }) => fields.map(({ name }) => name));
  const names = new Set([begunFrom, ...own]);
  return Object.fromEntries(Object.entries(typed).filter(([name]) => names.has(name)));
}

/** The sections with the fields that are there, given the rest of the case. */
export function visibleSections(working: Working, typed: WorkingCase): readonly FieldSection[] {
  return working.sections
    .map(({ heading, fields }) => ({ heading, fields: fields.filter(({ when }) => when?.(typed) !== false) }))
    .filter(({ fields }) => fields.length > 0);
}

/** Whether two cases say the same; a field that is empty and one that is missing are one. */
export function isSameCase(a: WorkingCase, b: WorkingCase): boolean {
  return [...new Set([...Object.keys(a), ...Object.keys(b)])].every(
    (name) => (a[name] ?? '') === (b[name] ?? ''),
  );
}

/** Errors whose path is of no field that is shown: they are said beside the answer, so that none is lost. */
export function strayErrors(
  working: Working,
  typed: WorkingCase,
  { errors }: Pick<WorkingAnswer, 'errors'>,
): readonly string[] {
  const fields = visibleSections(working, typed).flatMap((section) => section.fields);
  const hasPlace = (path: string): boolean =>
    fields.some((field) => {
      if (field.kind !== 'rows') return field.name === path;
      const cells = field.columns.map(({ name }) => name);
      const [list, row, cell] = path.split('.');
      return (
        path === field.name || (list === field.name && /^\d+$/.test(row ?? '') && cells.includes(cell ?? ''))
      );
    });
  return Object.entries(errors)
    .filter(([path]) => !hasPlace(path))
    .map(([, message]) => message);
}
