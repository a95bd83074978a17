import { type ReactNode, useId } from 'react';
import { joinClasses } from '@/ui/join-classes';

/** A titled part of an opened row. */
export function DetailPart(props: { title: string; className?: string; children: ReactNode }) {
  const id = useId();
  return (
    <section aria-labelledby={id} className={joinClasses('border-rule border-t pt-2', props.className)}>
      <h4 id={id} className="small-caps mb-1 text-ink-soft">
        {props.title}
      </h4>
      {props.children}
    </section>
  );
}
