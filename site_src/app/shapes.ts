// Takes nothing; gives the shapes of what the page asks and what the engine says, as fixed between the two.
// Every other file of the page comes next.

export type Reference = "absolute" | "gauge" | "vacuum" | "difference";

/** A reading as typed. */
export interface Reading {
  text: string;
  unit?: string;
  reference?: string;
  accuracy?: string;
  instrument?: string;
  from?: "read" | "site" | "preset";
}

export interface Instrument {
  name: string;
  measures: string;
  accuracy: string;
  span: string;
  resolution: string;
  serial: string;
  due: string;
}

export interface Site {
  station_pressure?: Reading;
  air_temperature?: Reading;
  reference_temperature?: Reading;
  reference_pressure?: Reading;
  time: string;
  place: string;
  reader: string;
}

export type SiteQuantity = "station_pressure" | "air_temperature" | "reference_temperature" | "reference_pressure";

/** A reading that may have been meant; what it does not name stays as it is. */
export interface Offer {
  text: string;
  unit?: string;
  reference?: string;
}

export interface RowAnswer {
  state?: "ok" | "empty" | "error" | "question" | "default" | "find";
  says?: string;
  si?: string;
  offers?: Offer[];
  by?: string;
}

export interface Figure {
  label?: string;
  text?: string;
  unit?: string;
  row?: string;
  exact?: { text: string; unit: string; reference?: string };
}

export interface PlotAnswer {
  title: string;
  x: { label: string; unit: string };
  y: { label: string; unit: string };
  points: [number, number][];
  marks?: { axis: "x" | "y"; at: number; label: string }[];
}

export interface WorkingLine {
  text: string;
  relation?: string;
  title?: string;
}

export type AnswerState = "empty" | "incomplete" | "answer" | "warning" | "refused";

export interface Answer {
  state: AnswerState;
  rows?: Record<string, RowAnswer>;
  figure?: Figure | null;
  best?: string | null;
  value?: number | null;
  unit?: string | null;
  verdict?: { word: string; says: string } | null;
  versus?: [string, string][];
  shares?: { label: string; percent: number }[];
  working?: WorkingLine[];
  cautions?: string[];
  warnings?: string[];
  refusal?: string | null;
  extra?: [string, string][];
  plot?: PlotAnswer | null;
}

/** What the sheet shows: the engine's state, or what overlays it. */
export type ShownState = AnswerState | "example" | "stale" | "signed";
