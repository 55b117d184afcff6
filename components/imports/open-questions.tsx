'use client';

import { Sheet } from '@/components/ui/sheet';
import type { Mapping, Question, Reading } from '@/lib/imports/contract';
import { answerTo, tellAnswer } from './tell';

type OpenQuestionsProps = { reading: Reading; mapping: Mapping; onTell: (mapping: Mapping) => void };

const keyOf = ({ about, header, field }: Question) => `${about} ${header ?? ''} ${field ?? ''}`;

/** What only the person can say, before anything else. */
export const OpenQuestions = ({ reading, mapping, onTell }: OpenQuestionsProps) => (
  <Sheet title="Only you can say this" aside="Nothing is guessed">
    <div className="flex flex-col gap-6">
      {reading.questions.map((question) => (
        <fieldset key={keyOf(question)} className="min-w-0">
          <legend className="max-w-prose font-medium">{question.sentence}</legend>
          <div className="mt-1.5 flex flex-col gap-x-6 sm:flex-row sm:flex-wrap">
            {question.choices.map(({ value, label }) => (
              <label key={value} className="flex min-h-11 min-w-0 items-center gap-2.5 pointer-fine:min-h-9">
                <input
                  type="radio"
                  name={keyOf(question)}
                  value={value}
                  checked={answerTo(mapping, question) === value}
                  onChange={() => onTell(tellAnswer(mapping, reading, question, value))}
                  className="size-5 shrink-0 accent-act"
                />
                <span className="min-w-0 break-words">{label}</span>
              </label>
            ))}
          </div>
        </fieldset>
      ))}
    </div>
  </Sheet>
);
