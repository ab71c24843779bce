import Link from "next/link";
import type { ReactNode } from "react";
import { KeysToggle } from "@/components/shell/keys-toggle";
import { NightToggle } from "@/components/shell/night-toggle";
import type { PlaceView } from "@/components/shell/places";

const MENU_ID = "me-menu";

export interface MeMenuProps {
  name: string;
  initials: string;
  shopName: string;
  /** Places that the bar has no room for. */
  places: readonly PlaceView[];
  signOut: string | ReactNode;
}

/** The person's own corner: account, night shift, keys, sign out. */
export function MeMenu({ name, initials, shopName, places, signOut }: MeMenuProps) {
  return (
    <>
      <button type="button" className="me" popoverTarget={MENU_ID} aria-label={`${name}, menu`}>
        <span aria-hidden="true">{initials}</span>
      </button>
      <div id={MENU_ID} popover="auto" className="me-menu" role="group" aria-label="Your menu">
        <p className="me-menu__who">
          <strong>{name}</strong>
          <br />
          {shopName}
        </p>
        {places.map((place) => (
          <Link key={place.slug} className="me-menu__row" href={place.href}>
            {place.title}
          </Link>
        ))}
        <Link className="me-menu__row" href="/account">
          Account
        </Link>
        <NightToggle />
        <KeysToggle />
        {typeof signOut === "string" ? (
          <a className="me-menu__row" href={signOut}>
            Sign out
          </a>
        ) : (
          signOut
        )}
      </div>
    </>
  );
}
