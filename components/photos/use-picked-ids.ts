import { useEffect, useEffectEvent, useState, type Dispatch, type SetStateAction } from "react";

type Ids = readonly string[];

/**
 * The numbers of a form's photos. They outlive a reload, or the phone throwing the page out of memory while the camera is
 * open, but not the form itself: leaving it, or sending it, forgets them.
 * @param owner whose and what they are, so that nobody finds another person's photos in their form
 */
export function usePickedIds(owner: string, existing: Ids): [Ids, Dispatch<SetStateAction<Ids>>] {
  const [ids, setIds] = useState<Ids>(existing);
  const restore = useEffectEvent(() => {
    const picked = readPicked(owner);
    if (picked.length > 0) setIds((before) => (before.length > 0 ? before : picked));
  });

  useEffect(() => {
    restore();
    return () => forgetPicked(owner);
  }, [owner]);
  useEffect(() => {
    if (ids.length > 0) keepPicked(owner, ids);
    else forgetPicked(owner);
  }, [owner, ids]);
  return [ids, setIds];
}

const keyOf = (owner: string) => `coppertell:picked:${location.pathname}:${owner}`;

function keepPicked(owner: string, ids: Ids): void {
  try {
    sessionStorage.setItem(keyOf(owner), ids.join(" "));
  } catch {
    // A browser that keeps nothing: the photos themselves go up all the same.
  }
}

function readPicked(owner: string): Ids {
  try {
    return (sessionStorage.getItem(keyOf(owner)) ?? "").split(" ").filter(Boolean);
  } catch {
    return [];
  }
}

function forgetPicked(owner: string): void {
  try {
    sessionStorage.removeItem(keyOf(owner));
  } catch {
    // Nothing was kept.
  }
}
