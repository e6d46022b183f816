import { count } from 'drizzle-orm';
import type { Database } from '@/db/connection';
import { person } from '@/db/schema/person';
import { withActor } from '@/lib/server/operations/actor-context';
import { readReplant } from '@/lib/server/services/replant/read-replant';
import { attachToFarms, insertAccount, organisationIdOf, personIdOf } from './insert-account';
import { cropService, otherOrganisations } from './demo-people';
import { farmsOfPeople, writeFarms } from './demo-farms';
import { writeSettings } from './demo-settings';
import { demoWriter, type DemoWriter } from './demo-writer';
import { trialSeed } from './chosen-seeds';
import { simulateTrial } from './simulate-trial';
import { trialLayout } from './trial-layout';
import { writeCrustedField } from './write-crusted-field';
import { writeOtherOrganisation } from './write-other-organisation';
import { writeReplantSheets } from './write-replant-sheets';
import { writeSpotCount } from './write-spot-count';
import { writeTrialCounts } from './write-trial-counts';
import { writeTrialPlan } from './write-trial-plan';

/** What a caller prints of the people who can sign in. */
export type SignIn = { name: string; role: string; email: string; password: string; organisation: string };

/**
 * Fills an empty database with the invented organisations. Where anybody can sign in already it refuses: demo data do not
 * belong beside somebody's own. (People are asked for, since row security shows no organisation to whom is in none.)
 */
export async function fillDemo(db: Database): Promise<SignIn[]> {
  const [standing] = await db.select({ people: count() }).from(person);
  if (standing && standing.people > 0) throw new Error('There are people in this database already, so no demo data are added.');
  await Promise.all([fillCropService(db), ...otherOrganisations.map((other) => fillOther(db, other))]);
  return [cropService, ...otherOrganisations].flatMap((account) =>
    account.people.map(({ name, role, email, password }) => ({ name, role, email, password, organisation: account.name })),
  );
}

async function fillCropService(db: Database): Promise<void> {
  await insertAccount(db, cropService);
  const write = demoWriter(db, cropService);
  await writeFarms(write);
  await attachToFarms(db, cropService, farmsOfPeople);
  await writeSettings(write);
  await Promise.all([fillTrial(write), fillCrustedField(write), writeSpotCount(write)]);
}

async function fillTrial(write: DemoWriter): Promise<void> {
  const blocks = trialLayout(simulateTrial(trialSeed));
  await writeTrialPlan(write, blocks);
  await writeTrialCounts(write, blocks);
}

async function fillCrustedField(write: DemoWriter): Promise<void> {
  await writeCrustedField(write);
  await writeReplantSheets(write);
}

async function fillOther(db: Database, other: (typeof otherOrganisations)[number]): Promise<void> {
  await insertAccount(db, other);
  const owner = { organisationId: organisationIdOf(other), personId: personIdOf(other, 'owner'), now: () => new Date(`${other.demoToday}T21:00:00Z`) };
  const basisHashOf = (planting: string, zone: string) => withActor(db, owner, async (context) => (await readReplant(context, { planting, zone })).basisHash);
  await writeOtherOrganisation(demoWriter(db, other), other, basisHashOf);
}
