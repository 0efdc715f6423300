/** For an id that is of no device or version here. */
export const NO_DEVICE = { message: 'There is no page at this address.', code: 'not-found' };

export const UNREADABLE_FORM = 'This form could not be read. Load the page again and repeat it.';

export const DEVICE_REFUSALS = {
  stale:
    'Somebody changed this device since you opened the page. It now shows how it stands: look, then do it again.',
  'no-version': 'The reference is no version of this device, or was removed meanwhile. Choose another.',
  'no-way': 'It stands at that end of the order already.',
  named: 'Datasets name this version, or some put aside do. Only a version that none names can be removed.'
} as const;
