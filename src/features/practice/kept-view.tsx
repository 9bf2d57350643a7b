import { type ReactNode, useEffect, useRef } from 'react';
import type { SetItemDto } from '#shared/schemas/practice.ts';
import { Sheet, SheetRow } from '#src/components/sheet.tsx';
import type { Keeping } from '#src/lib/kept-store.ts';
import { keptAdvice, keptHeading } from './kept-words.ts';
import { AnsweredRows, SubjectRow } from './question-rows.tsx';

interface KeptViewProps {
  item: SetItemDto;
  number: number;
  responses: string[];
  keeping: Keeping;
  steps: ReactNode;
}

/** An answer that waits on this device for the connection. */
export function KeptView({ item, number, responses, keeping, steps }: KeptViewProps) {
  const heading = useRef<HTMLHeadingElement>(null);
  useEffect(() => heading.current?.focus({ preventScroll: true }), []);
  return (
    <>
      <Sheet>
        <SubjectRow item={item} />
        <AnsweredRows item={item} number={number} responses={responses} />
        <SheetRow hasRule>
          <div className="py-5">
            <h2 ref={heading} tabIndex={-1} className="!text-[1.125rem] !leading-6">
              {keptHeading(keeping)}
            </h2>
            <p className="text-ink-2 mt-1">{keptAdvice[keeping]}</p>
          </div>
        </SheetRow>
      </Sheet>
      <div className="flex flex-wrap justify-end gap-3 mt-5 px-5 md:px-0">{steps}</div>
    </>
  );
}
