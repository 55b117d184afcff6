import { LinkButton } from '@/components/ui/button';
import { PageHead } from '@/components/ui/page-head';
import { useMay } from '@/components/viewer-context';

/** A company without a record: what to do first, as far as the role may. */
export const FirstSteps = () => {
  const mayImport = useMay('imports:manage');
  const mayWrite = useMay('records:write');
  const mayInvite = useMay('company:manage');
  const steps = [
    ...(mayImport
      ? [
          {
            title: 'Bring in last year’s tickets',
            why: 'A spreadsheet or a CSV file as it is. Tarebook reads it, shows what it understood, and changes nothing until you say so; an import can be undone.',
            link: { href: '/imports', text: 'Bring in a file' },
          },
        ]
      : []),
    ...(mayWrite
      ? [
          {
            title: 'Or write the next recovery',
            why: 'Weights, charge, vacuum and hold, on a phone beside the scale. Names of sites and appliances are made on the way.',
            link: { href: '/records/new', text: 'Write a record' },
          },
        ]
      : []),
    ...(mayInvite
      ? [
          {
            title: 'Let the others in',
            why: 'Each with a role: a technician sees his own records only, an auditor reads and changes nothing.',
            link: { href: '/settings', text: 'Add people' },
          },
        ]
      : []),
  ];
  return (
    <>
      <PageHead
        title="No records yet."
        sub={
          steps.length
            ? 'Every figure here is computed from recovery records. Begin with one of these.'
            : 'Every figure here is computed from recovery records. Somebody of the office can bring them in.'
        }
      />
      <ol className="mt-8 max-w-2xl border-t-2 border-ink">
        {steps.map(({ title, why, link }, index) => (
          <li key={title} className="flex gap-5 border-b border-rule py-5">
            <span aria-hidden="true" className="w-8 shrink-0 font-mono text-xl font-medium">
              {index + 1}
            </span>
            <div>
              <h2 className="text-lg font-semibold">{title}</h2>
              <p className="mt-0.5 mb-3 max-w-prose text-ink-2">{why}</p>
              <LinkButton href={link.href} tone={index === 0 ? 'primary' : 'quiet'}>
                {link.text}
              </LinkButton>
            </div>
          </li>
        ))}
      </ol>
    </>
  );
};
