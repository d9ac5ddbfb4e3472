/** Longer than this, a name is cut: a car file keeps many beside each other. */
const mostOfSource = 60;

/**
 * The name of a working's PDF, of safe characters only: the working, what it was begun from without its edition,
 * and the car that it is kept with. `tightening-plan-at18-head-nuts.pdf`.
 */
export function fileName(key: string, begunFrom: string, carCode?: string): string {
  const source = begunFrom
    .normalize('NFKD')
    .replaceAll(/\p{M}/gu, '')
    .toLowerCase()
    .replaceAll(/\bedition \d+/g, '')
    .replaceAll(/[^a-z0-9]+/g, '-')
    .slice(0, mostOfSource)
    .replaceAll(/^-|-$/g, '');
  const car = carCode?.replaceAll(/[^A-Za-z0-9-]/g, '_');
  return `${[key, source, car].filter(Boolean).join('-')}.pdf`;
}
