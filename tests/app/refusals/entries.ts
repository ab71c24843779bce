import { randomUUID } from "node:crypto";
import { NextRequest } from "next/server";
import * as account from "@/app/(shop)/account/actions";
import * as caseActions from "@/app/(shop)/cases/actions";
import * as savedActions from "@/app/(shop)/cases/saved-actions";
import * as jobActions from "@/app/(shop)/cases/jobs/actions";
import * as tagCode from "@/app/(shop)/cases/[ref]/tag/code.svg/route";
import * as editActions from "@/app/(shop)/library/edit/actions";
import * as portActions from "@/app/(shop)/library/port/actions";
import * as metalActions from "@/app/(shop)/metals/actions";
import * as costActions from "@/app/(shop)/costs/actions";
import * as wayActions from "@/app/(shop)/costs/strip/ways/actions";
import * as crew from "@/app/(shop)/crew/actions";
import * as callsRoute from "@/app/api/cases/[ref]/calls/route";
import * as confirmationRoute from "@/app/api/cases/[ref]/confirmation/route";
import * as outcomeRoute from "@/app/api/cases/[ref]/outcome/route";
import * as caseRoute from "@/app/api/cases/[ref]/route";
import * as casesRoute from "@/app/api/cases/route";
import * as practiceActions from "@/app/(shop)/practice/actions";
import * as practiceAnswerRoute from "@/app/api/practice/questions/[id]/answer/route";
import * as practicePhotoRoute from "@/app/api/practice/questions/[id]/photo/route";
import * as practiceQuestionRoute from "@/app/api/practice/questions/[id]/route";
import * as practiceQuestionsRoute from "@/app/api/practice/questions/route";
import * as inspectRoute from "@/app/api/estimates/inspect/route";
import * as plateRoute from "@/app/api/estimates/plate/route";
import * as stripRoute from "@/app/api/estimates/strip/route";
import * as testPiecesRoute from "@/app/api/estimates/test-pieces/route";
import * as ledgerRoute from "@/app/api/ledger/route";
import * as libraryClassRoute from "@/app/api/library/[class]/route";
import * as libraryEntriesRoute from "@/app/api/library/entries/route";
import * as libraryExportRoute from "@/app/api/library/export/route";
import * as libraryRoute from "@/app/api/library/route";
import * as partCheckRoute from "@/app/api/part-check/route";
import * as photoSizeRoute from "@/app/api/photos/[id]/[size]/route";
import * as photoRoute from "@/app/api/photos/[id]/route";
import { getStripRow } from "@/db/queries/strip-table";
import { priceFieldName } from "@/lib/costs/rate-fields";
import type { ActState } from "@/lib/act-state";
import type { FaultCode } from "@/lib/fault";
import type { Permission } from "@/lib/permissions";
import { TEST_PASSWORD } from "@/tests/fixtures/crew-factory";
import { makeConfirmation, makeSnap } from "@/tests/fixtures/shop-factory";
import { bathForm, newBathForm, polishForm } from "@/tests/fixtures/strip-form";
import {
  closedCase,
  closedJob,
  confirmedCase,
  heldCase,
  keptSearch,
  loosePhoto,
  openQuestion,
  pendingInvite,
  readyPhoto,
  setDrillFor,
  stepsOf,
  tickedCase,
  type Aim,
} from "./targets";
import { EDIT, entryForm, libraryFileText, overtakenDraft } from "./library-targets";

export const UPLOADS = process.env.UPLOADS_DIR ?? "uploads";

/** How a call ended: "ok", or the fault's code. */
export type Ending = "ok" | FaultCode;

export interface Entry {
  /** File and export, as the completeness check finds them. */
  name: string;
  permission: Permission;
  /** `row`: aims at a row of a shop. `self`: only ever touches the caller. `shop`: lists or makes, aims at no row. */
  aims: "row" | "self" | "shop";
  /** Makes the row that the call aims at, and hands back the call. */
  prepare: (aim: Aim) => () => Promise<Ending>;
}

/** Sends a form that is made already, as the browser would. */
async function endingOf(action: unknown, data: FormData): Promise<Ending> {
  const state = await (action as Action)(null, data);
  if (!state) throw new Error("The action gave nothing back.");
  return state.ok ? "ok" : state.fault.code;
}

type Action = (previous: ActState<never>, form: FormData) => Promise<ActState<unknown>>;
type Route = (request: NextRequest, context: { params: Promise<Record<string, string>> }) => Promise<Response>;

