import type { Part } from '../blocks/blocks';

/** How a sweep is judged: formulas and their sources. */
export const sweepMethodPart = (): Part => ({
  title: 'Method',
  rows: [
    {
      blocks: [
        {
          kind: 'formulas',
          formulas: [
            {
              name: 'Power laws',
              formula: 'κ_q = e^{c} τ^{−b}',
              alt: 'kappa q equals e to the c times tau to the minus b',
              words:
                'Fitted to mean, variance and third cumulant together by generalised least squares, with the covariance of their errors from the counts’ own moments; not to logarithms.'
            },
            {
              name: 'One exponent',
              formula: 'Δχ^2 = χ^2 (tied) − χ^2 (free)',
              alt: 'delta chi square equals chi square tied minus chi square free',
              words: 'Held against χ² with as many degrees of freedom as exponents are saved.'
            },
            {
              name: 'Exponent expected',
              formula: 'b = dν/(1 + zν)',
              alt: 'b equals d nu over one plus z nu',
              words: 'For a linear crossing and defects that are points in d dimensions.'
            },
            {
              name: 'One ratio',
              formula: 'R = κ_q/κ_1',
              alt: 'R equals kappa q over kappa one',
              words:
                'The value that fits all datasets of the window, errors of both allowed for; whether it is the same everywhere by χ².'
            },
            {
              name: 'Loss, one by one',
              formula: 'F_2/F_1^2 = (κ_2 − κ_1)/κ_1^2',
              alt: 'F two over F one squared equals kappa two minus kappa one over kappa one squared',
              words: 'Loss of single defects, each by chance of its own, leaves it as it is. For hold times.'
            }
          ]
        }
      ],
      notes: [
        {
          title: 'Sources',
          paragraphs: [
            'Least squares. Aitken 1936, Proc. Roy. Soc. Edinburgh 55:42.',
            'Errors of cumulants. Fisher 1930, Proc. London Math. Soc. 30:199; Hampel 1974, J. Am. Stat. Assoc. 69:383.',
            'Exponent. Kibble 1976, J. Phys. A 9:1387; Zurek 1985, Nature 317:505.',
            'Ratios. Fieller 1954, J. R. Stat. Soc. B 16:175.'
          ]
        }
      ]
    }
  ]
});
