/** What is said of settings that do not fit: the same on the first page, in a team's forms and to a script. */
export const SETTING_WORDS = {
  misread: 'Write a probability from 0 to below 0.5, or leave it empty: at 0.5 the reading says nothing.',
  misreadUncertainty: 'Write a standard uncertainty from 0 to below 0.5, such as 0.001, or leave it empty.',
  uncertaintyAlone: 'Write the chance to misread a site as well, or leave this empty.',
  kept: 'Write the smallest and the largest count kept, such as 0-4, or 1- where only empty shots were dropped.'
} as const;