function form(values: Record<string, unknown>): FormData {
  const data = new FormData();
  for (const [name, value] of Object.entries(values)) {
    if (value === undefined || value === null) continue;
    if (Array.isArray(value)) for (const each of value) data.append(`${name}[]`, String(each));
    else data.append(name, String(value));
  }
  return data;
}

const ending = (action: unknown, values: Record<string, unknown>) => endingOf(action, form(values));

async function answered(
  route: unknown,
  method: string,
  path: string,
  params: Record<string, string>,
  body?: unknown,
): Promise<Ending> {
  const headers = body === undefined ? undefined : { "content-type": "application/json" };
  const request = new NextRequest(`http://localhost:3000${path}`, {
    method,
    headers,
    body: body === undefined ? undefined : JSON.stringify(body),
  });
  const response = await (route as Route)(request, { params: Promise.resolve(params) });
  if (response.ok) {
    await response.arrayBuffer();
    return "ok";
  }
  return ((await response.json()) as { code: FaultCode }).code;
}

const CASES = "app/(shop)/cases/actions.ts";
const JOBS = "app/(shop)/cases/jobs/actions.ts";
const CREW = "app/(shop)/crew/actions.ts";
const WAYS = "app/(shop)/costs/strip/ways/actions.ts";
const ACCOUNT = "app/(shop)/account/actions.ts";

/** A way to strip as the aim's shop has it. */
function wayOf(aim: Aim, slug: string) {
  const way = getStripRow(aim.db, aim.shop.shopId, slug);
  if (!way) throw new Error(`The shop has no way ${slug}.`);
  return way;
}

/** Flattens a confirmation into what a form sends: the steps are one JSON field. */
const confirmationForm = (aim: Aim, ref: string) => {
  const { steps, ...rest } = makeConfirmation(aim.db, aim.shop, ref);
  return { ...rest, steps: JSON.stringify(steps) };
};

const caseEntry = (name: string, permission: Permission, prepare: Entry["prepare"]): Entry => ({
  name: `${CASES} ${name}`,
  permission,
  aims: "row",
  prepare,
});

