import { Notice } from '@/components/ui/notice';
import { plural } from '@/lib/format';
import { FIELD_LABELS, RECORD_FIELDS } from '@/lib/recoveries/fields';
import type { Refusal } from './write';

/** Says at the button what was refused; each fault also stands beside its field. */
export const FaultSummary = ({ errors, sentence }: Refusal) => {
  const faulty = RECORD_FIELDS.filter((field) => errors[field]);
  if (!sentence && faulty.length === 0) return null;
  return (
    <Notice
      tone="danger"
      announce
      className="mb-4"
      title={sentence ?? `Not saved: ${plural(faulty.length, 'field needs', 'fields need')} another look.`}
    >
      {faulty.length ? (
        <ul>
          {faulty.map((field) => (
            <li key={field}>
              <span className="font-medium">{FIELD_LABELS[field]}</span>: {errors[field]}
            </li>
          ))}
        </ul>
      ) : null}
    </Notice>
  );
};
