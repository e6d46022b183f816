import { PageHead } from '@/components/shell/page-head';
import { PlantingList } from '@/components/start/planting-list';
import { RowsToCount } from '@/components/start/rows-to-count';
import { RoundLinks } from '@/components/start/round-links';
import { startHeadline } from '@/components/start/start-headline';
import { EmptyState } from '@/components/ui/empty-state';
import { LinkButton } from '@/components/ui/link-button';
import { Section } from '@/components/ui/section';
import { can } from '@/lib/access/can';
import { paths } from '@/lib/paths/paths';
import { readPage } from '@/lib/server/http/read-page';
import { readStart } from '@/lib/server/services/start/read-start';
import { startTexts } from '@/lib/texts/start-texts';

/** Where a person comes in: what waits for them, then every planting they see. */
export default async function OrganisationPage({ params }: { params: Promise<{ org: string }> }) {
  const { org } = await params;
  const { actor, organisation, data } = await readPage(org, 'farms.read', readStart);
  const { plantings } = data;
  if (plantings.length === 0) {
    const mayWrite = can(actor, 'farms.write');
    const begun = data.farms > 0;
    return (
      <>
        <PageHead title={organisation.name} />
        <EmptyState
          title={begun ? startTexts.noPlantingTitle : startTexts.noFarmTitle}
          action={mayWrite ? <LinkButton href={paths.farms(org)}>{startTexts.noFarmAction}</LinkButton> : <RoundLinks org={org} actor={actor} />}
        >
          {mayWrite ? (begun ? startTexts.noPlantingHint : startTexts.noFarmHint) : startTexts.noFarmSeen}
        </EmptyState>
      </>
    );
  }
  const season = plantings.filter((each) => each.thisSeason);
  const earlier = plantings.filter((each) => !each.thisSeason);
  return (
    <>
      <PageHead
        kicker={organisation.name}
        title={startHeadline(actor.role, plantings)}
        sub={actor.role === 'scout' ? startTexts.scoutLead : undefined}
        actions={<RoundLinks org={org} actor={actor} />}
      />
      {actor.role === 'scout' ? (
        <RowsToCount org={org} plantings={season} />
      ) : (
        <>
          <Section title={startTexts.thisSeason}>
            <PlantingList org={org} role={actor.role} plantings={season} />
          </Section>
          {earlier.length > 0 ? (
            <Section title={startTexts.earlier}>
              <PlantingList org={org} role={actor.role} plantings={earlier} />
            </Section>
          ) : null}
        </>
      )}
    </>
  );
}
