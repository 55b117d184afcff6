'use client';

import { TextInput } from '@/components/ui/field';

const PARTS = /^(\d{4}-\d{2}-\d{2})?(?:T(\d{2}:\d{2}(?::\d{2})?))?$/;

type WhenInputProps = { value: string; onChange: (value: string) => void; className?: string };

/** A day and, when it is known, the time of day; a moment the two can't say is shown as text. */
export const WhenInput = ({ value, onChange, className = '' }: WhenInputProps) => {
  const parts = PARTS.exec(value);
  if (!parts)
    return <TextInput value={value} onChange={(event) => onChange(event.target.value)} className={className} />;
  const [, day = '', time = ''] = parts;
  const write = (nextDay: string, nextTime: string) =>
    onChange(nextTime && nextDay ? `${nextDay}T${nextTime}` : nextDay);
  return (
    <div className="flex gap-2">
      <TextInput type="date" value={day} onChange={(event) => write(event.target.value, time)} className={className} />
      <TextInput
        id={undefined}
        aria-label="Time of day, if known"
        type="time"
        value={time}
        onChange={(event) => write(day, event.target.value)}
        className={`max-w-36 ${className}`}
      />
    </div>
  );
};
