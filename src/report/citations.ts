/** A work as the list of references prints it. */
export interface Citation {
  authors: string
  year: number
  title: string
  /** Journal, volume and page, or the publisher. */
  where: string
}

/**
 * The works an audit may rest on, by the key it names them with. Titles and pages are given from memory and
 * have not been held against the printed works; volumes and first pages of most are those the method notes
 * of this project give.
 */
export const CITATIONS: Readonly<Record<string, Citation>> = {
  auer2000: {
    authors: 'Auer, L. H. & Standish, E. M.',
    year: 2000,
    title: 'Astronomical refraction: computational method for all zenith angles',
    where: 'Astronomical Journal 119, 2472',
  },
  bennett1982: {
    authors: 'Bennett, G. G.',
    year: 1982,
    title: 'The calculation of astronomical refraction in marine navigation',
    where: 'Journal of Navigation 35, 255',
  },
  chulliat2025: {
    authors: 'Chulliat, A. et al.',
    year: 2025,
    title: 'The US/UK World Magnetic Model for 2025–2030, and its editions for 2015 and 2020',
    where: 'National Centers for Environmental Information, NOAA',
  },
  hoffleit1991: {
    authors: 'Hoffleit, D. & Warren, W. H.',
    year: 1991,
    title: 'The Bright Star Catalogue, 5th revised edition',
    where: 'Astronomical Data Center, NSSDC, NASA',
  },
  hohenkerk1985: {
    authors: 'Hohenkerk, C. Y. & Sinclair, A. T.',
    year: 1985,
    title: 'The computation of angular atmospheric refraction at large zenith angles',
    where: 'NAO Technical Note 63',
  },
  iau1976: {
    authors: 'Lieske, J. H., Lederle, T., Fricke, W. & Morando, B.',
    year: 1977,
    title:
      'Expressions for the precession quantities based upon the IAU (1976) system of astronomical constants',
    where: 'Astronomy & Astrophysics 58, 1',
  },
  jcgm100: {
    authors: 'Joint Committee for Guides in Metrology',
    year: 2008,
    title: 'Evaluation of measurement data: guide to the expression of uncertainty in measurement',
    where: 'JCGM 100:2008',
  },
  karney2011: {
    authors: 'Karney, C. F. F.',
    year: 2011,
    title: 'Transverse Mercator with an accuracy of a few nanometers',
    where: 'Journal of Geodesy 85, 475',
  },
  karney2013: {
    authors: 'Karney, C. F. F.',
    year: 2013,
    title: 'Algorithms for geodesics',
    where: 'Journal of Geodesy 87, 43',
  },
  kass1995: {
    authors: 'Kass, R. E. & Raftery, A. E.',
    year: 1995,
    title: 'Bayes factors',
    where: 'Journal of the American Statistical Association 90, 773',
  },
  kullback1951: {
    authors: 'Kullback, S. & Leibler, R. A.',
    year: 1951,
    title: 'On information and sufficiency',
    where: 'Annals of Mathematical Statistics 22, 79',
  },
  laskar1986: {
    authors: 'Laskar, J.',
    year: 1986,
    title: 'Secular terms of classical planetary theories using the results of general theory',
    where: 'Astronomy & Astrophysics 157, 59',
  },
  laskar2004: {
    authors: 'Laskar, J., Robutel, P., Joutel, F., Gastineau, M., Correia, A. C. M. & Levrard, B.',
    year: 2004,
    title: 'A long-term numerical solution for the insolation quantities of the Earth',
    where: 'Astronomy & Astrophysics 428, 261',
  },
  newcomb1895: {
    authors: 'Newcomb, S.',
    year: 1895,
    title: 'The elements of the four inner planets and the fundamental constants of astronomy',
    where: 'Washington, Government Printing Office',
  },
  p03: {
    authors: 'Capitaine, N., Wallace, P. T. & Chapront, J.',
    year: 2003,
    title: 'Expressions for IAU 2000 precession quantities',
    where: 'Astronomy & Astrophysics 412, 567',
  },
  petrie1883: {
    authors: 'Petrie, W. M. F.',
    year: 1883,
    title: 'The pyramids and temples of Gizeh',
    where: 'London, Field & Tuer',
  },
  rozenberg1966: {
    authors: 'Rozenberg, G. V.',
    year: 1966,
    title: 'Twilight: a study in atmospheric optics',
    where: 'New York, Plenum Press',
  },
  ruggles1984: {
    authors: 'Ruggles, C. L. N.',
    year: 1984,
    title: 'Megalithic astronomy: a new archaeological and statistical study of 300 western Scottish sites',
    where: 'Oxford, British Archaeological Reports 123',
  },
  sampson2003: {
    authors: 'Sampson, R. D., Lozowski, E. P., Peterson, A. E. & Hube, D. P.',
    year: 2003,
    title: 'Variability in the astronomical refraction of the rising and setting Sun',
    where: 'Publications of the Astronomical Society of the Pacific 115, 1256',
  },
  schaefer1990: {
    authors: 'Schaefer, B. E. & Liller, W.',
    year: 1990,
    title: 'Refraction near the horizon',
    where: 'Publications of the Astronomical Society of the Pacific 102, 796',
  },
  vondrak2011: {
    authors: 'Vondrák, J., Capitaine, N. & Wallace, P.',
    year: 2011,
    title: 'New precession expressions, valid for long time intervals',
    where: 'Astronomy & Astrophysics 534, A22; corrigendum 2012, 541, C1',
  },
}
