using Plant.Physics.Coalescence;
using Plant.Physics.Droplets;

namespace Plant.Physics.Tests.Coalescence;

/// <summary>Problems of the population balance.</summary>
internal static class Balances
{
    // VG 46 at 50 °C: 0.0257 Pa·s, Δρ 134 kg/m³, g 9.81 m/s²
    private const double StokesPerMS = 134 * 9.81 / (18 * 0.0257);

    /// <summary>A tank that stands for 24 h: Brownian motion, shear of 5 /s and settling over 0.5 m, efficiency 0.1; start 500 ppm, median 10 µm, deviation 1.8.</summary>
    public static PopulationBalanceSetup StandingTank { get; } = new()
    {
        KernelM3S = (a, b) =>
        {
            var sum = a + b;
            return 0.1 * ((2 * 1.380649e-23 * 323.15 / (3 * 0.0257) * sum * sum / (a * b)) + (5.0 / 6 * sum * sum * sum) + (Math.PI / 4 * sum * sum * StokesPerMS * Math.Abs((a * a) - (b * b))));
        },
        SettlingMS = d => StokesPerMS * d * d,
        DepthM = 0.5,
    };

    public static LognormalDistribution TankStart { get; } = LognormalDistribution.ByVolume(10e-6, 1.8);

    /// <summary>Cells of volume from 1e-4 to 1e3, in units of the mean.</summary>
    public static VolumeGrid UnitGrid(int cells) => new(cells, Math.Cbrt(6e-4 / Math.PI), Math.Cbrt(6e3 / Math.PI));

    /// <summary>Kernel of volumes, without settling.</summary>
    public static PopulationBalanceSetup Pure(Func<double, double, double> kernelOfVolumes) => new()
    {
        KernelM3S = (a, b) => kernelOfVolumes(Volume(a), Volume(b)), SettlingMS = _ => 0, DepthM = 1, Tolerance = 1e-7,
    };

    public static double Volume(double diameterM) => Math.PI / 6 * diameterM * diameterM * diameterM;

    /// <summary>Number density exp(−v).</summary>
    public sealed class Exponential : IDropletDistribution
    {
        public double VolumeBelow(double diameterM)
        {
            var v = Volume(diameterM);
            return v < 1e-4 ? v * v * (0.5 - (v / 3)) : 1 - ((1 + v) * Math.Exp(-v));
        }
    }
}