export const ENTRIES: readonly Entry[] = [
  caseEntry("addCall", "case.call", (aim) => {
    const { ref } = heldCase(aim);
    return () => ending(caseActions.addCall, { ref, calledClass: "dewetting", sure: 2 });
  }),
  caseEntry("confirmCase", "case.confirm", (aim) => {
    const { ref } = heldCase(aim);
    return () => ending(caseActions.confirmCase, confirmationForm(aim, ref));
  }),
  caseEntry("releaseCase", "case.confirm", (aim) => {
    const { ref } = heldCase(aim);
    return () => ending(caseActions.releaseCase, { ref, why: "only light" });
  }),
  caseEntry("tickStep", "card.work", (aim) => {
    const { ref, id } = confirmedCase(aim);
    const [stepId] = stepsOf(aim, id);
    return () => ending(caseActions.tickStep, { ref, stepId, spentMinutes: 4 });
  }),
  caseEntry("recordOutcome", "card.work", (aim) => {
    const { ref } = tickedCase(aim);
    return () => ending(caseActions.recordOutcome, { ref, outcome: "sound", note: "tape clean" });
  }),
  caseEntry("disposeCase", "case.confirm", (aim) => {
    const { ref } = confirmedCase(aim);
    return () => ending(caseActions.disposeCase, { ref, disposition: "scrap", why: "eaten away" });
  }),
  caseEntry("takeBack", "case.confirm", (aim) => {
    const { ref } = confirmedCase(aim);
    return () => ending(caseActions.takeBack, { ref, why: "wrong class" });
  }),
  caseEntry("reopenCase", "case.confirm", (aim) => {
    const { ref } = closedCase(aim);
    return () => ending(caseActions.reopenCase, { ref, why: "came loose" });
  }),
  caseEntry("amendCase", "case.amend", (aim) => {
    const { ref } = heldCase(aim);
    return () =>
      ending(caseActions.amendCase, { ref, quantity: 4, baseMetal: "brass", stageFound: "at-strike", note: "" });
  }),
  caseEntry("chooseStripMethod", "case.confirm", (aim) => {
    const { ref } = heldCase(aim);
    return () => ending(caseActions.chooseStripMethod, { ref, method: "polish-back" });
  }),
  caseEntry("setExemplar", "exemplar.choose", (aim) => {
    const { ref, photoId } = readyPhoto(aim, UPLOADS);
    return () => ending(caseActions.setExemplar, { ref, photoId, chosen: "true" });
  }),

  {
    name: `${JOBS} openJob`,
    permission: "job.keep",
    aims: "shop",
    prepare: () => () =>
      ending(jobActions.openJob, {
        number: randomUUID(),
        customer: "New Customer",
        partName: "rotor",
        baseMetal: "steel",
        quantity: 12,
        areaDm2: "2.5",
      }),
  },
  {
    name: `${JOBS} changeJob`,
    permission: "job.change",
    aims: "row",
    prepare: (aim) => () =>
      ending(jobActions.changeJob, { jobId: aim.shop.jobId, quantity: 60, areaDm2: "1.5", partValue: "40" }),
  },
  {
    name: `${JOBS} closeJob`,
    permission: "job.change",
    aims: "row",
    prepare: (aim) => () => ending(jobActions.closeJob, { jobId: aim.shop.jobId }),
  },
  {
    name: `${JOBS} reopenJob`,
    permission: "job.change",
    aims: "row",
    prepare: (aim) => {
      const jobId = closedJob(aim);
      return () => ending(jobActions.reopenJob, { jobId });
    },
  },

  {
    name: "app/(shop)/cases/saved-actions.ts keepSearch",
    permission: "search.keep",
    aims: "self",
    prepare: () => () => ending(savedActions.keepSearch, { name: "Brass haze", query: "metal=brass" }),
  },
  {
    name: "app/(shop)/cases/saved-actions.ts renameSearch",
    permission: "search.keep",
    aims: "row",
    prepare: (aim) => {
      const id = keptSearch(aim);
      return () => ending(savedActions.renameSearch, { id, name: "Brass, all of it" });
    },
  },
  {
    name: "app/(shop)/cases/saved-actions.ts removeSearch",
    permission: "search.keep",
    aims: "row",
    prepare: (aim) => {
      const id = keptSearch(aim);
      return () => ending(savedActions.removeSearch, { id });
    },
  },
  {
    name: "app/(shop)/practice/actions.ts askForPhoto",
    permission: "practice.do",
    aims: "row",
    prepare: (aim) => {
      const drillId = setDrillFor(aim);
      return () => ending(practiceActions.askForPhoto, { drillId });
    },
  },
  {
    name: "app/(shop)/practice/actions.ts callPhoto",
    permission: "practice.do",
    aims: "row",
    prepare: (aim) => {
      const id = openQuestion(aim, UPLOADS);
      return () => ending(practiceActions.callPhoto, { id, calledClass: "dewetting", sure: 2 });
    },
  },
  {
    name: "app/(shop)/practice/actions.ts setDrill",
    permission: "drill.set",
    aims: "row",
    prepare: (aim) => {
      readyPhoto(aim, UPLOADS);
      const memberIds = [aim.shop.members.trainee.memberId];
      return () => ending(practiceActions.setDrill, { title: "Peeling", photoCount: 1, memberIds });
    },
  },
  {
    name: "app/(shop)/practice/actions.ts withdrawDrill",
    permission: "drill.set",
    aims: "row",
    prepare: (aim) => {
      const drillId = setDrillFor(aim);
      return () => ending(practiceActions.withdrawDrill, { drillId });
    },
  },
  {
    name: "app/api/practice/questions/route.ts POST",
    permission: "practice.do",
    aims: "row",
    prepare: (aim) => {
      const drillId = setDrillFor(aim);
      return () => answered(practiceQuestionsRoute.POST, "POST", "/api/practice/questions", {}, { drillId });
    },
  },
  {
    name: "app/api/practice/questions/[id]/route.ts GET",
    permission: "practice.do",
    aims: "row",
    prepare: (aim) => {
      const id = openQuestion(aim, UPLOADS);
      return () => answered(practiceQuestionRoute.GET, "GET", `/api/practice/questions/${id}`, { id });
    },
  },
  {
    name: "app/api/practice/questions/[id]/answer/route.ts POST",
    permission: "practice.do",
    aims: "row",
    prepare: (aim) => {
      const id = openQuestion(aim, UPLOADS);
      const body = { calledClass: "dewetting", sure: 2 };
      return () => answered(practiceAnswerRoute.POST, "POST", `/api/practice/questions/${id}/answer`, { id }, body);
    },
  },
  {
    name: "app/api/practice/questions/[id]/photo/route.ts GET",
    permission: "practice.do",
    aims: "row",
    prepare: (aim) => {
      const id = openQuestion(aim, UPLOADS);
      return () => answered(practicePhotoRoute.GET, "GET", `/api/practice/questions/${id}/photo?size=thumb`, { id });
    },
  },

  {
    name: `${CREW} invitePerson`,
    permission: "crew.manage",
    aims: "shop",
    prepare: () => () =>
      ending(crew.invitePerson, { email: `${randomUUID()}@new.example`, name: "New Person", roles: ["plater"] }),
  },
  {
    name: `${CREW} sendInviteAgain`,
    permission: "crew.manage",
    aims: "row",
    prepare: (aim) => {
      const inviteId = pendingInvite(aim);
      return () => ending(crew.sendInviteAgain, { inviteId });
    },
  },
  {
    name: `${CREW} takeInviteBack`,
    permission: "crew.manage",
    aims: "row",
    prepare: (aim) => {
      const inviteId = pendingInvite(aim);
      return () => ending(crew.takeInviteBack, { inviteId });
    },
  },
  {
    name: `${CREW} changeMemberRoles`,
    permission: "crew.manage",
    aims: "row",
    prepare: (aim) => () =>
      ending(crew.changeMemberRoles, { memberId: aim.shop.members.otherPlater.memberId, roles: ["trainee"] }),
  },
  {
    name: `${CREW} removeFromCrew`,
    permission: "crew.manage",
    aims: "row",
    prepare: (aim) => () => ending(crew.removeFromCrew, { memberId: aim.shop.members.otherPlater.memberId }),
  },

  {
    name: `${ACCOUNT} renameMe`,
    permission: "account.edit",
    aims: "self",
    prepare: () => () => ending(account.renameMe, { name: "Another Name" }),
  },
  {
    name: `${ACCOUNT} chooseMyMails`,
    permission: "account.edit",
    aims: "self",
    prepare: () => () => ending(account.chooseMyMails, { kinds: ["case-confirmed"] }),
  },
  {
    name: `${ACCOUNT} changeMyPassword`,
    permission: "account.edit",
    aims: "self",
    prepare: () => () =>
      ending(account.changeMyPassword, { currentPassword: TEST_PASSWORD, password: "nine green kettles sing" }),
  },
  {
    name: `${ACCOUNT} signMeOut`,
    permission: "account.edit",
    aims: "self",
    prepare: () => () => ending(account.signMeOut, {}),
  },
  {
    name: `${ACCOUNT} signMeOutEverywhere`,
    permission: "account.edit",
    aims: "self",
    prepare: () => () => ending(account.signMeOutEverywhere, {}),
  },

  {
    name: "app/api/cases/route.ts GET",
    permission: "case.see",
    aims: "shop",
    prepare: () => () => answered(casesRoute.GET, "GET", "/api/cases", {}),
  },
  {
    name: "app/api/cases/route.ts POST",
    permission: "case.snap",
    aims: "row",
    prepare: (aim) => () => answered(casesRoute.POST, "POST", "/api/cases", {}, makeSnap(aim.shop)),
  },
  {
    name: "app/api/cases/[ref]/route.ts GET",
    permission: "case.see",
    aims: "row",
    prepare: (aim) => {
      const { ref } = heldCase(aim);
      return () => answered(caseRoute.GET, "GET", `/api/cases/${ref}`, { ref });
    },
  },
  {
    name: "app/api/cases/[ref]/calls/route.ts POST",
    permission: "case.call",
    aims: "row",
    prepare: (aim) => {
      const { ref } = heldCase(aim);
      return () =>
        answered(callsRoute.POST, "POST", `/api/cases/${ref}/calls`, { ref }, { calledClass: "dewetting", sure: 2 });
    },
  },
  {
    name: "app/api/cases/[ref]/confirmation/route.ts POST",
    permission: "case.confirm",
    aims: "row",
    prepare: (aim) => {
      const { ref } = heldCase(aim);
      const body = makeConfirmation(aim.db, aim.shop, ref);
      return () => answered(confirmationRoute.POST, "POST", `/api/cases/${ref}/confirmation`, { ref }, body);
    },
  },
  {
    name: "app/api/cases/[ref]/outcome/route.ts POST",
    permission: "card.work",
    aims: "row",
    prepare: (aim) => {
      const { ref } = tickedCase(aim);
      return () =>
        answered(
          outcomeRoute.POST,
          "POST",
          `/api/cases/${ref}/outcome`,
          { ref },
          { outcome: "sound", note: "tape clean" },
        );
    },
  },
  {
    name: "app/(shop)/cases/[ref]/tag/code.svg/route.ts GET",
    permission: "case.see",
    aims: "row",
    prepare: (aim) => {
      const { ref } = heldCase(aim);
      return () => answered(tagCode.GET, "GET", `/cases/${ref}/tag/code.svg`, { ref });
    },
  },
  {
    name: "app/(shop)/costs/actions.ts addRates",
    permission: "rates.set",
    aims: "shop",
    prepare: () => () =>
      ending(costActions.addRates, {
        validFrom: new Intl.DateTimeFormat("en-CA").format(Date.now() + 2 * 86_400_000),
        source: "price list of the week",
        labour: "61",
        line: "40",
        abrasive: "0.1",
        solution: "6",
        waste: "4",
        [priceFieldName("Ni")]: "20",
        [priceFieldName("Au")]: "130",
        [priceFieldName("Cu")]: "10",
      }),
  },
  {
    name: `${WAYS} changeBath`,
    permission: "strips.set",
    aims: "row",
    prepare: (aim) => {
      const { id, row } = wayOf(aim, "zinc-hydrochloric");
      if (row.method === "polish-back") throw new Error("That is no bath.");
      const data = bathForm(id, row, { price: "7" });
      return () => endingOf(wayActions.changeBath, data);
    },
  },
  {
    name: `${WAYS} changePolishing`,
    permission: "strips.set",
    aims: "row",
    prepare: (aim) => {
      const { id, row } = wayOf(aim, "polish-back");
      const data = polishForm(id, row, { source: "clocked here" });
      return () => endingOf(wayActions.changePolishing, data);
    },
  },
  {
    name: `${WAYS} turnWay`,
    permission: "strips.set",
    aims: "row",
    prepare: (aim) => {
      const { id, row } = wayOf(aim, "zinc-hydrochloric");
      return () => ending(wayActions.turnWay, { slug: row.id, startedFrom: id, retired: "true" });
    },
  },
  {
    name: `${WAYS} addBath`,
    permission: "strips.set",
    aims: "shop",
    prepare: () => () => endingOf(wayActions.addBath, newBathForm()),
  },
  {
    name: "app/(shop)/metals/actions.ts keepPartCheck",
    permission: "part.check",
    aims: "row",
    prepare: (aim) => {
      const { ref } = heldCase(aim);
      const weights = { air: "48.6", water: "41.3", temp: "22", error: "0.1", pull: "none", colour: "blue-grey" };
      return () => ending(metalActions.keepPartCheck, { ...weights, jobId: aim.shop.jobId, case: ref });
    },
  },
  {
    name: "app/api/library/route.ts GET",
    permission: "library.see",
    aims: "shop",
    prepare: () => () => answered(libraryRoute.GET, "GET", "/api/library?q=smut", {}),
  },
  {
    name: "app/api/library/entries/route.ts GET",
    permission: "library.see",
    aims: "shop",
    prepare: () => () => answered(libraryEntriesRoute.GET, "GET", "/api/library/entries", {}),
  },
  {
    name: "app/api/library/export/route.ts GET",
    permission: "library.edit",
    aims: "shop",
    prepare: () => () => answered(libraryExportRoute.GET, "GET", "/api/library/export", {}),
  },
  {
    name: `${EDIT} saveEntry`,
    permission: "library.edit",
    aims: "shop",
    prepare: (aim) => () => endingOf(editActions.saveEntry, entryForm(aim, "water-spots", { baseRevision: "1" })),
  },
  {
    name: `${EDIT} settleEntry`,
    permission: "library.edit",
    aims: "row",
    prepare: (aim) => {
      const { slug, draftId, standing } = overtakenDraft(aim);
      return () => ending(editActions.settleEntry, { entry: "class", slug, draftId, theirRevision: standing });
    },
  },
  {
    name: `${EDIT} dropDraft`,
    permission: "library.edit",
    aims: "row",
    prepare: (aim) => {
      const { slug } = overtakenDraft(aim);
      return () => ending(editActions.dropDraft, { entry: "class", slug });
    },
  },
  {
    name: `${EDIT} bringBack`,
    permission: "library.edit",
    aims: "row",
    prepare: (aim) => {
      const { slug, firstId, standing } = overtakenDraft(aim);
      return () => ending(editActions.bringBack, { entry: "class", slug, baseRevision: standing, revisionId: firstId });
    },
  },
  {
    name: `${EDIT} removeEntry`,
    permission: "library.edit",
    aims: "row",
    prepare: (aim) => {
      const { slug, standing } = overtakenDraft(aim);
      return () => ending(editActions.removeEntry, { entry: "class", slug, baseRevision: standing });
    },
  },
  {
    name: "app/(shop)/library/port/actions.ts lookAtFile",
    permission: "library.edit",
    aims: "shop",
    prepare: () => () => {
      const data = new FormData();
      data.set("file", new Blob([libraryFileText()], { type: "application/json" }));
      return endingOf(portActions.lookAtFile, data);
    },
  },
  {
    name: "app/(shop)/library/port/actions.ts bringIn",
    permission: "library.edit",
    aims: "shop",
    prepare: () => () =>
      ending(portActions.bringIn, {
        from: "file",
        text: libraryFileText(),
        as: "publish",
        pick: ["source/works-manual@0"],
      }),
  },
  {
    name: "app/api/library/[class]/route.ts GET",
    permission: "library.see",
    aims: "shop",
    prepare: () => () => answered(libraryClassRoute.GET, "GET", "/api/library/dewetting", { class: "dewetting" }),
  },
  {
    name: "app/api/estimates/plate/route.ts POST",
    permission: "plating.reckon",
    aims: "shop",
    prepare: () => () =>
      answered(
        plateRoute.POST,
        "POST",
        "/api/estimates/plate",
        {},
        { metal: "Ni", areaDm2: 1, thicknessUm: 4, currentDensityADm2: 4 },
      ),
  },
  {
    name: "app/api/estimates/inspect/route.ts POST",
    permission: "strip.estimate",
    aims: "shop",
    prepare: () => () =>
      answered(
        inspectRoute.POST,
        "POST",
        "/api/estimates/inspect",
        {},
        { checkCost: 1, missCost: 50, inspected: 200, bad: 4 },
      ),
  },
  {
    name: "app/api/estimates/test-pieces/route.ts POST",
    permission: "plating.reckon",
    aims: "shop",
    prepare: () => () =>
      answered(testPiecesRoute.POST, "POST", "/api/estimates/test-pieces", {}, { badShare: 0.05, pieces: 59 }),
  },
  {
    name: "app/api/estimates/strip/route.ts POST",
    permission: "strip.estimate",
    aims: "shop",
    prepare: () => () =>
      answered(
        stripRoute.POST,
        "POST",
        "/api/estimates/strip",
        {},
        {
          quantity: 3,
          areaDm2: 1,
          baseMetal: "brass",
          stack: [{ metal: "Cu", thicknessUm: 0.5 }],
          stageFound: "at-strike",
        },
      ),
  },
  {
    name: "app/api/ledger/route.ts GET",
    permission: "ledger.see",
    aims: "shop",
    prepare: () => () => answered(ledgerRoute.GET, "GET", "/api/ledger?by=cause", {}),
  },
  {
    name: "app/api/part-check/route.ts POST",
    permission: "part.check",
    aims: "shop",
    prepare: () => () =>
      answered(
        partCheckRoute.POST,
        "POST",
        "/api/part-check",
        {},
        { weightAirG: 100, weightWaterG: 84.89, waterTempC: 20 },
      ),
  },
  {
    name: "app/api/photos/[id]/route.ts GET",
    permission: "case.see",
    aims: "row",
    prepare: (aim) => {
      const { photoId } = readyPhoto(aim, UPLOADS);
      return () => answered(photoRoute.GET, "GET", `/api/photos/${photoId}`, { id: photoId });
    },
  },
  {
    name: "app/api/photos/[id]/route.ts DELETE",
    permission: "photo.withdraw",
    aims: "row",
    prepare: (aim) => {
      const id = loosePhoto(aim);
      return () => answered(photoRoute.DELETE, "DELETE", `/api/photos/${id}`, { id });
    },
  },
  {
    name: "app/api/photos/[id]/[size]/route.ts GET",
    permission: "case.see",
    aims: "row",
    prepare: (aim) => {
      const { photoId } = readyPhoto(aim, UPLOADS);
      return () => answered(photoSizeRoute.GET, "GET", `/api/photos/${photoId}/thumb`, { id: photoId, size: "thumb" });
    },
  },
];
