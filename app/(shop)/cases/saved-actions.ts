"use server";

import { keepSearchSchema, removeSearchSchema, renameSearchSchema } from "@/lib/cases/saved-search.schema";
import { routes } from "@/lib/routes";
import { act } from "@/lib/server/act";
import * as saved from "@/lib/server/cases/saved-searches";

const showing = () => [routes.casebook()];

export const keepSearch = act({
  permission: "search.keep",
  input: keepSearchSchema,
  run: ({ input, ...doing }) => saved.keepSearch(doing, input),
  revalidate: showing,
});

export const renameSearch = act({
  permission: "search.keep",
  input: renameSearchSchema,
  run: ({ input, ...doing }) => saved.renameSearch(doing, input),
  revalidate: showing,
});

export const removeSearch = act({
  permission: "search.keep",
  input: removeSearchSchema,
  run: ({ input, ...doing }) => saved.removeSearch(doing, input),
  revalidate: showing,
});
