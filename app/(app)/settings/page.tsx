import type { Metadata } from 'next';
import { Notice } from '@/components/ui/notice';
import { PageHead } from '@/components/ui/page-head';
import { listAccessTokens } from '@/lib/auth/company-settings';
import { viewerFor } from '@/lib/auth/current-viewer';
import { listLinkableTechnicians, listMembers } from '@/lib/auth/members';
import { scopeOf } from '@/lib/auth/viewer';
import { plural } from '@/lib/format';
import { AddPerson } from './add-person';
import { CompanyForm } from './company-form';
import { PeopleTable } from './people-table';
import { Tokens } from './tokens';

export const metadata: Metadata = { title: 'Settings' };

export default async function SettingsPage() {
  const { viewer, allowed } = await viewerFor('company:manage');
  if (!allowed) return <Notice title="Settings are for owners.">Ask the owner of {viewer.companyName}.</Notice>;
  const scope = scopeOf(viewer);
  const [members, technicians, tokens] = await Promise.all([
    listMembers(scope),
    listLinkableTechnicians(scope),
    listAccessTokens(scope),
  ]);
  const waiting = members.filter((member) => !member.hasPassword).length;
  const programs = tokens.length ? ` and ${plural(tokens.length, 'program', 'programs')}` : '';
  return (
    <div className="flex flex-col gap-8">
      <PageHead
        className="mt-3"
        title={`${plural(members.length, 'person', 'people')}${programs} can open ${viewer.companyName}.`}
        sub={
          waiting
            ? `${plural(waiting, 'person has', 'people have')} not set a password yet.`
            : 'Everybody has set a password.'
        }
        actions={<AddPerson technicians={technicians} />}
      />
      <PeopleTable members={members} technicians={technicians} self={viewer.actor} />
      <div className="grid items-start gap-8 lg:grid-cols-2">
        <Tokens tokens={tokens} timeZone={viewer.timeZone} />
        <CompanyForm
          name={viewer.companyName}
          timeZone={viewer.timeZone}
          massUnit={viewer.massUnit}
          zones={Intl.supportedValuesOf('timeZone')}
        />
      </div>
    </div>
  );
}
