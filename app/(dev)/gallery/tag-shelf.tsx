import { Tag } from "@/components/cases/tag";
import { TagClass } from "@/components/cases/tag-class";
import { TagPrint } from "@/components/cases/tag-print";
import { TagUpright } from "@/components/cases/tag-upright";
import { TagWire } from "@/components/cases/tag-wire";
import { TAG_STATES } from "@/components/cases/tag-state";
import { Button } from "@/components/ui/button";
import { LoadingTags } from "@/components/ui/loading-tag";
import { PhotoFrame } from "@/components/ui/photo-frame";
import { PickGroup } from "@/components/ui/pick";
import { Range } from "@/components/ui/range";
import { Section } from "@/components/ui/section";
import { PHOTO, TAGS } from "./fixtures";

/** Lists: every state, on the upright wire and in the queue. */
export function TagLists() {
  return (
    <>
      <Section title="Hold tags" aside="The tail tells the state, in shape and in words">
        <div className="cols">
          <TagWire label="Every state">
            {TAGS.slice(0, 5).map((tag) => (
              <Tag key={tag.caseRef} {...tag} />
            ))}
          </TagWire>
          <TagWire label="Every state, going on" words="9 of 31">
            {TAGS.slice(5).map((tag) => (
              <Tag key={tag.caseRef} {...tag} />
            ))}
          </TagWire>
        </div>
      </Section>
      <Section title="The queue">
        <TagWire layout="rail" label="Waiting for the second look" words="5 of 31">
          {TAGS.slice(0, 5).map((tag, index) => (
            <Tag key={tag.caseRef} {...tag} photo={undefined} stake="$412" current={index === 0} />
          ))}
        </TagWire>
      </Section>
      <Section title="On its way">
        <LoadingTags count={1} />
      </Section>
    </>
  );
}

/** Casebook cards: every state, upright on the rail. */
export function TagCards() {
  return (
    <Section title="Casebook cards">
      <TagWire layout="rack" label="Closed cases">
        {TAG_STATES.map((state) => (
          <TagUpright
            key={state}
            size="card"
            as="article"
            caseRef="CT-2606-0117"
            state={state}
            stateWords={state}
            progress={0.5}
            current={state === "scrap"}
          >
            <TagClass slug="underactivation" words="Underactivation" href={`#${state}`} level={3} />
            <p className="tag__meta">12 of 60 shells. Thin by the keyway, lifted on the tape.</p>
            <div className="pair tag-bleed">
              <PhotoFrame {...PHOTO} alt="Shell before" caption="Before" />
              <PhotoFrame src={null} alt="" missing="No re-strike. Scrapped" />
            </div>
          </TagUpright>
        ))}
      </TagWire>
    </Section>
  );
}

const CLASS_OPTIONS = [
  { value: "underactivation", label: "Underactivation", glyph: "underactivation", figure: "64%", keyCap: "1" },
  { value: "dewetting", label: "Dewetting", glyph: "dewetting", figure: "21%", keyCap: "2" },
  { value: "peeling", label: "Peeling", glyph: "peeling", figure: "9%", keyCap: "3" },
  { value: "sound", label: "Sound, release it", glyph: "sound", figure: "2%", keyCap: "0" },
] as const;
const DOINGS = ["Rework", "Scrap", "Concession", "Regrade"].map((label) => ({ value: label.toLowerCase(), label }));

/** The second look's form is a tag; beside it the one that is printed. */
export function TagForms() {
  return (
    <Section title="Upright">
      <div className="cols">
        <TagUpright
          caseRef="CT-2607-0042"
          state="held"
          headingLevel={3}
          sub={
            <>
              Orrin &amp; Pike, 3 of 48 shells, brass C360
              <br />
              First call by Tobias L: underactivation, fairly sure
            </>
          }
        >
          <PickGroup
            legend="Class"
            name="gallery-class"
            kind="radio"
            layout="list"
            options={CLASS_OPTIONS}
            defaultValue="underactivation"
          />
          <PickGroup
            legend="What to do"
            legendAside="in this shop, 41 cases"
            name="gallery-doing"
            kind="radio"
            layout="bar"
            options={DOINGS}
            defaultValue="rework"
          />
          <div className="picks-set">
            <Range
              low={296}
              likely={412}
              high={547}
              max={560}
              words={{ low: "$296", likely: "$412", high: "$547, 90% range" }}
              mark={{ at: 31, words: "$24 to $39 now" }}
              estimate
            />
          </div>
          <div className="tag-foot">
            <Button variant="main" keyCap="↵" wide>
              Confirm and send the card
            </Button>
          </div>
        </TagUpright>
        <TagPrint
          shopName="Fernhollow Finishing"
          caseRef="CT-2607-0042"
          classWords="Underactivation?"
          lines={[
            { label: "Job", value: "J-3318 Orrin & Pike" },
            { label: "Parts", value: "3 of 48, brass C360" },
            { label: "Hung", value: "14 Jul 10:12, Tobias L" },
          ]}
          qr={
            <svg viewBox="0 0 10 10" aria-hidden="true">
              <path d="M0 0h10v10H0zM1 1v8h8V1zM3 3h4v4H3z" fillRule="evenodd" />
            </svg>
          }
        />
      </div>
    </Section>
  );
}
