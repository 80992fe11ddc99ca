import { STAGES } from '@/lib/batches/stage';
import { PageHead } from '@/components/ui/page-head';
import { Section } from '@/components/ui/section';
import { StageMark } from '@/components/ui/marks';
import { StageWord } from '@/components/ui/stage-word';
import { BatchTag, type TagSize } from '@/components/ui/tag';
import { TitleCells } from '@/components/ui/title-cells';
import { Button } from '@/components/ui/button';

const SIZES: readonly TagSize[] = ['phone', 'list', 'tideline', 'row'];

export function DemoTags() {
  return (
    <Section title="The tag" note="46, 34, 26, 24 and 22 px high">
      <PageHead
        tag={<BatchTag stage="building" number="B-0419" size="head" />}
        cells={
          <TitleCells
            cells={[
              { caption: 'To', value: 'Ostrow Heat Treating' },
              { caption: 'Step', value: 'Solution, quench, natural age' },
              { caption: 'Order', value: <span className="num">TS-1187</span> },
              { caption: 'Wanted back', value: 'Thu 30 Apr' },
            ]}
          />
        }
        actions={
          <>
            <Button>Put aside</Button>
            <Button look="primary" notNow="1 check stops it" reasonAt="elsewhere">
              Dispatch
            </Button>
          </>
        }
      />
      <div className="flex flex-wrap gap-3 py-2">
        <BatchTag stage="at_processor" number="B-0418" size="head" />
        <BatchTag stage="proved" number="B-0417" size="head" />
        <BatchTag stage="held" number="B-0416" size="head" />
      </div>
      {SIZES.map((size) => (
        <div key={size} className="flex flex-wrap items-center gap-2 py-1.5">
          {STAGES.map((stage, index) => (
            <BatchTag
              key={stage}
              stage={stage}
              number={`B-04${11 + index}`}
              size={size}
              href="/dev/components"
            />
          ))}
        </div>
      ))}
      <div className="flex flex-wrap items-center gap-3 py-1.5">
        <BatchTag
          stage="at_processor"
          number="B-0404"
          text="41 chine angles, T62"
          href="/dev/components"
          daysLate={6}
          sentence="holds up Left float 17"
        />
        <BatchTag stage="held" number="B-0401" text="16 fittings, bake late" href="/dev/components" />
        <BatchTag stage="dispatched" number="B-0416" text="no date yet" fading />
        <span className="w-52">
          <BatchTag
            stage="at_processor"
            number="B-0411"
            text="18 strut ends, back Tue 21 Apr"
            href="/dev/components"
            wide
          />
        </span>
        <BatchTag stage="at_processor" number="B-0414" show="number" />
        <BatchTag stage="returned" number="B-0406" show="mark" />
        <span className="bg-bench p-3">
          <span className="lw-focus inline-flex">
            <BatchTag stage="at_processor" number="B-0404" />
          </span>
        </span>
      </div>
      <div className="py-1.5 grayscale">
        <div className="flex flex-wrap items-center gap-2">
          {STAGES.map((stage) => (
            <BatchTag key={stage} stage={stage} number="B-0411" size="row" />
          ))}
        </div>
      </div>
      <div className="flex flex-wrap items-center gap-5 py-2">
        {STAGES.map((stage) => (
          <span key={stage} className="flex items-center gap-2">
            <StageMark stage={stage} size={28} />
            <StageWord stage={stage} />
          </span>
        ))}
      </div>
    </Section>
  );
}
