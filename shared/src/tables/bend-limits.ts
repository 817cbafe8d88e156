import type { CodeEdition, RacewayType } from '../run/run-document';

/**
 * Title: total degrees of bend between pull points.
 * Source: NEC articles 342 to 362: section .26 through 2020, .24(B) from 2023; 300.24 from 2026.
 * Edition: section texts read in transcriptions of 2020 and 2023; the renumbering of 2023 confirmed by Electrical
 * Contractor magazine (15 November 2022); 300.24 from a continuing-education page on the changes of 2026.
 * Telecom: ANSI/TIA-569 practice, 180° and 100 ft confirmed by Washington State University section 27 05 00.
 */
export const CODE_LIMIT_DEGREES = 360;

/** TIA-569 practice: degrees between pull points, and inches between them (100 ft). */
export const TELECOM_LIMIT_DEGREES = 180;
export const TELECOM_LIMIT_LENGTH = 1_200;
export const TELECOM_SOURCE = 'ANSI/TIA-569 practice; WSU 27 05 00';

/** The article of each raceway type. */
export const ARTICLES: Record<RacewayType, string> = {
  EMT: '358',
  IMC: '342',
  RMC: '344',
  FMC: '348',
  LFMC: '350',
  'LFNC-A': '356',
  'LFNC-B': '356',
  'LFNC-C': '356',
  ENT: '362',
  'PVC-40': '352',
  'PVC-80': '352',
  'PVC-A': '352',
  'PVC-EB': '352',
  'HDPE-40': '353',
};

/** Where each edition sets the limit within an article, and the edition whose text was read for it. */
export const BEND_SECTIONS: Record<CodeEdition, { section: string; read: CodeEdition }> = {
  'NEC-2017': { section: '26', read: 'NEC-2017' },
  'NEC-2020': { section: '26', read: 'NEC-2020' },
  'NEC-2023': { section: '24(B)', read: 'NEC-2023' },
  'NEC-2026': { section: '24(B)', read: 'NEC-2023' },
};

/** From this edition on, 300.24 limits the total of all raceway types in a section together. */
export const COMBINED_LIMIT_FROM: CodeEdition = 'NEC-2026';
export const COMBINED_SECTION = '300.24';
