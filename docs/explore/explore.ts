/** The explore page: sliders in, spectrum, colours, numbers and code out, at once. */
import { codeFor } from "./codeFor.js";
import { compute, prepare, type State } from "./compute.js";
import { drawScene } from "./drawScene.js";
import { drawSpectrum } from "./drawSpectrum.js";
import { numbersOf } from "./numbersOf.js";
import { prepareArc } from "./skyArc.js";
import { writeTexts } from "./writeTexts.js";

const NAMES = ["heightDeg", "altitudeM", "ozoneDu", "haze", "co2Ppm"] as const;
const UNITS: Readonly<Record<(typeof NAMES)[number], string>> = {
  heightDeg: "°",
  altitudeM: " m",
  ozoneDu: " DU",
  haze: "",
  co2Ppm: " ppm",
};

/** States worked out ahead of the first change. */
const WARM_UP_ROUNDS = 40;

const element = <T extends Element>(selector: string): T => document.querySelector<T>(selector)!;
const fixed = prepare();

/** Works out other states while the browser has nothing to do, so that the first change meets compiled code. */
function warmUp(rounds: number): void {
  const idle = globalThis.requestIdleCallback ?? setTimeout;
  idle(() => {
    compute({ ...readState(), ozoneDu: 300 + rounds }, fixed);
    if (rounds > 1) warmUp(rounds - 1);
  });
}

function readState(): State {
  const entries = NAMES.map((name) => [name, element<HTMLInputElement>(`#${name}`).valueAsNumber]);
  return Object.fromEntries(entries) as State;
}

let skies = prepareArc(readState());
let skiesFor = "";
let code = "";

/** The prepared sky of the state's air; the sun and the haze do not change it. */
function skiesOf(state: State): typeof skies {
  const key = [state.altitudeM, state.ozoneDu, state.co2Ppm].join();
  if (key !== skiesFor) skies = prepareArc(state);
  skiesFor = key;
  return skies;
}

/** Brings the whole page to the state of the sliders. */
function update(): void {
  const state = readState();
  const view = compute(state, fixed, skiesOf(state));
  for (const name of NAMES) {
    const text = `${state[name]}${UNITS[name]}`;
    element(`output[for="${name}"]`).textContent = text;
    element(`#${name}`).setAttribute("aria-valuetext", text);
  }
  drawScene(element("#scene"), state, view);
  drawSpectrum(element("#spectrum"), fixed.outside, view.ground);
  writeTexts(element("#numbers"), numbersOf(view).flat(), (i) => (i % 2 === 0 ? "dt" : "dd"));
  code = codeFor(state, view);
  writeTexts(element("#code"), code.split(/(?<=\n)/), () => "div");
}

/** Sliders from the address (#heightDeg=5&haze=0.2), so that a state can be passed on. */
function readAddress(): void {
  const wanted = new URLSearchParams(location.hash.slice(1));
  for (const name of NAMES) {
    const value = wanted.get(name);
    if (value !== null) element<HTMLInputElement>(`#${name}`).value = value;
  }
}

function keepAddress(): void {
  const entries = Object.entries(readState()).map(([name, value]) => [name, String(value)]);
  history.replaceState(null, "", `#${new URLSearchParams(entries)}`);
}

const form = element<HTMLFormElement>("form");
form.addEventListener("input", update);
form.addEventListener("change", keepAddress);
form.addEventListener("submit", (event) => event.preventDefault());
form.addEventListener("reset", () =>
  setTimeout(() => {
    update();
    keepAddress();
  }),
);
addEventListener("hashchange", () => {
  readAddress();
  update();
});
element("#copy").addEventListener("click", async () => {
  try {
    await navigator.clipboard.writeText(code);
    element("#copied").textContent = "copied";
  } catch {
    getSelection()?.selectAllChildren(element("#code")); // no clipboard here: one key is left to press
    element("#copied").textContent = "selected: copy it with Ctrl C";
  }
});
readAddress();
update();
warmUp(WARM_UP_ROUNDS);
