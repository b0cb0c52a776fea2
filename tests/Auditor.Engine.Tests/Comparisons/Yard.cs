namespace Auditor.Engine.Tests.Comparisons;

/// <summary>
/// A yard with two boards, for the plain rule set. Its drops: feeder 40 m of 10 mm² at 4 mΩ/m and 14 A are 2.24 V; saw 20 m of 2.5 mm² at
/// 14 mΩ/m and 8 A are 2.24 V; lamps 30 m of 1.5 mm² at 24 mΩ/m and 6 A are 4.32 V; kiosk 10 m of 2.5 mm² at 14 mΩ/m and 12 A are 1.68 V.
/// </summary>
internal static class Yard
{
    /// <summary>The design.</summary>
    public const string Design = """
        design-format: 1
        supply: { earthing: TN-S, phases: 1, voltage: 230 V }
        earthing: { bonding: [{ to: water, csa: 10 mm² }, { to: gas, csa: 10 mm², length: 4 m }] }
        types: { cables: { small: { csa: 2.5 mm² } } }
        boards:
          - id: A
            name: Gatehouse
            spare-ways: 1
            circuits:
              - id: 1
                name: Feeder
                feeds: B
                device: { rating: 40 A }
                cable: { csa: 10 mm², length: 40 m }
              - id: 2
                name: Kiosk
                device: { rating: 16 A }
                cable: { type: small, length: 10 m }
                serves: [socket-outlets]
                load: { current: 12 A }
          - id: B
            name: Workshop
            spare-ways: 4
            circuits:
              - id: 1
                name: Saw
                device: { rating: 16 A }
                cable: { type: small, length: 20 m }
                load: { current: 8 A }
              - id: 2
                name: Lamps
                device: { rating: 6 A }
                cable: { csa: 1.5 mm², length: 30 m }
                load: { current: 6 A }

        """;
}
