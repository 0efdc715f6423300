import type { CatalogueEntry } from './sample-catalogue';

/** What all published samples share: single things counted, none of them invented. */
const shared = { invented: false, unit: 'defect', geometry: 'sites' } as const;

/** Published counts, as printed. The remarks in each file say what was counted and where it was printed. */
export const PUBLISHED: CatalogueEntry[] = [
  {
    ...shared,
    slug: 'weldon-dice',
    title: 'Weldon’s dice',
    about: 'Twelve dice thrown 26 306 times: how many showed a five or a six.',
    cause:
      'Dice do not know of each other. These show five and six a little more often than one time in three.',
    source: 'K. Pearson, Phil. Mag. 50 (1900) 157.',
    trials: 12,
    file: 'weldon-dice.csv'
  },
  {
    ...shared,
    slug: 'weldon-dice-lumped',
    title: 'Weldon’s dice, last rows in one',
    about: 'The same throws as many books print them: ten, eleven and twelve in one row, “10+”.',
    cause: 'As above. A lump must be read as “ten or more”, not as ten.',
    source: 'K. Pearson, Phil. Mag. 50 (1900) 157.',
    trials: 12,
    file: 'weldon-dice-lumped.csv'
  },
  {
    ...shared,
    slug: 'rutherford-geiger',
    title: 'Alpha particles',
    about: 'Particles from polonium in 2 608 intervals of 7.5 seconds.',
    cause: 'Radioactive decay: rare events among very many atoms, so the number of trials does not matter.',
    source: 'E. Rutherford and H. Geiger, Phil. Mag. 20 (1910) 698.',
    trials: null,
    file: 'rutherford-geiger.csv'
  },
  {
    ...shared,
    slug: 'horse-kicks',
    title: 'Horse kicks',
    about: 'Deaths by horse kicks in ten corps of the Prussian army over twenty years.',
    cause: 'Rare accidents. Only 200 corps-years.',
    source: 'L. von Bortkiewicz, Das Gesetz der kleinen Zahlen (1898).',
    trials: null,
    file: 'horse-kicks.csv'
  },
  {
    ...shared,
    slug: 'yeast-square-a',
    title: 'Yeast cells',
    about: 'Yeast cells in 400 squares of a counting chamber.',
    cause: 'Not known for certain: the counts vary more than independent cells would.',
    source: 'Student, Biometrika 5 (1907) 351, sample A.',
    trials: null,
    file: 'yeast-square-a.csv'
  },
  {
    ...shared,
    slug: 'greenwood-yule',
    title: 'Accidents at work',
    about: 'Accidents of 647 women who worked on shells, over five weeks.',
    cause:
      'Not known for certain. Greenwood and Yule held that some of the women were likelier than others to have one.',
    source: 'M. Greenwood and G. U. Yule, J. R. Stat. Soc. 83 (1920) 255.',
    trials: null,
    file: 'greenwood-yule.csv'
  }
];
