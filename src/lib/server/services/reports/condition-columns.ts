import { dataset } from '../../db/schema';

/** Columns of a dataset that are its conditions: what a report freezes, and what is later compared with. */
export const conditionColumns = {
  name: dataset.name,
  device: dataset.device,
  firmware: dataset.firmware,
  group: dataset.group,
  quenchTime: dataset.quenchTime,
  quenchUnit: dataset.quenchUnit,
  holdTime: dataset.holdTime,
  holdUnit: dataset.holdUnit,
  geometry: dataset.geometry,
  unit: dataset.unit,
  trials: dataset.trials,
  trialsWhy: dataset.trialsWhy,
  misread: dataset.misread,
  misreadUncertainty: dataset.misreadUncertainty,
  kept: dataset.kept,
  postSelection: dataset.postSelection,
  measuredOn: dataset.measuredOn,
  notes: dataset.notes
};
