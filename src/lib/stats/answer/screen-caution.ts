/** What every document closes with: what a screen is not, and what it must not be used for. */
export const screenCaution =
  'A statistical screen is not a physical proof in either direction. It does not replace calibration of the apparatus, nor a laboratory’s own safety rules and qualified staff where high voltage, lasers, cryogens or magnets are run on the strength of it. Do not use it to pass or fail hardware that people’s safety depends on.';
