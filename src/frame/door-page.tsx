import type { ReactNode } from 'react';
import { usePageTitle } from '../lib/page-title';
import { Caution } from '../ui/caution';
import { DemoBanner } from './demo-banner';
import { LeeDrawing } from './lee-drawing';
import { Mark } from './mark';
import { ThemeSwitch } from './theme-switch';

type DoorPageProps = {
  title: string;
  lead?: ReactNode;
  demoHospitalName?: string | null;
  children: ReactNode;
};

/** Pages before the sign-in: one narrow column, and the drawing beside it where there is room. */
export function DoorPage({ title, lead, demoHospitalName, children }: DoorPageProps) {
  usePageTitle(title);
  return (
    <div className="flex min-h-dvh flex-col">
      {demoHospitalName && <DemoBanner hospitalName={demoHospitalName} />}
      <div className="neatline" />
      <main className="grid grow md:grid-cols-[minmax(20rem,30rem)_1fr]">
        <div className="flex flex-col gap-6 px-6 py-10 md:px-12 md:py-16">
          <p className="flex items-center gap-3">
            <Mark className="h-8" />
            <span className="wide text-xl font-semibold">Leeward</span>
          </p>
          <div>
            <h1 className="text-2xl font-light">{title}</h1>
            {lead && <p className="text-ink-2">{lead}</p>}
          </div>
          {children}
          <div className="mt-auto flex flex-col gap-4 pt-8">
            <ThemeSwitch isInline />
            <Caution of="practitioners-decide" />
            <Caution of="local-regulation" />
          </div>
        </div>
        <div className="relative hidden overflow-hidden border-l border-rule md:block">
          <LeeDrawing className="absolute inset-0 size-full" />
        </div>
      </main>
    </div>
  );
}
