/** What the method rests on, by what it is for. Pages and volumes where the code names them. */
export const METHOD_SOURCES: readonly [string, string][] = [
  [
    'Bounds and laws',
    'Hoeffding 1956, Ann. Math. Stat. 27:713. Chernoff 1952, Ann. Math. Stat. 23:493. Pitman 1997, J. Combin. Theory A 77:279. Hong 2013, Comput. Stat. Data Anal. 59:41. Shohat and Tamarkin 1943, The Problem of Moments.'
  ],
  [
    'Rate',
    'Gärtner 1977. Ellis 1984. Landau 1932 and Zener 1932, for the law of crossings; Dziarmaga 2005, Phys. Rev. Lett. 95:245701.'
  ],
  [
    'Intervals',
    'Clopper and Pearson 1934, Biometrika 26:404. Garwood 1936, Biometrika 28:437. Fisher 1930, Proc. London Math. Soc. 30:199. Efron and Tibshirani 1993, An Introduction to the Bootstrap. Bernstein 1924, with misreads.'
  ],
  [
    'Tests',
    'Besag and Clifford 1991, Biometrika 78:301. Berger and Boos 1994, J. Amer. Stat. Assoc. 89:1012. Berk and Jones 1979. Holm 1979, Scand. J. Statist. 6:65.'
  ],
  [
    'Order of the shots',
    'Pitman 1938, Biometrika 29:322. Ljung and Box 1978, Biometrika 65:297. Wald and Wolfowitz 1940, Ann. Math. Statist. 11:147. Tippett 1931. Within batches: Haldane 1937, Biometrika 29:133. Change of the mean: Hinkley 1970, Biometrika 57:1; James, James and Siegmund 1987, Biometrika 74:71, for long lists. Limits of the mean: Shewhart 1931.'
  ]
];
