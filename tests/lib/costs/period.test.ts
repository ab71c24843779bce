import { describe, expect, it } from "vitest";
import { dayOf, dayStart, lastSpan, nextDay, periodOf, shiftDay } from "@/lib/costs/period";

const HOUR_MS = 3_600_000;

describe("a day of the shop's calendar", () => {
  it("begins at the shop's own midnight", () => {
    // Stockholm is two hours ahead of UTC in July (tz database, Europe/Stockholm).
    expect(dayStart("2026-07-14", "Europe/Stockholm")).toBe(Date.UTC(2026, 6, 13, 22));
    expect(dayStart("2026-07-14", "UTC")).toBe(Date.UTC(2026, 6, 14));
    expect(dayOf(dayStart("2026-07-14", "America/St_Johns"), "America/St_Johns")).toBe("2026-07-14");
  });

  it("is 23 hours long when the clocks go forward and 25 when they go back", () => {
    // EU summer time in 2026: 29 March to 25 October (Directive 2000/84/EC: last Sundays).
    const long = (day: string) =>
      (dayStart(nextDay(day), "Europe/Stockholm") - dayStart(day, "Europe/Stockholm")) / HOUR_MS;
    expect(long("2026-03-29")).toBe(23);
    expect(long("2026-10-25")).toBe(25);
    expect(long("2026-07-14")).toBe(24);
  });

  it("steps over months and leap days", () => {
    expect(nextDay("2028-02-28")).toBe("2028-02-29");
    expect(shiftDay("2026-03-01", -1)).toBe("2026-02-28");
  });

  it("refuses a day that no calendar has, naming the field", () => {
    expect(() => dayStart("2026-02-30", "UTC", "from")).toThrow(/from/);
    expect(() => periodOf("2026-07-14", "14.7.2026", "UTC")).toThrow(/to/);
    expect(() => periodOf("2026-07-14", "2026-07-13", "UTC")).toThrow(/before the first/);
  });
});

describe("a period", () => {
  it("holds its first and last day whole", () => {
    const july = periodOf("2026-07-01", "2026-07-31", "Europe/Stockholm");
    expect(july.untilAt - july.fromAt).toBe(31 * 24 * HOUR_MS);
  });

  it("counts today as the last of the 30, 91 or 365 days", () => {
    const now = Date.UTC(2026, 6, 14, 23, 30);
    expect(lastSpan("month", now, "UTC")).toMatchObject({ from: "2026-06-15", to: "2026-07-14" });
    // Half past one at night in Stockholm: there it is the 15th.
    expect(lastSpan("month", now, "Europe/Stockholm").to).toBe("2026-07-15");
  });
});
