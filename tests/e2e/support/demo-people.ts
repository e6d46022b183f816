import { readFileSync } from 'node:fs';

export interface DemoPerson {
  name: string;
  role: string;
  email: string;
  password: string;
  organisation: string;
}

/** The invented people of the demo that the visited server was filled with. */
export function demoPeople(): DemoPerson[] {
  const file = process.env.ROWRISE_DEMO_PEOPLE_FILE ?? '.rowrise/demo-people.json';
  return JSON.parse(readFileSync(file, 'utf8')) as DemoPerson[];
}
