import { expect, test, type Page } from "@playwright/test";
import { readFileSync } from "node:fs";

/**
 * The whole job on an L-shaped slab that is out of square, from the first pull on concrete to the printed sheet. Every value
 * expected here comes from tests/reference/whole-job.py, which knows nothing of this project: Python's standard library alone,
 * by plain ways (Gauss-Newton for the tape; every triple of limits at each angle for the fit; every 1/16 in for joints; every
 * sharing of the pieces for the boards). Its printed output is whole-job.json beside it; the test needs no Python.
 */
const reference = JSON.parse(readFileSync("tests/reference/whole-job.json", "utf8")) as {
  pulls: Record<string, string>;
  walk: string;
  worst: string;
  offsets: Record<string, Record<string, string>>;
  lines: Record<string, string>;
  chalkPulls: Record<string, string>;
  bolts: Record<string, string[]>;
  stations: Record<string, number[]>;
  across: Record<string, number[]>;
  spans: Record<string, [number, number]>;
  added: Record<string, number>;
  windows: Record<string, [number, number][] | null>;
  rule: { spacing: number; endLeast: number; endMost: number };
  boards: number[];
  takeoff: { boards: Record<string, number>; rolls: number; rods: number; nuts: number; washers: number; cartridges: number; cans: number };
  marks: string[];
  hits: [number, number][];
};
const walls = Object.keys(reference.lines);
const byCorners = (wall: string) => [...wall.toUpperCase()].join("-");

const verdict = (page: Page) => page.locator(".verdict-title");
const field = (page: Page, name: string) => page.getByRole("textbox", { name, exact: true });

/** A choice of the set goes by its address, so it is checked a moment after the click. */
async function pick(page: Page, name: string): Promise<void> {
  const radio = page.getByRole("radio", { name, exact: true }).first();
  await radio.click({ force: true });
  await expect(radio).toBeChecked();
}

test.use({ actionTimeout: 10_000 });

async function openStage(page: Page, stage: string): Promise<void> {
  if (!(await page.locator(".stage-rail").isVisible())) await page.locator(".set-place a").click();
  await page.locator(`.stage-rail a[href*="stage=${stage}"]`).click();
  await expect(page.locator(".calculator-form")).toBeVisible();
}

