import type { Role } from '@/lib/schemas/vocabulary';

export type DemoPerson = { key: string; name: string; role: Role; email: string; password: string };
export type DemoOrganisation = { key: string; name: string; timeZone: string; demoToday: string; people: readonly DemoPerson[] };

/**
 * The demo's fixed today is the day of the trial's last visit, 19 days after it was planted. The crusted field was looked at
 * eight days before and still waits: the ground was wet, and the insurer's word came in only now. Its replant date is two
 * days ahead.
 */
export const demoToday = '2026-05-26';

const timeZone = 'America/Chicago';

/** Invented people of invented organisations; the passwords are printed at the start, since there is nothing to guard. */
export const cropService: DemoOrganisation = {
  key: 'quillfern',
  name: 'Quillfern Crop Service (invented)',
  timeZone,
  demoToday,
  people: [
    { key: 'owner', name: 'Odessa Quillfern', role: 'owner', email: 'owner@quillfern.example', password: 'open the office gate' },
    { key: 'agronomist', name: 'Ivo Tarrow', role: 'agronomist', email: 'agronomist@quillfern.example', password: 'four blocks in the fog' },
    { key: 'scout-one', name: 'Pell Ashgrove', role: 'scout', email: 'pell@quillfern.example', password: 'seventeen feet and five' },
    { key: 'scout-two', name: 'Juno Merrifall', role: 'scout', email: 'juno@quillfern.example', password: 'a colored peg each day' },
    { key: 'grower-one', name: 'Hollis Brandreth', role: 'grower', email: 'hollis@quillfern.example', password: 'larkspur bottom in bloom' },
    { key: 'grower-two', name: 'Wilma Crookshank', role: 'grower', email: 'wilma@quillfern.example', password: 'keep it or plant again' },
  ],
};

/** Two organisations beside the crop service that must never be seen from it; their own word stands in all they write. */
export const otherOrganisations: readonly (DemoOrganisation & { word: string })[] = [
  {
    key: 'marrowglass',
    word: 'marrowglass',
    name: 'Marrowglass Agronomy (invented)',
    timeZone,
    demoToday,
    people: [{ key: 'owner', name: 'Una Marrowglass', role: 'owner', email: 'owner@marrowglass.example', password: 'nobody else may look in' }],
  },
  {
    key: 'thistlewick',
    word: 'thistlewick',
    name: 'Thistlewick Growers (invented)',
    timeZone,
    demoToday,
    people: [{ key: 'owner', name: 'Basil Thistlewick', role: 'owner', email: 'owner@thistlewick.example', password: 'behind the third hedge' }],
  },
];
