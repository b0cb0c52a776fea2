// Writes a design of as many final circuits as asked: boards of 40 circuits, fed by switchboards of up to 50 boards, fed from the origin.
// Usage: node generate.mjs CIRCUITS > large.design.yaml
const circuits = Number(process.argv[2]);
const kinds = [
  { name: "Sockets", device: "rcbo-b32", cable: "flat-4", length: 22, serves: "socket-outlets", load: "current: 18 A, power-factor: 0.95" },
  { name: "Lighting", device: "b6", cable: "flat-1.5", length: 28, serves: "lighting", load: "current: 2.5 A, power-factor: 0.95, spread: even" },
  { name: "Heater", device: "b16", cable: "flat-2.5", length: 15, serves: "space-heating", load: "power: 3 kW, power-factor: 1" },
];
const lines = [
  "design-format: 1",
  `project: { title: Made for measuring with ${circuits} circuits, reference: M-${circuits}, revision: A, designer: R. Example }`,
  "rule-set: united-kingdom",
  "basis: { stage: design, supply-ownership: public, premises: office, users: ordinary, ambient: 30 °C, test-temperature: 20 °C }",
  "supply: { earthing: TN-S, phases: 3, voltage: 400 V, frequency: 50 Hz, loop-impedance: 0.03 ohm, fault-current: 15 kA }",
  "types:",
  "  cables:",
  "    main: { construction: single-core, insulation: thermosetting 90, csa: 240 mm², cpc: 120 mm², formation: flat touching }",
  "    feeder: { construction: multicore, insulation: thermosetting 90, csa: 35 mm², cpc: 35 mm² }",
  "    flat-1.5: { construction: flat twin and earth, insulation: thermoplastic 70, csa: 1.5 mm², cpc: 1.0 mm² }",
  "    flat-2.5: { construction: flat twin and earth, insulation: thermoplastic 70, csa: 2.5 mm², cpc: 1.5 mm² }",
  "    flat-4: { construction: flat twin and earth, insulation: thermoplastic 70, csa: 4 mm², cpc: 1.5 mm² }",
  "  devices:",
  "    fuse-400: { standard: BS 88-2, rating: 400 A, breaking-capacity: 80 kA, poles: 3 }",
  "    fuse-100: { standard: BS 88-2, rating: 100 A, breaking-capacity: 80 kA, poles: 3 }",
  "    rcbo-b32: { standard: EN 61009, curve: B, rating: 32 A, breaking-capacity: 10 kA, poles: 2 }",
  "    b6: { standard: EN 60898, curve: B, rating: 6 A, breaking-capacity: 10 kA, poles: 1 }",
  "    b16: { standard: EN 60898, curve: B, rating: 16 A, breaking-capacity: 10 kA, poles: 1 }",
  "boards:",
];
const boards = Math.ceil(circuits / 40);
const feeder = (id, name, feeds, device, cable, length) => lines.push(
  `      - { id: ${id}, name: ${name}, feeds: ${feeds}, phase: L1-L2-L3, device: { type: ${device} },`,
  `          cable: { type: ${cable}, length: ${length} m, method: E, grouped-circuits: 1 } }`);
const board = (id, top) => {
  lines.push(`  - id: ${id}`, `    name: Board ${id}`);
  if (top) lines.push("    fed-from: origin");
  lines.push("    circuits:");
};
const heads = boards > 1 ? Math.ceil(boards / 50) : 0;
if (heads > 1) {
  board("MSB", true);
  for (let h = 0; h < heads; h++) feeder(h + 1, `Switchboard ${h + 1}`, `S${h + 1}`, "fuse-400", "main", 20 + (h % 7));
}
for (let h = 0; h < heads; h++) {
  board(`S${h + 1}`, heads === 1);
  for (let b = h * 50; b < Math.min(boards, (h + 1) * 50); b++) feeder(b - h * 50 + 1, `Board ${b + 1}`, `D${b + 1}`, "fuse-100", "feeder", 12 + (b % 9));
}
for (let b = 0; b < boards; b++) {
  board(`D${b + 1}`, heads === 0);
  for (let c = 0; c < Math.min(40, circuits - b * 40); c++) {
    const kind = kinds[c % kinds.length];
    lines.push(
      `      - id: ${c + 1}`,
      `        name: ${kind.name} ${c + 1}`,
      `        phase: L${(c % 3) + 1}`,
      `        device: { type: ${kind.device} }`,
      ...(kind.serves === "socket-outlets" ? ["        rcd: { standard: EN 61009, type: A, residual-current: 30 mA, delay: none, rated-current: 32 A }", "        socket-rating: 13 A"] : []),
      `        cable: { type: ${kind.cable}, length: ${kind.length + (c % 5)} m, method: C, grouped-circuits: 1 }`,
      `        serves: [${kind.serves}]`,
      `        load: { ${kind.load}, waveform: sinusoidal, diversity: 0.5 }`);
  }
}
process.stdout.write(lines.join("\n") + "\n");
