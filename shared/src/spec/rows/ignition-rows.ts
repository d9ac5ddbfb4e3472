import type { IgnitionSection } from '../../contracts/spec.js';
import { printLimits } from '../print-limits.js';
import { RowList, type SpecRow } from '../spec-row.js';

export function ignitionRows(ignition: IgnitionSection): readonly SpecRow[] {
  const angles = new Map(ignition.posts.value.map(({ post, angle }) => [post, `${angle}°`]));
  const byAngle = (post: string): string => angles.get(post) ?? post;
  return new RowList('ignition', 'ignition')
    .add({
      key: 'rotation',
      label: 'Rotor turns',
      sourced: ignition.rotation,
      print: (way) => (way === 'clockwise' ? way : '{anticlockwise}'),
    })
    .add({
      key: 'rotationSeenFrom',
      label: 'Rotor seen from the',
      sourced: ignition.rotationSeenFrom,
      print: String,
    })
    .add({
      key: 'posts',
      label: 'Posts, clockwise from the mark',
      sourced: ignition.posts,
      print: (posts) => posts.map(({ angle }) => `${angle}°`).join(', '),
    })
    .add({
      key: 'firstPost',
      label: 'Post for the first cylinder',
      sourced: ignition.firstPost,
      print: byAngle,
    })
    .add({
      key: 'trace',
      label: 'Cap traced, post to {outlet}',
      sourced: ignition.trace,
      print: (trace) =>
        Object.entries(trace)
          .map(([post, outlet]) => `${byAngle(post)} to ${outlet}`)
          .join(', '),
    })
    .add({
      key: 'outletsAt',
      label: '{Outlets} at the',
      sourced: ignition.outletsAt,
      print: String,
    })
    .add({
      key: 'staticTiming',
      label: 'Static timing',
      sourced: ignition.staticTiming,
      print: (degrees) => `${degrees}° before TDC`,
    })
    .add({ key: 'pointsGap', label: 'Points gap', sourced: ignition.pointsGap, print: printLimits })
    .add({ key: 'plugGap', label: 'Plug gap', sourced: ignition.plugGap, print: printLimits })
    .add({
      key: 'leadResistance',
      label: '{HT lead} resistance, each',
      sourced: ignition.leadResistance,
      print: printLimits,
    })
    .add({
      key: 'leadKind',
      label: '{HT leads}',
      sourced: ignition.leadKind,
      print: (kind) => (kind === 'resistive' ? kind : 'wire core'),
    })
    .add({
      key: 'coilPolarity',
      label: 'Polarity',
      sourced: ignition.coilPolarity,
      print: (polarity) => (polarity === 'positive-earth' ? 'positive {earth}' : 'negative {earth}'),
    }).rows;
}
