'use client';

import * as RadixTabs from 'radix-ui/tabs';
import type { ReactNode } from 'react';
import { TAB_CLASSES, TAB_LIST_CLASSES } from './tab-classes';

export interface TabItem {
  id: string;
  label: ReactNode;
  content: ReactNode;
}

export interface TabsProps {
  /** Said by a screen reader before the tabs. */
  label: string;
  tabs: readonly TabItem[];
  defaultTab?: string;
  value?: string;
  onValueChange?: (id: string) => void;
}

/** Parts of one page, one shown at a time. For tabs with an address of their own use TabLinks. */
export function Tabs({ label, tabs, defaultTab, value, onValueChange }: TabsProps) {
  return (
    <RadixTabs.Root defaultValue={defaultTab ?? tabs[0]?.id} value={value} onValueChange={onValueChange}>
      <RadixTabs.List aria-label={label} className={TAB_LIST_CLASSES}>
        {tabs.map((tab) => (
          <RadixTabs.Trigger key={tab.id} value={tab.id} className={TAB_CLASSES}>
            {tab.label}
          </RadixTabs.Trigger>
        ))}
      </RadixTabs.List>
      {tabs.map((tab) => (
        <RadixTabs.Content key={tab.id} value={tab.id} className="pt-4">
          {tab.content}
        </RadixTabs.Content>
      ))}
    </RadixTabs.Root>
  );
}
