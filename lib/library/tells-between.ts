/** A class of the shop's shelf with what tells it from others. */
export interface TellingClass {
  slug: string;
  title: string;
  tells: readonly { versus: string; tell: string }[];
}

/** Two classes that may be taken for each other, and what each one's page says of the other. */
export interface TellsBetween {
  one: { slug: string; title: string; tell: string | null };
  other: { slug: string; title: string; tell: string | null };
}

/** What tells these classes apart, each pair once; a pair of which no page says anything is left in, without words. */
export function tellsBetween(classes: readonly TellingClass[]): TellsBetween[] {
  const side = (of: TellingClass, versus: TellingClass) => ({
    slug: of.slug,
    title: of.title,
    tell: of.tells.find((each) => each.versus === versus.slug)?.tell ?? null,
  });
  return classes.flatMap((one, index) =>
    classes.slice(index + 1).map((other) => ({ one: side(one, other), other: side(other, one) })),
  );
}
