/** Sources that the words may cite, by author and year; the code that uses each names its place. */
export const SOURCES_BY_YEAR = {
  bergerBoos: 'Berger and Boos 1994',
  besagClifford: 'Besag and Clifford 1991',
  clopperPearson: 'Clopper and Pearson 1934',
  efronTibshirani: 'Efron and Tibshirani 1993',
  garwood: 'Garwood 1936',
  hoeffding: 'Hoeffding 1956',
  holm: 'Holm 1979',
  ljungBox: 'Ljung and Box 1978',
  pitman: 'Pitman 1997'
} as const;
