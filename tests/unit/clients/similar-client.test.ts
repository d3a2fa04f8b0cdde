import { describe, expect, it } from "vitest";
import { similarClients, similarWords } from "@/lib/clients/similar-client";
import { type Client } from "@/lib/records/types";

const client = (id: string, name: string, phone = "", phoneE164: string | null = null): Client => ({
  ...{ workshopId: "w", id, stamps: {}, removedAt: null, email: "", address: "", note: "" },
  ...{ name, phone, phoneE164 },
});
const ama = client("1", "Ama Boateng", "024 123 4567", "+233241234567");
const zoe = client("2", "Zoë Lartey", "555-0100");
const found = (name: string, phone = "", phoneE164: string | null = null, exceptId?: string) =>
  similarClients({ name, phone, phoneE164 }, [ama, zoe], exceptId).map(
    ({ client: { id }, same }) => `${id} ${same}`,
  );

describe("a client who may be there already", () => {
  it("has the same name, whatever its case, accents and order", () => {
    expect(found("boateng  AMA")).toEqual(["1 name"]);
    expect(found("Zoe Lartey")).toEqual(["2 name"]);
  });
  it("has not, with a name more or less", () => {
    expect(found("Ama")).toEqual([]);
    expect(found("Ama Boateng Mensah")).toEqual([]);
    expect(found("")).toEqual([]);
  });
  it("has the same phone, however it is written", () => {
    expect(found("A. Boateng", "+233 24 123 4567", "+233241234567")).toEqual(["1 phone"]);
    expect(found("Someone", "5550100")).toEqual(["2 phone"]);
    expect(found("Ama Boateng", "0241234567")).toEqual(["1 both"]);
  });
  it("has another phone where both are read and differ, and none where too little is typed", () => {
    expect(found("Someone", "024 123 4567", "+491241234567")).toEqual([]);
    expect(found("Someone", "")).toEqual([]);
    expect(similarClients({ name: "x", phone: "555", phoneE164: null }, [client("3", "y", "555")])).toEqual(
      [],
    );
  });
  it("is not the one being changed, nor one in the bin", () => {
    expect(found("Ama Boateng", "", null, "1")).toEqual([]);
    expect(
      similarClients({ name: "Ama Boateng", phone: "", phoneE164: null }, [
        { ...ama, removedAt: "2026-03-14" },
      ]),
    ).toEqual([]);
  });
  it("is told apart by what is the same", () => {
    expect(similarWords({ client: ama, same: "name" })).toBe("The same name; phone 024 123 4567");
    expect(similarWords({ client: ama, same: "phone" })).toBe("The same phone number, 024 123 4567");
    expect(similarWords({ client: ama, same: "both" })).toBe("The same name and phone number");
  });
});
