import type { SiteKind } from './equipment';

/** Invented names. Nobody of these and none of these places exists. */
export const COMPANY_NAME = 'Brackenmoor Climate & Cold';
export const SMALL_COMPANY_NAME = 'Halvard Inlet Cooling';

export const BRANCHES = ['Port Ellery', 'Graniteford', 'Saltmarsh Bend'] as const;
export const SMALL_BRANCHES = ['Halvard Inlet'] as const;

export const GIVEN_NAMES = `
  Amara Anders Bao Beatriz Callum Chidi Daria Dewitt Elif Emeka Fatima Gideon Hana Ingrid Isaac Jovana Kasimir
  Keola Leila Luis Maeve Malik Nadia Noor Oskar Paloma Quentin Rosa Ruben Sanjay Tamsin Teodor Ursula Vikram
  Winona Yusuf`
  .trim()
  .split(/\s+/);

export const FAMILY_NAMES = `
  Abernethy Adeyemi Bascombe Castellano Delacroix Dragomir Eklund Farrow Galang Haddad Hollis Ibarra Jankowski
  Kealoha Lindqvist Mbeki Mercado Nakagawa Novak Okonkwo Ortega Pereira Quispe Rahimi Runningwater Sato Tran
  Ueda Vance Whitlock Yilmaz Zielinski`
  .trim()
  .split(/\s+/);

export const STREETS = `
  Alder Beacon Cooper Drover Ember Fuller Garnet Heron Juniper Kiln Lantern Millrace Orchard Pewter Quarry
  Rookery Saddler Tannery Umber Vinegar Weaver Yarrow`
  .trim()
  .split(/\s+/);

const FIRST_WORDS = (
  'Amber, Blue Heron, Copperleaf, Driftwood, Eastgate, Fernhollow, Goldenrod, Harborlight, ' +
  'Ironbridge, Juniper, Kingfisher, Lakeview, Mossgate, Northway, Oxbow, Pinecrest, ' +
  'Quarry Hill, Riverbend, Stonecut, Thornfield, Upland, Valehouse, Willowmere, Yellowfin'
).split(', ');

const SECOND_WORDS: Record<SiteKind, readonly string[]> = {
  home: ['Cottage', 'House', 'Residence', 'Row'],
  office: ['Offices', 'Tower', 'Business Court'],
  store: ['Hardware', 'Books', 'Pharmacy', 'Outfitters'],
  restaurant: ['Kitchen', 'Grill', 'Diner', 'Bakery'],
  supermarket: ['Market', 'Foods', 'Grocers'],
  school: ['Elementary', 'Middle School', 'College Annex'],
  clinic: ['Clinic', 'Dental', 'Eye Center'],
  plant: ['Plastics', 'Dairy', 'Bottling', 'Foundry'],
};

/** Every name a site of this kind can have. */
export const siteNames = (kind: SiteKind): string[] =>
  FIRST_WORDS.flatMap((first) => SECOND_WORDS[kind].map((second) => `${first} ${second}`));
