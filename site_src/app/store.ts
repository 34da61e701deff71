// Takes and gives what is kept in this browser: sheets, site conditions, instruments, signed records, the decimal mark.
// sheet.ts, site.ts and instruments.ts come next. Where the browser refuses to store, everything goes on in memory.

import { type DBSchema, type IDBPDatabase, openDB } from "idb";

import type { RowDraft } from "./row";
import type { Answer, Instrument } from "./shapes";

export interface Signature {
  name: string;
  time: string;
  revision: number;
  reason: string;
}

export interface Draft {
  key: string;
  find: string;
  unit: string;
  job: string;
  rows: Record<string, RowDraft>;
  isExample: boolean;
  /** The revision that is being written or was signed, from 1, and why it was begun. */
  revision: number;
  reason: string;
  signature: Signature | null;
  /** The last answer and what it was asked with, so that a reload shows it before the engine is up. */
  answer: Answer;
  asked: Record<string, unknown> | null;
}

export interface SignedRecord {
  key: string;
  version: string;
  digest: string;
  signature: Signature;
  job: string;
  asked: unknown;
  answer: Answer;
}

/** Site conditions as typed, one text per field. */
export type SiteFields = Record<string, string>;

interface Kept extends DBSchema {
  sheets: { key: string; value: Draft };
  instruments: { key: string; value: Instrument };
  records: { key: number; value: SignedRecord };
  single: { key: string; value: unknown };
}

type Names = "sheets" | "instruments" | "records" | "single";

/** Named by the spec's digest and this folder: in some browsers all pages opened from disk share one store. */
function databaseName(): string {
  const folder = location.pathname.replace(/[^/]*$/, "");
  return `gaswright ${document.documentElement.dataset["digest"] ?? ""} ${location.protocol}//${location.host}${folder}`;
}

export class Store {
  onTrouble: (reason: string) => void = () => undefined;
  #database: IDBPDatabase<Kept> | undefined;

  async open(): Promise<void> {
    try {
      this.#database = await openDB<Kept>(databaseName(), 1, { upgrade: makeStores });
    } catch (cause) {
      this.#refused(cause);
    }
  }

  sheets(): Promise<Draft[]> {
    return this.#read((database) => database.getAll("sheets"), []);
  }

  keepSheet(draft: Draft): Promise<void> {
    return this.#write((database) => database.put("sheets", draft));
  }

  forgetSheet(key: string): Promise<void> {
    return this.#write((database) => database.delete("sheets", key));
  }

  instruments(): Promise<Instrument[]> {
    return this.#read((database) => database.getAll("instruments"), []);
  }

  keepInstrument(instrument: Instrument): Promise<void> {
    return this.#write((database) => database.put("instruments", instrument, instrument.name));
  }

  forgetInstrument(name: string): Promise<void> {
    return this.#write((database) => database.delete("instruments", name));
  }

  addRecord(record: SignedRecord): Promise<void> {
    return this.#write((database) => database.add("records", record));
  }

  siteFields(): Promise<SiteFields | undefined> {
    return this.#read((database) => database.get("single", "site") as Promise<SiteFields | undefined>, undefined);
  }

  keepSiteFields(fields: SiteFields): Promise<void> {
    return this.#write((database) => database.put("single", fields, "site"));
  }

  decimal(): Promise<string | undefined> {
    return this.#read((database) => database.get("single", "decimal") as Promise<string | undefined>, undefined);
  }

  keepDecimal(mark: string): Promise<void> {
    return this.#write((database) => database.put("single", mark, "decimal"));
  }

  async #read<T>(action: (database: IDBPDatabase<Kept>) => Promise<T>, otherwise: T): Promise<T> {
    if (!this.#database) return otherwise;
    try {
      return await action(this.#database);
    } catch (cause) {
      this.#refused(cause);
      return otherwise;
    }
  }

  async #write(action: (database: IDBPDatabase<Kept>) => Promise<unknown>): Promise<void> {
    if (!this.#database) return;
    try {
      await action(this.#database);
    } catch (cause) {
      this.#refused(cause);
    }
  }

  #refused(cause: unknown): void {
    this.onTrouble(
      `This browser keeps nothing for this page (${cause instanceof Error ? cause.message : String(cause)}). ` +
        "Calculating goes on, but what is typed is lost when the page closes: print what must stay. " +
        "A private window or a full disk is the usual cause.",
    );
  }
}

function makeStores(database: IDBPDatabase<Kept>): void {
  database.createObjectStore("sheets", { keyPath: "key" });
  database.createObjectStore("records", { autoIncrement: true });
  for (const name of ["instruments", "single"] satisfies Names[]) database.createObjectStore(name);
}
