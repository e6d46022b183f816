import { PageHead } from '@/components/shell/page-head';
import { LinkButton } from '@/components/ui/link-button';
import { paths } from '@/lib/paths/paths';
import { sessionTexts } from '@/lib/texts/session-texts';

export default function NotFound() {
  return (
    <main className="mx-auto max-w-page p-6">
      <PageHead
        title={sessionTexts.notFound}
        sub={sessionTexts.notFoundHelp}
        actions={<LinkButton href={paths.home}>{sessionTexts.toStart}</LinkButton>}
      />
    </main>
  );
}
