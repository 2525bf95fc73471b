namespace Skarrow;

/// <summary>The store-room list: eighteen invented products over all nine families. Values are typical of their kind.</summary>
public static class Fluids
{
    public static readonly IReadOnlyList<FluidSheet> All =
    [
        new("TURB-46", "Turbine and bearing oil 46", "mineral") { Vg = 46, V40 = 45.2, V100 = 6.8, Density15 = 866, A = 7.02, B = 1500, Tension = 32, Permittivity = 2.2, Conductivity = 6, Demulsibility = 8, LimitPpm = 250 },
        new("TURB-68", "Turbine and bearing oil 68", "mineral") { Vg = 68, V40 = 67.1, V100 = 8.7, Density15 = 872, A = 7.02, B = 1500, Tension = 31, Permittivity = 2.2, Conductivity = 6, Demulsibility = 10, LimitPpm = 250 },
        new("HYD-46", "Hydraulic oil 46", "mineral") { Vg = 46, V40 = 46.4, V100 = 6.9, Density15 = 875, A = 6.89, B = 1400, Tension = 26, Permittivity = 2.2, Conductivity = 90, Demulsibility = 15, LimitPpm = 300 },
        new("CIRC-220", "Paper machine circulating oil 220", "mineral") { Vg = 220, V40 = 218, V100 = 18.9, Density15 = 889, Expansion = 0.00069, A = 6.75, B = 1350, Tension = 28, Permittivity = 2.3, Conductivity = 40, Demulsibility = 20, LimitPpm = 400 },
        new("GEAR-320", "Gear oil 320", "mineral") { Vg = 320, V40 = 317, V100 = 24.1, Density15 = 897, A = 6.57, B = 1200, Tension = 22, Permittivity = 2.3, Conductivity = 150, Demulsibility = 30, LimitPpm = 500 },
        new("GEAR-460", "Gear oil 460", "mineral") { Vg = 460, V40 = 458, V100 = 30.6, Density15 = 903, Demulsibility = 35, LimitPpm = 500, TrueCurve = (6.60, 1210) },
        new("GEAR-320-T", "Gear oil 320, old charge, takes up water", "mineral") { Vg = 320, V40 = 331, V100 = 24.4, Density15 = 901, A = 6.62, B = 1200, Tension = 6.5, Permittivity = 2.5, Conductivity = 900, Demulsibility = 90, LimitPpm = 600 },
        new("SYN-G220", "Synthetic gear oil 220", "pao") { Vg = 220, V40 = 221, V100 = 26.3, Density15 = 851, Expansion = 0.00075, A = 7.07, B = 1460, Tension = 27, Permittivity = 2.2, Conductivity = 30, Demulsibility = 15, LimitPpm = 300 },
        new("SYN-C46", "Synthetic compressor oil 46", "pao") { Vg = 46, V40 = 46.8, V100 = 7.8, Density15 = 838, Expansion = 0.00075, Tension = 30, Permittivity = 2.1, Conductivity = 4, Demulsibility = 10, LimitPpm = 200, TrueCurve = (7.07, 1490) },
        new("EST-H46", "Ester hydraulic fluid 46", "ester") { Vg = 46, V40 = 47.2, V100 = 9.3, Density15 = 921, Expansion = 0.00075, A = 5.69, B = 700, Tension = 14, Permittivity = 3.1, Conductivity = 1100, Demulsibility = 30, LimitPpm = 1000 },
        new("FR-46", "Fire-resistant control fluid 46", "phosphate-ester") { Vg = 46, V40 = 43.5, V100 = 5.2, Density15 = 1142, Expansion = 0.00069, A = 5.44, B = 600, Tension = 16, Permittivity = 6.5, Conductivity = 9000, LimitPpm = 1000 },
        new("PAG-220", "Polyglycol gear oil 220, not water-soluble", "pag") { Vg = 220, V40 = 222, V100 = 41, Density15 = 1005, Expansion = 0.00078, A = 5.25, B = 400, Tension = 9, Permittivity = 6, Conductivity = 15000, LimitPpm = 6000 },
        new("PAG-320", "Polyglycol gear oil 320, heavy", "pag") { Vg = 320, V40 = 325, V100 = 54, Density15 = 1046, Expansion = 0.00074, A = 5.30, B = 450, Tension = 7, Permittivity = 6.4, Conductivity = 21000, LimitPpm = 4000 },
        new("PAG-W460", "Polyglycol gear oil 460, water-soluble", "pag") { Vg = 460, V40 = 452, V100 = 76, Density15 = 1069, Expansion = 0.00074, LimitPpm = 20000 },
        new("NE-36", "Natural ester insulating liquid", "natural-ester") { V40 = 35.4, V100 = 8.1, Density15 = 919, Expansion = 0.00073, A = 5.3318, B = 684, Tension = 25, Permittivity = 3.2, Conductivity = 60, LimitPpm = 350 },
        new("SIL-50", "Silicone insulating liquid 50", "silicone") { V40 = 38.5, V100 = 16.1, Density15 = 963, Expansion = 0.001, Tension = 35, Permittivity = 2.7, Conductivity = 1, LimitPpm = 100, TrueCurve = (7.3956, 1500) },
        new("TRAF-10", "Transformer oil, inhibited", "transformer-mineral") { V40 = 9.3, V100 = 2.5, Density15 = 881, Expansion = 0.00073, A = 7.0895, B = 1567, Tension = 42, Permittivity = 2.2, Conductivity = 1, LimitPpm = 30 },
        new("DIESEL", "Standby diesel fuel", "diesel") { V40 = 2.9, V100 = 1.2, Density15 = 837, Expansion = 0.00084, Tension = 24, Permittivity = 2.1, Conductivity = 150, Demulsibility = 5, LimitPpm = 200, TrueCurve = (6.9619, 1500) },
    ];

    public static FluidSheet Of(string code) => All.First(f => f.Code == code);
}
