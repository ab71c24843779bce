import Link from "next/link";
import type { ReactNode } from "react";
import { MeMenu } from "@/components/shell/me-menu";
import { OfflineBar } from "@/components/shell/offline-bar";
import type { PlaceSlug, PlaceView } from "@/components/shell/places";
import type { ShellActor } from "@/components/shell/shop-shell";
import { Glyph } from "@/components/ui/glyph";
import { KeyCap, keyAttributes } from "@/components/ui/key-cap";

export interface BandProps {
  actor: ShellActor;
  places: readonly PlaceView[];
  here: PlaceSlug | null;
  strip?: ReactNode;
  signOut: string | ReactNode;
}

function Places({ places, here }: Pick<BandProps, "places" | "here">) {
  return (
    <nav className="places" aria-label="Places">
      {places
        .filter((place) => place.isInBar)
        .map((place) => (
          <Link key={place.slug} href={place.href} aria-current={place.slug === here ? "page" : undefined}>
            {place.title}
            {place.count ? <span className="waits">{place.count}</span> : null}
          </Link>
        ))}
    </nav>
  );
}

/** Top bar, bus bar and, where the screen has one, the line strip. */
export function Band({ actor, places, here, strip, signOut }: BandProps) {
  return (
    <header className="band">
      <div className="band__top">
        <Link className="brand" href="/">
          <Glyph name="mark" />
          Coppertell
        </Link>
        <Places places={places} here={here} />
        <span className="band__shop">{actor.shopName}</span>
        <Link className="find" href="/cases#find" {...keyAttributes("/")}>
          <Glyph name="ui-find" />
          <span className="find__word">Find</span>
          <KeyCap>/</KeyCap>
        </Link>
        <MeMenu
          name={actor.name}
          initials={actor.initials}
          shopName={actor.shopName}
          places={places.filter((place) => !place.isInBar)}
          signOut={signOut}
        />
      </div>
      <OfflineBar />
      {strip}
    </header>
  );
}

/** The band of screens without a person: sign-in, invite, customer report. */
export function PlainBand({ aside }: { aside?: ReactNode }) {
  return (
    <header className="band">
      <div className="band__top">
        <span className="brand">
          <Glyph name="mark" />
          Coppertell
        </span>
        {aside && <span className="band__shop">{aside}</span>}
      </div>
      <OfflineBar />
    </header>
  );
}
