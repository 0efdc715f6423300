/** What is weak about a password, by the name that the estimator gives it. */
export const WARNINGS: Record<string, string> = {
  straightRow: 'Keys in a row are among the first things tried.',
  keyPattern: 'A pattern of keys is among the first things tried.',
  simpleRepeat: 'One character repeated is tried early.',
  extendedRepeat: 'A piece repeated is hardly better than the piece once.',
  sequences: 'Letters or digits in order are tried early.',
  recentYears: 'Recent years are tried early.',
  dates: 'Dates are tried early.',
  topTen: 'It is one of the ten commonest passwords.',
  topHundred: 'It is one of the hundred commonest passwords.',
  common: 'It is a common password.',
  similarToCommon: 'It is close to a common password.',
  wordByItself: 'A single word is tried early.',
  namesByThemselves: 'Names are tried early.',
  commonNames: 'Names are tried early.',
  userInputs: 'It holds your own name or address.',
  pwned: 'It has been seen in a leak.'
};

/** What would make it better. */
export const HELP: Record<string, string> = {
  l33t: 'Writing @ for a helps little.',
  reverseWords: 'A word backwards helps little.',
  allUppercase: 'Capitals throughout help little.',
  capitalization: 'A capital at the beginning helps little.',
  dates: 'Leave dates out.',
  recentYears: 'Leave years out.',
  associatedYears: 'Leave out years that have to do with you.',
  sequences: 'Leave such rows out.',
  repeated: 'Leave repeats out.',
  longerKeyboardPattern: 'Take several short pieces instead of one row.',
  anotherWord: 'Add a word or two that have nothing to do with it.',
  useWords: 'Four words that have nothing to do with each other are easy to keep.',
  noNeed: '',
  pwned: 'Take another one here and wherever you use it.'
};
