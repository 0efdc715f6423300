/** A firmware version of a device, as lists and pages show it. */
export interface DeviceVersion {
  id: string;
  name: string;
  notes: string | null;
  /** Datasets that name it, and those of them that were put aside. */
  datasets: number;
  aside: number;
  /** When the last of its datasets was saved, in milliseconds since 1970; null without one. */
  last: number | null;
}

/** A device with its versions in order. */
export interface DeviceEntry {
  id: string;
  name: string;
  notes: string | null;
  /** Grows with every change of the order of its versions or of its notes. */
  version: number;
  versions: DeviceVersion[];
  /** Datasets of the device that name no firmware version. */
  unversioned: number;
}

/** A line of the list of devices. */
export interface DeviceLine {
  id: string;
  name: string;
  versions: number;
  datasets: number;
  /** Name of the last version in order; null without one. */
  newest: string | null;
}

/** Longest notes on a device or a version, in characters. */
export const LONGEST_NOTES = 4000;
