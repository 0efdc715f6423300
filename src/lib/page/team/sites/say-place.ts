/** Device, firmware and group of a map in a line; empty where none is stated. */
export const sayPlace = (of: {
  device: string | null;
  firmware: string | null;
  group: string | null;
}): string => [of.device, of.firmware, of.group].filter((part) => part !== null).join(', ');
