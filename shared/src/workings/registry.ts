import type { Working, WorkingGroup } from './working.js';

export interface WorkingEntry {
  readonly key: string;
  readonly group: WorkingGroup;
  readonly title: string;
  /** The question that it answers, as in the working, so that a list can say it before one is opened. */
  readonly asks: string;
  readonly load: () => Promise<Working>;
}

/** Every working, in the order of its page. Each is loaded when it is opened. */
export const workings: readonly WorkingEntry[] = [
  {
    key: 'wiring-map',
    group: 'wiring',
    title: 'Wiring map',
    asks: 'Which {lead} goes where on the cap, and if they are fitted already, what is wrong with them?',
    load: async () => (await import('./wiring-map/wiring-map.js')).wiringMapWorking,
  },
  {
    key: 'rotor-check',
    group: 'wiring',
    title: 'Rotor check',
    asks: 'Does the rotor point at the right post with the crank at the timing mark?',
    load: async () => (await import('./rotor-check.js')).rotorCheckWorking,
  },
  {
    key: 'lead-test',
    group: 'wiring',
    title: '{Lead} test',
    asks: 'Is this {HT lead} sound, by what the ohmmeter shows?',
    load: async () => (await import('./lead-test.js')).leadTestWorking,
  },
  {
    key: 'timing-marks',
    group: 'wiring',
    title: 'Timing marks',
    asks: 'How far along the pulley’s rim is a mark for this many degrees?',
    load: async () => (await import('./timing-marks.js')).timingMarksWorking,
  },
  {
    key: 'dwell',
    group: 'wiring',
    title: 'Dwell',
    asks: 'How long do the contact points stay closed and open at this dwell?',
    load: async () => (await import('./dwell.js')).dwellWorking,
  },
  {
    key: 'valve-clock',
    group: 'valve-timing',
    title: 'Valve clock',
    asks: 'What does every cylinder do at this crank angle?',
    load: async () => (await import('./valve-clock.js')).valveClockWorking,
  },
  {
    key: 'which-tdc',
    group: 'valve-timing',
    title: 'Which TDC',
    asks: 'Is this cylinder at compression or at exhaust TDC?',
    load: async () => (await import('./which-tdc.js')).whichTdcWorking,
  },
  {
    key: 'lash-order',
    group: 'valve-timing',
    title: '{Clearance} order',
    asks: 'At which crank positions can all the valve {clearances} be set, with the least turning?',
    load: async () => (await import('./lash-order.js')).lashOrderWorking,
  },
  {
    key: 'timing-figures',
    group: 'valve-timing',
    title: 'Timing figures',
    asks: 'What do these four valve events make of the camshaft, and is it timed as the spec has it?',
    load: async () => (await import('./timing-figures.js')).timingFiguresWorking,
  },
  {
    key: 'positive-stop',
    group: 'valve-timing',
    title: 'TDC by a stop',
    asks: 'Where is true TDC, by a stop in the plug hole?',
    load: async () => (await import('./positive-stop.js')).positiveStopWorking,
  },
  {
    key: 'shim',
    group: 'valve-timing',
    title: 'Shim',
    asks: 'Which shim gives this valve its {clearance}?',
    load: async () => (await import('./shim.js')).shimWorking,
  },
  {
    key: 'lifter-preload',
    group: 'valve-timing',
    title: '{Follower} preload',
    asks: 'How far do these turns of the adjuster press a hydraulic {follower} in?',
    load: async () => (await import('./lifter-preload.js')).lifterPreloadWorking,
  },
  {
    key: 'piston-height',
    group: 'valve-timing',
    title: 'Piston height',
    asks: 'How far below its top is the piston at this crank angle, or at which angle is it there?',
    load: async () => (await import('./piston-height.js')).pistonHeightWorking,
  },
  {
    key: 'tightening-plan',
    group: 'tightening',
    title: 'Tightening order and passes',
    asks: 'In which order are these tightened, and to what in each pass?',
    load: async () => (await import('./tightening-plan.js')).tighteningPlanWorking,
  },
  {
    key: 'torque-doubt',
    group: 'tightening',
    title: 'Doubt a torque',
    asks: 'Can this torque be right for this bolt, or has a figure or its unit slipped?',
    load: async () => (await import('./torque-doubt.js')).torqueDoubtWorking,
  },
  {
    key: 'wrench-setting',
    group: 'tightening',
    title: 'Wrench with a crow-foot or adapter',
    asks: 'What must the torque wrench be set to, with an adapter on it?',
    load: async () => (await import('./wrench-setting.js')).wrenchSettingWorking,
  },
  {
    key: 'wrench-suits',
    group: 'tightening',
    title: 'Does the wrench suit the job',
    asks: 'Can this torque wrench hold the torque that is wanted?',
    load: async () => (await import('./wrench-suits.js')).wrenchSuitsWorking,
  },
  {
    key: 'thread-stack',
    group: 'tightening',
    title: 'Is the bolt long enough',
    asks: 'Does this bolt come through its nut, or reach far enough into its hole without bottoming?',
    load: async () => (await import('./thread-stack.js')).threadStackWorking,
  },
  {
    key: 'thread',
    group: 'tightening',
    title: 'Figures of a thread',
    asks: 'What are the pitch, the diameters and the stress area of this thread?',
    load: async () => (await import('./thread.js')).threadWorking,
  },
  {
    key: 'fit',
    group: 'fits-and-keys',
    title: 'Fit of a hole and a shaft',
    asks: 'How much clearance or interference is there between this hole and this shaft?',
    load: async () => (await import('./fits/fit.js')).fitWorking,
  },
  {
    key: 'key-fit',
    group: 'fits-and-keys',
    title: 'Key in its keyway',
    asks: 'Does this key fit the slots of its shaft and its hub?',
    load: async () => (await import('./fits/key-fit.js')).keyFitWorking,
  },
  {
    key: 'heat-to-assemble',
    group: 'fits-and-keys',
    title: 'Heat to put it together',
    asks: 'How hot must the outer part be, or how cold the inner one, for this joint to go together?',
    load: async () => (await import('./fits/heat-to-assemble.js')).heatToAssembleWorking,
  },
  {
    key: 'compare-parts',
    group: 'fits-and-keys',
    title: 'One part for another',
    asks: 'Will this part do in the place of that one, dimension by dimension?',
    load: async () => (await import('./fits/compare-parts.js')).comparePartsWorking,
  },
  {
    key: 'belt-line',
    group: 'belt-drive',
    title: 'Belt line',
    asks: 'Do these pulleys run in one plane, and if not, which way must one move?',
    load: async () => (await import('./belt/belt-line.js')).beltLineWorking,
  },
  {
    key: 'belt-length',
    group: 'belt-drive',
    title: 'Belt length',
    asks: 'How long a belt goes round these two pulleys, and how fast does the driven one turn?',
    load: async () => (await import('./belt/belt-length.js')).beltLengthWorking,
  },
  {
    key: 'belt-tension',
    group: 'belt-drive',
    title: 'Belt tension',
    asks: 'How far should this belt give when it is pressed, and does it?',
    load: async () => (await import('./belt/belt-tension.js')).beltTensionWorking,
  },
  {
    key: 'limit-decision',
    group: 'measuring',
    title: 'Reading at its limits',
    asks: 'Is this reading good, with what the tool may be out?',
    load: async () => (await import('./limit-decision.js')).limitDecisionWorking,
  },
  {
    key: 'two-readings',
    group: 'measuring',
    title: 'Two people’s readings',
    asks: 'Do two people’s readings of one thing agree, each with a tool of their own?',
    load: async () => (await import('./two-readings.js')).twoReadingsWorking,
  },
  {
    key: 'round-readings',
    group: 'measuring',
    title: 'Bore, journal or bearing',
    asks: 'Is it in size, round and straight, from readings up and down it and across it?',
    load: async () => (await import('./round-readings.js')).roundReadingsWorking,
  },
  {
    key: 'running-clearance',
    group: 'measuring',
    title: 'Running clearance',
    asks: 'How much clearance has the shaft in its bearing, or the piston in its bore?',
    load: async () => (await import('./running-clearance.js')).runningClearanceWorking,
  },
  {
    key: 'ring-gap',
    group: 'measuring',
    title: 'Ring gap',
    asks: 'Is the gap between the ring’s ends wide enough, and does it close when hot?',
    load: async () => (await import('./ring-gap.js')).ringGapWorking,
  },
  {
    key: 'plastic-strip',
    group: 'measuring',
    title: 'Plastic strip',
    asks: 'Which clearance does a plastic strip of this width mean?',
    load: async () => (await import('./plastic-strip.js')).plasticStripWorking,
  },
  {
    key: 'formula',
    group: 'measuring',
    title: 'Formula',
    asks: 'What does a sum of several readings come to, with their units?',
    load: async () => (await import('./formula.js')).formulaWorking,
  },
  {
    key: 'swept-volume',
    group: 'measuring',
    title: 'Swept volume',
    asks: 'How much do the pistons sweep?',
    load: async () => (await import('./swept-volume.js')).sweptVolumeWorking,
  },
  {
    key: 'compression-ratio',
    group: 'measuring',
    title: 'Compression ratio',
    asks: 'What is the compression ratio, and what must the chamber hold for another?',
    load: async () => (await import('./compression-ratio.js')).compressionRatioWorking,
  },
  {
    key: 'cylinder-test',
    group: 'measuring',
    title: 'Compression and leak-down',
    asks: 'Are the cylinders even, and what do the low ones point at?',
    load: async () => (await import('./cylinder-test.js')).cylinderTestWorking,
  },
  {
    key: 'cure',
    group: 'curing',
    title: 'Curing',
    asks: 'When may the joint be handled and loaded, and has the compound set?',
    load: async () => (await import('./cure.js')).cureWorking,
  },
  {
    key: 'convert',
    group: 'convert',
    title: 'Convert a figure',
    asks: 'What is this figure in the other units?',
    load: async () => (await import('./convert.js')).convertWorking,
  },
];

/** The entry of a key, or undefined. */
export function workingNamed(key: string): WorkingEntry | undefined {
  return workings.find((entry) => entry.key === key);
}
