"use client";

import Link from "next/link";
import { FaultNote } from "@/components/cases/fault-note";
import { useSend, type FormAct } from "@/components/cases/use-send";
import { Field } from "@/components/ui/field";
import { Glyph } from "@/components/ui/glyph";
import { SubmitButton } from "@/components/ui/submit-button";
import { fieldFault, typed } from "@/lib/act-state";
import { SAVED_NAME_CHARS } from "@/lib/cases/saved-search.schema";

/** A search that this person keeps. */
export interface SavedSearchView {
  id: number;
  name: string;
  href: string;
  /** It is the one that is shown. */
  isShown: boolean;
}

type NameAct = FormAct<{ id: number; name: string }>;

interface SavedSearchesProps {
  searches: readonly SavedSearchView[];
  onRename: NameAct;
  onRemove: FormAct<{ id: number }>;
}

/** The searches that somebody keeps, each one press away; names and removals are folded away under them. */
export function SavedSearches({ searches, onRename, onRemove }: SavedSearchesProps) {
  if (searches.length === 0) return null;
  return (
    <nav className="saved" aria-label="Searches you keep">
      <p className="saved__head">Your searches</p>
      <ul className="saved__list">
        {searches.map(({ id, name, href, isShown }) => (
          <li key={id}>
            <Link className="saved__run" href={href} prefetch={false} aria-current={isShown ? "page" : undefined}>
              <Glyph name="ui-find" size={20} />
              <span>{name}</span>
            </Link>
          </li>
        ))}
      </ul>
      <details className="saved__change">
        <summary className="btn btn--quiet">
          <span className="btn__label">Rename or remove</span>
        </summary>
        <ul>
          {searches.map((search) => (
            <li key={search.id}>
              <RenameForm search={search} action={onRename} />
              <RemoveForm search={search} action={onRemove} />
            </li>
          ))}
        </ul>
      </details>
    </nav>
  );
}

function RenameForm({ search, action }: { search: SavedSearchView; action: NameAct }) {
  const { state, isBusy, form } = useSend(action);
  return (
    <form {...form} className="saved__row">
      <input type="hidden" name="id" value={search.id} />
      <Field
        label={`Name of “${search.name}”`}
        name="name"
        defaultValue={typed(state, "name", search.name)}
        key={search.name}
        error={fieldFault(state, "name")}
        maxLength={SAVED_NAME_CHARS}
        autoComplete="off"
        required
      />
      <SubmitButton busy={isBusy} aria-label={`Rename ${search.name}`}>
        Rename
      </SubmitButton>
      {!fieldFault(state, "name") && <FaultNote state={state} />}
    </form>
  );
}

function RemoveForm({ search, action }: { search: SavedSearchView; action: FormAct<{ id: number }> }) {
  const { state, isBusy, form } = useSend(action);
  return (
    <form {...form}>
      <input type="hidden" name="id" value={search.id} />
      <SubmitButton variant="hold" busy={isBusy} aria-label={`Remove ${search.name}`}>
        Remove
      </SubmitButton>
      <FaultNote state={state} title="Not removed" />
    </form>
  );
}

interface KeepSearchProps {
  /** The casebook's address as it is now, without page and tray. */
  query: string;
  onKeep: NameAct;
}

/** Keeps what is on the screen under a name. */
export function KeepSearch({ query, onKeep }: KeepSearchProps) {
  const { state, isBusy, form } = useSend(onKeep);
  return (
    <details className="saved-keep">
      <summary className="btn btn--plain">
        <Glyph name="ui-plus" />
        <span className="btn__label">Keep this search</span>
      </summary>
      <form {...form} className="saved__row">
        <input type="hidden" name="query" value={query} />
        <Field
          label="Name it"
          name="name"
          hint="Only you see it."
          defaultValue={typed(state, "name")}
          error={fieldFault(state, "name")}
          maxLength={SAVED_NAME_CHARS}
          autoComplete="off"
          required
        />
        <SubmitButton busy={isBusy}>Keep it</SubmitButton>
        {!fieldFault(state, "name") && <FaultNote state={state} />}
      </form>
    </details>
  );
}
