import { ButtonLink } from '@/components/ui/button';
import { Section } from '@/components/ui/section';
import type { Role } from '@/lib/auth/roles';
import type { Tideline } from '@/lib/tideline/contract';

/** What stands here before the first batch: what the line will show, and the four things that bring it. */
export function FirstDay({ tideline, roles }: { tideline: Tideline; roles: readonly Role[] }) {
  const { started } = tideline;
  const mayBuild = roles.some((role) => role === 'lead' || role === 'admin');
  const steps = [
    {
      title: 'Enter a processor and what it may do for you',
      rest: 'Name, mail address, processes, the day its approval ends.',
      verb: 'Enter a processor',
      href: '/processors/new',
      done: started.processors > 0,
      ready: roles.includes('admin') || roles.includes('inspector'),
    },
    {
      title: 'Enter a part and its outside steps',
      rest: 'Drawing number and revision, material, the condition it is made in and must end in.',
      verb: 'Enter a part',
      href: '/parts/new',
      done: started.parts > 0,
      ready: mayBuild,
    },
    {
      title: 'Make a lot',
      rest: 'Pieces made together from one heat of material, with the mill certificate. Or bring a list.',
      verb: 'Make a lot',
      href: '/lots/new',
      done: started.lots > 0,
      ready: mayBuild && started.parts > 0,
    },
    {
      title: 'Gather lots into a batch',
      rest: 'You will see what it should cost and what stands in the way.',
      verb: 'Start a batch',
      href: '/batches/new',
      done: false,
      ready: mayBuild && started.lots > 0 && started.processors > 0,
    },
  ];
  const next = steps.findIndex((step) => !step.done);
  return (
    <>
      <div className="pt-4 pb-3">
        <h1>Tideline</h1>
        <p className="text-second text-quiet">
          Nothing is out. Every batch you send will lie on this line until its pieces are in stock.
        </p>
      </div>
      <ExampleLine />
      <div className="mt-9 grid grid-cols-1 gap-9 lg:grid-cols-[minmax(0,944fr)_minmax(0,412fr)]">
        <Section
          title="Four things, then the first batch can leave"
          action={
            <span className="text-second text-quiet">{steps.filter((step) => step.done).length} of 4</span>
          }
        >
          <ol>
            {steps.map((step, at) => (
              <li
                key={step.title}
                className="flex flex-wrap items-start gap-x-6 gap-y-2 border-b border-rule py-3.5"
              >
                <span className="num w-8 text-thing leading-7 text-faint">{at + 1}</span>
                <div className="min-w-0 flex-1 basis-64">
                  <h3>{step.title}</h3>
                  <p className="max-w-md text-second text-quiet">{step.done ? 'Done.' : step.rest}</p>
                </div>
                {!step.done && step.ready && (
                  <ButtonLink href={step.href} look={at === next ? 'primary' : 'outlined'}>
                    {step.verb}
                  </ButtonLink>
                )}
              </li>
            ))}
          </ol>
        </Section>
        <Section title="What waits for me">
          <p className="py-2 text-quiet">
            Nothing yet. Late batches, questions from processors and papers to prove will stand here, worst
            first.
          </p>
        </Section>
      </div>
    </>
  );
}

/** One invented batch with its parts named, as the drawing of a tool in its manual. */
function ExampleLine() {
  return (
    <svg
      viewBox="0 0 1188 112"
      role="img"
      aria-label="How a batch lies on the line: from the day it left to the day it is promised, with a thread to the assembly that waits for it"
      className="h-auto w-full border-y-heavy border-ink max-md:hidden"
    >
      <rect width="690" height="112" fill="var(--bench)" />
      <path d="M690 0V112" stroke="var(--ink)" strokeWidth="2" />
      <path
        d="M422 40H768V64H422L414 56V48Z"
        fill="var(--paper)"
        stroke="var(--building-ink)"
        strokeWidth="1.25"
      />
      <circle cx="427" cy="52" r="6" fill="none" stroke="var(--building-ink)" />
      <text x="446" y="56.5" fontSize="13" fontWeight="600" className="fill-ink font-mono">
        B-0001
      </text>
      <text x="500" y="56.5" fontSize="14.5" fontWeight="600" className="fill-quiet font-cond">
        a batch looks like this
      </text>
      <text x="408" y="24" fontSize="13.5" textAnchor="end" className="fill-quiet font-cond">
        the day it left the yard
      </text>
      <path d="M414 20H422V38M414 72V98M768 72V98" fill="none" stroke="var(--line)" />
      <path d="M414 86H530M640 86H768" stroke="var(--line)" />
      <text x="585" y="91" fontSize="13.5" textAnchor="middle" className="fill-quiet font-cond">
        the days it is away
      </text>
      <text x="776" y="91" fontSize="13.5" className="fill-quiet font-cond">
        the day they promised
      </text>
      <path d="M772 52Q822 62 870 52" fill="none" stroke="var(--line)" />
      <circle cx="874" cy="52" r="3.5" fill="var(--paper)" stroke="var(--ink)" strokeWidth="1.4" />
      <text x="886" y="56.5" fontSize="14.5" fontWeight="600" className="fill-ink font-cond">
        the assembly that waits
      </text>
    </svg>
  );
}
