import type { ReactNode } from "react";
import type { Role } from "@/lib/cases/case-words";
import { Band } from "@/components/shell/band";
import { GoToSheet } from "@/components/shell/go-to";
import { HotKeys } from "@/components/shell/hot-keys";
import type { MainAction } from "@/components/shell/main-action";
import { placesFor, type PlaceCounts, type PlaceSlug } from "@/components/shell/places";
import { ThumbBar } from "@/components/shell/thumb-bar";
import { ToastHost } from "@/components/ui/toast";

export interface ShellActor {
  name: string;
  initials: string;
  roles: readonly Role[];
  shopName: string;
}

export interface ShopShellProps {
  actor: ShellActor;
  /** Which place is lit; null on account pages and the like. */
  here: PlaceSlug | null;
  /** `{ "second-look": 6 }` */
  counts?: PlaceCounts;
  /** A LineStrip; none on snap, practice and sign-in. */
  strip?: ReactNode;
  /** A NarrowedBar. */
  narrowed?: ReactNode;
  /** The one main action, in the thumb bar below 1080 px. From there up the page shows it itself: `Lead main`, or last in its form. */
  main?: MainAction | null;
  /** "Back" instead of "Go to" at the left end of the thumb bar. */
  back?: string | null;
  /** Replaces the thumb bar, for screens whose main action needs script. Use ThumbBar. */
  thumb?: ReactNode;
  /** page: 1440 px at most, with gutters. bleed: the screen lays itself out. */
  width?: "page" | "bleed";
  /** Where "Sign out" leads, or what stands in its place. */
  signOut?: string | ReactNode;
  className?: string;
  children: ReactNode;
}

/** What every screen of the shop stands in: the wet line on top, paper below, the thumb bar at the foot. */
export function ShopShell(props: ShopShellProps) {
  const { actor, here, counts, strip, narrowed, main = null, back = null, width = "page", children } = props;
  const places = placesFor(actor.roles, counts);
  const mainClass = [width === "page" && "page", "has-thumb", props.className].filter(Boolean).join(" ");
  return (
    <>
      <a className="skip" href="#work">
        Skip to the work
      </a>
      <Band actor={actor} places={places} here={here} strip={strip} signOut={props.signOut ?? "/api/auth/signout"} />
      {narrowed}
      <main id="work" tabIndex={-1} className={mainClass}>
        {children}
      </main>
      {props.thumb ?? <ThumbBar back={back} main={main} />}
      <GoToSheet places={places} here={here} />
      <ToastHost />
      <HotKeys />
    </>
  );
}
