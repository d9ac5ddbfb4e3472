import type { SpecDocument } from '@second-spanner/shared/contracts/spec';

const spoken: Readonly<Record<string, string>> = {
  measured: 'measured parts',
  'common-practice': 'common practice',
};

/** What an edition rests on, in a line: the sources of its values, the most used first. */
export function restsOn(document: SpecDocument): string {
  const counts = new Map<string, number>();
  collect(document, counts);
  const names = [...counts].sort(([, a], [, b]) => b - a).map(([name]) => name);
  if (names.length === 0) return 'no source named';
  return names.slice(0, 3).join(', ') + (names.length > 3 ? ` and ${names.length - 3} more` : '');
}

function collect(node: unknown, counts: Map<string, number>): void {
  if (typeof node !== 'object' || node === null) return;
  for (const [key, child] of Object.entries(node) as [string, unknown][]) {
    if (key === 'source') count(child, counts);
    else collect(child, counts);
  }
}

function count(source: unknown, counts: Map<string, number>): void {
  if (typeof source !== 'object' || source === null || !('kind' in source)) return;
  const name = 'document' in source ? String(source.document) : spoken[String(source.kind)];
  if (name !== undefined) counts.set(name, (counts.get(name) ?? 0) + 1);
}