/** Inches of `137 1/2`, `11' 5 1/2"` or `8"`. */
function inchesOf(text: string): number {
  const [, feet = "0", rest = ""] = /^(?:(\d+)' ?)?(.*?)"?$/.exec(text.trim())!;
  return rest.split(" ").filter(Boolean).reduce((sum, part) => sum + (part.includes("/") ? Number(part.split("/")[0]) / Number(part.split("/")[1]) : Number(part)), Number(feet) * 12);
}

/** What each strip of a section of the sheet is described as. */
const described = (page: Page, section: string) => page.locator(`section[aria-labelledby="sheet-${section}"] svg[role="img"]`).evaluateAll((drawings) => drawings.map((drawing) => drawing.getAttribute("aria-label") ?? ""));
const rowsOf = (page: Page, section: string) => page.locator(`section[aria-labelledby="sheet-${section}"] tbody tr`).evaluateAll((rows) => rows.map((row) => [...row.children].map((cell) => cell.textContent ?? "")));

test("an L out of square is laid out from the first pull to the last joist mark, and the sheet's numbers are those of an outside reckoning @phone", async ({ page }) => {
  test.setTimeout(240_000);
  await page.goto("/set");
  await page.getByLabel("Name of the foundation").fill("Lot 31, L house");
  await page.getByRole("button", { name: "Start a set" }).click();

  await test.step("concrete: ten pulls fix six corners", async () => {
    await openStage(page, "concrete");
    await pick(page, "Footprint");
    await pick(page, "Pulls");
    await page.getByLabel("Corners of the plan").selectOption("6");
    await pick(page, "1 in");
    for (const [name, reading] of Object.entries(reference.pulls)) await page.getByRole("textbox", { name: new RegExp(`${[...name].join(" to ")}$`) }).fill(reading);
    await field(page, "Inside corners").fill("D");
    await expect(verdict(page)).toHaveText("Every corner is fixed");
  });

  await test.step("chalk lines: the wanted L moved to where its worst departure is least", async () => {
    await openStage(page, "chalk");
    await pick(page, "Best fit");
    await pick(page, "Walk");
    await page.getByLabel("The chalk walked round").fill(reference.walk);
    await field(page, "Wanted inset").fill("7/16");
    await expect(verdict(page)).toHaveText(`Off by ${reference.worst} at most`);
  });

  await test.step("recheck: every chalk line and the diagonals that prove the corners are pulled again", async () => {
    await openStage(page, "recheck");
    const pulls = page.getByRole("textbox", { name: /[A-F] to [A-F]$/ });
    await expect(pulls).toHaveCount(9);
    const names = await pulls.evaluateAll((inputs) => inputs.map((input) => (input as HTMLInputElement).labels?.[0]?.textContent ?? ""));
    for (const [row, name] of names.entries()) {
      const [, from, to] = /([A-F]) to ([A-F])/.exec(name)!;
      await pulls.nth(row).fill(reference.chalkPulls[[from, to].sort().join("")]!);
    }
    await expect(verdict(page)).toHaveText("Fixed, but nothing checks it");
  });

  await test.step("bolts: each wall's survey pasted", async () => {
    await openStage(page, "bolts");
    for (const wall of walls) {
      await pick(page, wall.toUpperCase());
      await expect(field(page, "Piece 1 ends")).toHaveValue(/./);
      expect(inchesOf((await field(page, "Piece 1 ends").inputValue()).replace(" in", ""))).toBe(inchesOf(reference.lines[wall]!));
      await page.getByText("Paste bolts as text").click();
      await page.locator("#paste-bolts").fill(reference.bolts[wall]!.join("\n"));
      await page.getByRole("button", { name: "Use these lines" }).click();
      await pick(page, "chalk");
      await page.getByRole("radio", { name: /2x6/ }).check({ force: true });
      await expect(verdict(page)).toBeVisible();
      await expect(verdict(page)).toHaveText(/The bolts pass|to fix/);
    }
  });

  await test.step("plates: joints, boards and holes", async () => {
    await openStage(page, "plates");
    await page.getByText("Corners: which plate runs through").click();
    for (const [corner, wall] of [..."ABCDEF"].map((letter, index) => [letter, walls[index]!] as const)) await page.getByLabel(`At ${corner} runs through`).selectOption(wall);
    await expect(page.getByRole("checkbox", { name: "D is an inside corner" })).toBeChecked();
    await page.getByRole("button", { name: "Add a board length" }).click();
    await field(page, "Board 2 length").fill("22 ft");
    const added = Object.values(reference.added).reduce((sum, count) => sum + count, 0);
    await expect(verdict(page)).toHaveText(`${reference.boards.length} boards, 8 pieces, ${added} anchors to add`, { timeout: 20_000 });
    await expect(page.locator('[aria-busy="true"]')).toHaveCount(0, { timeout: 20_000 });
  });

  await test.step("takeoff and floor marks", async () => {
    await openStage(page, "takeoff");
    await expect(verdict(page)).toHaveText(`${reference.boards.length} boards to order`);
    await openStage(page, "marks");
    await expect(verdict(page)).toHaveText(`${reference.marks.length} marks, one joist hits`);
  });

  if (!(await page.locator(".stage-rail").isVisible())) await page.locator(".set-place a").click();
  await page.getByRole("link", { name: "Print field sheet" }).click();
  await expect(page.locator(".sheet-paper").getByRole("heading", { level: 1 })).toHaveText("Lot 31, L house");
  await expect(page.getByText("the plates came out otherwise than in their stage")).toHaveCount(0);

  await test.step("the sheet: readings before and after, corner offsets and lines", async () => {
    const readings = new Map((await rowsOf(page, "readings")).map(([name, ...figures]) => [name!.replace("-", ""), figures]));
    for (const [name, reading] of Object.entries(reference.pulls)) expect(readings.get([...name].sort().join(""))?.[0], name).toBe(`${reading}"`);
    const pulledAgain = [...readings].filter(([, [, expected]]) => expected !== "");
    expect(pulledAgain.length).toBeGreaterThanOrEqual(3);
    for (const [name, [, expected, chalk]] of pulledAgain) expect([expected, chalk], name).toEqual([`${reference.chalkPulls[name]}"`, `${reference.chalkPulls[name]}"`]);
    const offsets = await rowsOf(page, "offsets");
    expect(offsets).toHaveLength(6);
    for (const [corner, ...figures] of offsets) expect(figures.sort(), corner).toEqual(Object.entries(reference.offsets[corner!]!).map(([side, text]) => `${byCorners(side)} ${text}`).sort());
    expect(await rowsOf(page, "lines")).toEqual(Object.entries(reference.lines).map(([wall, text]) => [byCorners(wall), text]));
  });

  const pieces = (await described(page, "pieces")).map((text) => {
    const [, id = "", length = "", holes = ""] = /^Piece (\S+), (.*?)\. Holes: (.*?)\.?$/.exec(text)!;
    return { id, wall: id.slice(0, 2).toLowerCase(), length: inchesOf(length), holes: holes.split("; ").map((hole) => hole.split(" at ")).map(([running, across]) => ({ running: inchesOf(running!), across: across === undefined ? 2.75 : inchesOf(across) })) };
  });

  await test.step("the sheet: pieces, hole stations and across, added anchors", async () => {
    const additions = await rowsOf(page, "additions");
    for (const wall of walls) {
      const [start, end] = reference.spans[wall]!;
      const own = pieces.filter((piece) => piece.wall === wall);
      expect(own.reduce((sum, { length }) => sum + length, 0), wall).toBe(end - start);
      expect(own, wall).toHaveLength(reference.windows[wall] === null ? 1 : 2);
      const joint = start + own[0]!.length;
      const windows = reference.windows[wall];
      if (windows !== null) expect(windows!.some(([from, to]) => joint >= from && joint <= to), `joint of ${wall} at ${joint}`).toBe(true);
      let from = start;
      let added = 0;
      const all: number[] = [];
      for (const { id, length, holes } of own) {
        const to = from + length;
        const poured = reference.stations[wall]!.flatMap((station, index) => (station > from && station < to ? [{ running: station - from, across: reference.across[wall]![index]! }] : []));
        expect(holes, id).toEqual(expect.arrayContaining(poured));
        const drilled = holes.filter(({ running }) => !poured.some((bolt) => bolt.running === running));
        added += drilled.length;
        for (const { running } of drilled) expect(additions.some(([name, station, hole]) => name === byCorners(wall) && inchesOf(station!) === from + running && hole!.startsWith(`${id}: `) && inchesOf(hole!.slice(id.length + 2)) === running), `${id} at ${running}`).toBe(true);
        // R403.1.6 by its own figures: an end bolt 3 1/2 to 12 in from each end, no more than 6 ft from the next
        const { spacing, endLeast, endMost } = reference.rule;
        const stations = holes.map(({ running }) => running).sort((a, b) => a - b);
        for (const distance of [stations[0]!, length - stations.at(-1)!]) expect(distance >= endLeast && distance <= endMost, `${id}: ${distance} from its end`).toBe(true);
        all.push(...stations.map((running) => running + from));
        for (const [index, station] of all.slice(1).entries()) expect(station - all[index]!, id).toBeLessThanOrEqual(spacing);
        from = to;
      }
      expect(added, wall).toBe(reference.added[wall]);
    }
    // D-E is one piece of 120 in: its anchor stands 8 in from the far end, brought to the whole inch of the wall nearest to 106 1/2
    const [, station] = additions.find(([name]) => name === "D-E")!;
    expect([106, 107]).toContain(inchesOf(station!));
  });

  await test.step("the sheet: boards, takeoff, floor marks", async () => {
    const boards = (await described(page, "boards")).map((text) => {
      const [, stock = "", cut = "", offcut = ""] = /^Board \d+, (.*?): (.*?)\. Left over (.*?)\.$/.exec(text)!;
      return { stock: inchesOf(stock), cut: cut.split("; ").map((part) => part.split(" ")[0]!), offcut: inchesOf(offcut) };
    });
    expect(boards.map(({ stock }) => stock).sort((a, b) => a - b)).toEqual(reference.boards);
    expect(boards.flatMap(({ cut }) => cut).sort()).toEqual(pieces.map(({ id }) => id).sort());
    for (const { stock, cut, offcut } of boards) {
      const used = cut.reduce((sum, id) => sum + pieces.find((piece) => piece.id === id)!.length, 0) + (cut.length - 1) / 8; // a kerf of 1/8 in between pieces
      expect(used, cut.join(", ")).toBeLessThanOrEqual(stock);
      expect(offcut, cut.join(", ")).toBe(Math.max(0, stock - used - 1 / 8));
    }
    const { takeoff } = reference;
    const ordered = (await rowsOf(page, "takeoff")).map(([item, size, quantity]) => `${item} ${item === "Treated boards" ? `${size} ` : ""}${quantity}`);
    expect(ordered).toEqual([
      ...Object.entries(takeoff.boards).reverse().map(([stock, count]) => `Treated boards ${Number(stock) / 12}' 0" ${count} boards`),
      `Sill sealer ${takeoff.rolls} rolls`,
      `Threaded rods ${takeoff.rods} pieces`,
      `Nuts ${takeoff.nuts} pieces`,
      `Washers ${takeoff.washers} pieces`,
      `Anchor adhesive ${takeoff.cartridges} cartridge`,
      `Cut-end preservative ${takeoff.cans} can`,
    ]);
    const marks = page.locator('section[aria-labelledby="sheet-marks"]');
    expect(await marks.locator(".sheet-figures li").allTextContents()).toEqual(reference.marks);
    // the end joist is joist 1
    for (const [mark, bolt] of reference.hits) await expect(marks).toContainText(`Joist ${mark + 2} (this wall) stands on bolt ${bolt + 1}`);
  });
});
