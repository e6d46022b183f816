import { LinkButton } from '@/components/ui/link-button';
import { pressClass } from '@/components/ui/press-class';
import { can, type Actor } from '@/lib/access/can';
import { paths } from '@/lib/paths/paths';
import { keptFileTexts } from '@/lib/texts/kept-file-texts';
import { startTexts } from '@/lib/texts/start-texts';

/** The ways into the field and back from it: the phone's page for whoever counts, a phone's file for the office. */
export function RoundLinks({ org, actor }: { org: string; actor: Actor }) {
  return (
    <div className="flex flex-wrap gap-2" data-print="leave-out">
      {can(actor, 'observations.write') ? (
        // A plain link: the field page is no part of the desk and loads by itself.
        <a href={`${paths.round}?org=${org}`} className={pressClass(actor.role === 'scout' ? 'primary' : 'secondary', false)}>
          {startTexts.round}
        </a>
      ) : null}
      {can(actor, 'kept-files.read-in') ? (
        <LinkButton href={paths.keptFile(org)} look="quiet">
          {keptFileTexts.link}
        </LinkButton>
      ) : null}
    </div>
  );
}
