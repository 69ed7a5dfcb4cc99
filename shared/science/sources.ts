/**
 * Where a published value comes from.
 * `seen`: the values used here were read in a copy of the publication (or of the part named in `note`).
 * `memory`: they were taken down from memory; a check that rests on them says "value from memory".
 */
export type Source = {
  readonly authors: string
  /** Null when the copy that was read carries no year. */
  readonly year: number | null
  readonly title: string
  readonly where: string
  readonly status: 'seen' | 'memory'
  readonly note: string
}

/**
 * Every publication that the science of this project rests on. Functions and
 * constants name a key after `@source`, tables in their `source` field; a
 * publication that nothing names does not belong here.
 */
export const SOURCES = {
  'singh-dunn-2016': {
    authors: 'H. Singh, B. Dunn',
    year: 2016,
    title: 'Electrical Conductivity and pH Guide for Hydroponics',
    where: 'Oklahoma State University Extension, HLA-6722, table 2',
    status: 'memory',
    note: 'The leaflet was seen (2016, revised 2017); the rows of its table were taken down from memory. It repeats an older list.',
  },
  'produce-grower-peppers': {
    authors: 'Produce Grower',
    year: null,
    title: 'Peppers 101',
    where: 'Hydroponic Production Primers',
    status: 'seen',
    note: 'Greenhouse practice.',
  },
  'sonneveld-voogt-2009': {
    authors: 'C. Sonneveld, W. Voogt',
    year: 2009,
    title: 'Plant Nutrition of Greenhouse Crops',
    where: 'Springer',
    status: 'memory',
    note: 'Rockwool culture; what the drip delivers and what the root zone settles at differ.',
  },
  'brechner-both-lettuce': {
    authors: 'M. Brechner, A. J. Both and others',
    year: null,
    title: 'Hydroponic Lettuce Handbook',
    where: 'Cornell Controlled Environment Agriculture',
    status: 'memory',
    note: 'The handbook was seen; the pH band of its ponds was taken down from memory.',
  },
  'walters-currey-2018': {
    authors: 'K. J. Walters, C. J. Currey',
    year: 2018,
    title: 'Effects of nutrient solution concentration and daily light integral on growth and nutrient concentration of several basil species in hydroponic production',
    where: 'HortScience 53:1319',
    status: 'seen',
    note: 'The values were seen; the wording of the title is from memory.',
  },
  'jones-2005': {
    authors: 'J. B. Jones',
    year: 2005,
    title: 'Hydroponics: A Practical Guide for the Soilless Grower',
    where: 'CRC Press, 2nd edition',
    status: 'memory',
    note: 'The same band is given nearly everywhere.',
  },
  'hochmuth-hs796': {
    authors: 'G. J. Hochmuth, R. C. Hochmuth',
    year: null,
    title: 'Nutrient Solution Formulation for Hydroponic (Perlite, Rockwool, NFT) Tomatoes in Florida',
    where: 'University of Florida IFAS Extension, HS796',
    status: 'memory',
    note: 'The leaflet was seen; its pH band was taken down from memory.',
  },
  'combrink-mixing': {
    authors: 'N. J. J. Combrink',
    year: null,
    title: 'Mixing a balanced nutrient solution',
    where: 'article',
    status: 'seen',
    note: 'Gives one pH band for all crops. The initials are from memory.',
  },
  'carruthers-summary': {
    authors: 'S. Carruthers',
    year: null,
    title: 'Handbook for hobby growers, strengths by group of crops',
    where: 'a summary of the handbook',
    status: 'seen',
    note: 'Only a summary was seen; the initial is from memory. It gives higher strengths in winter than in summer for fruiting crops.',
  },
  'maas-hoffman-1977': {
    authors: 'E. V. Maas, G. J. Hoffman',
    year: 1977,
    title: 'Crop salt tolerance: current assessment',
    where: 'Journal of the Irrigation and Drainage Division, ASCE 103:115-134',
    status: 'memory',
    note: 'For the saturated paste of a soil, not for a nutrient solution: direction only.',
  },
  'kratky-2004': {
    authors: 'B. A. Kratky',
    year: 2004,
    title: 'A suspended pot, non-circulating hydroponic method',
    where: 'Acta Horticulturae 648:83-89',
    status: 'seen',
    note: 'The abstract was seen.',
  },
  'kratky-2005-tomatoes': {
    authors: 'B. A. Kratky, G. T. Maehira, E. J. Cupples, C. C. Bernabe',
    year: 2005,
    title: 'Non-circulating hydroponic methods for growing tomatoes',
    where: 'Proceedings of the National Agricultural Plastics Congress 32:31-36',
    status: 'seen',
    note: 'The abstract was seen; initials are from memory. The litres a kilogram of fruit needs were seen as quoted from Kratky.',
  },
  'kratky-2010': {
    authors: 'B. A. Kratky',
    year: 2010,
    title: 'A suspended net-pot, non-circulating hydroponic method for commercial production of leafy, romaine and semi-head lettuce',
    where: 'University of Hawaii CTAHR, VC-1, page 1',
    status: 'seen',
    note: 'The first page was seen.',
  },
  'crc-mathematical-tables': {
    authors: 'CRC',
    year: null,
    title: 'Standard Mathematical Tables',
    where: 'mensuration formulas: frustum of a right circular cone, prismatoid',
    status: 'memory',
    note: 'Textbook formulas, the same in every edition.',
  },
} as const satisfies Record<string, Source>

export type SourceKey = keyof typeof SOURCES

/** How a number came here: read in a copy, from memory, or computed from a formula with its constants. */
export type Provenance = 'seen' | 'memory' | 'computed'
