import type { ConditionName } from './conditions';

/** Labels of the conditions, the same in forms, tables and messages. */
export const CONDITION_LABELS: Record<ConditionName, string> = {
  name: 'Name',
  device: 'Device',
  firmware: 'Firmware version',
  group: 'Group',
  quenchTime: 'Quench time',
  quenchUnit: 'Unit of the quench time',
  holdTime: 'Hold time',
  holdUnit: 'Unit of the hold time',
  geometry: 'Counted on',
  unit: 'Unit of the counts',
  trials: 'Trials in a shot, N',
  trialsWhy: 'Why that number of trials',
  misread: 'Chance to misread a site',
  misreadUncertainty: 'Uncertainty of the chance to misread',
  kept: 'Counts kept',
  postSelection: 'Post-selection',
  measuredOn: 'Measured on',
  notes: 'Notes'
};

export const CONDITION_HELP: Record<ConditionName, string> = {
  name: 'What your team calls it.',
  device: 'Its name in your laboratory.',
  firmware: 'As the device reports it.',
  group: 'Part of the device that was counted: a group of qubits, a register, a region. Empty for all of it.',
  quenchTime: 'How long the ramp through the transition took.',
  quenchUnit: 'ns, µs, ms, s, or a unit of your own.',
  holdTime: 'From the end of the ramp to the read-out.',
  holdUnit: 'ns, µs, ms, s, or a unit of your own.',
  geometry: 'A misread site toggles two bonds, so bonds need more care than sites.',
  unit: 'Pairs when every count is even by construction.',
  trials: 'Sites, bonds or modes that could each hold one defect. Empty where there is no such limit.',
  trialsWhy: 'Where the number comes from: a referee will ask.',
  misread: 'From calibration, such as 0.01. Empty when not known.',
  misreadUncertainty:
    'One standard uncertainty of the calibration, such as 0.001. Empty where the chance is taken as exact.',
  kept: 'Where shots were dropped by their count: 0-4, or 1- where only empty shots were. Empty when none were.',
  postSelection:
    'Which shots were left out by another rule, and by which; it is told, and not allowed for. Empty when all were kept.',
  // A date field shows in what order it wants the parts.
  measuredOn: '',
  notes: 'Whatever else should be known.'
};
