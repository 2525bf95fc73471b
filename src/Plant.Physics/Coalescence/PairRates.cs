using System.Runtime.CompilerServices;
using System.Runtime.InteropServices;
using System.Runtime.Intrinsics;

namespace Plant.Physics.Coalescence;

/// <summary>
/// Rate of change of the water in each cell by collisions of all pairs. On a geometric grid the place of the drop that a pair makes depends on the distance of the
/// two cells alone, so the sum over pairs runs along distances, for eight cells at once and without scattered stores.
/// </summary>
internal sealed class PairRates
{
    private const int Lanes = PairTable.Lanes;
    private const int Shares = 5;

    // water in one cell below this share of all makes no collision that matters; the largest cells, mostly empty, are the stiffest
    private const double Negligible = 1e-16;

    private readonly int cells;
    private readonly int highestShift;
    private readonly int front;
    private readonly int giftRows;
    private readonly int giftStride;
    private readonly int giftPad;
    private readonly double ratio;
    private readonly double[] volumes;
    private readonly double[] perVolume;
    private readonly double[] shares;
    private readonly int[] shiftEnd;
    private readonly PairTable table;
    private readonly double[] number;
    private readonly double[] gifts;
    private readonly double[] loss;
    private int filled;
    private double past;

    public PairRates(VolumeGrid grid, Func<double, double, double> kernelM3S)
    {
        cells = grid.Cells;
        ratio = grid.VolumeRatio;
        table = new PairTable(grid, kernelM3S);
        Stride = table.Stride;
        volumes = new double[Stride];
        perVolume = new double[Stride];
        grid.VolumesM3.CopyTo(volumes);
        highestShift = Shift(0);
        shiftEnd = new int[highestShift + 1];
        shares = new double[Shares * cells];
        for (var i = 0; i < cells; i++)
        {
            perVolume[i] = 1 / volumes[i];
            var shift = Shift(i);
            shiftEnd[shift] = i + 1;
            Redistribution.Outer((1 + Math.Pow(ratio, -i)) / Math.Pow(ratio, shift), ratio, shares.AsSpan(Shares * i, Shares));
        }

        for (var shift = highestShift - 1; shift >= 0; shift--)
        {
            shiftEnd[shift] = Math.Max(shiftEnd[shift], shiftEnd[shift + 1]);
        }

        front = Stride + (2 * Lanes);
        giftRows = highestShift + Redistribution.Cells;
        giftPad = (giftRows + Lanes) / Lanes * Lanes;
        giftStride = Stride + (2 * giftPad);
        number = new double[front + (2 * Stride) + (2 * Lanes)];
        gifts = new double[giftRows * giftStride];
        loss = new double[Stride];
        Growth = new double[Stride];
    }

    private PairRates(PairRates other)
    {
        (cells, highestShift, front, ratio, Stride) = (other.cells, other.highestShift, other.front, other.ratio, other.Stride);
        (giftRows, giftStride, giftPad) = (other.giftRows, other.giftStride, other.giftPad);
        (volumes, perVolume, shares, shiftEnd, table) = (other.volumes, other.perVolume, other.shares, other.shiftEnd, other.table);
        number = new double[other.number.Length];
        gifts = new double[other.gifts.Length];
        loss = new double[Stride];
        Growth = new double[Stride];
    }

    /// <summary>Cells, rounded up to whole vectors [1].</summary>
    public int Stride { get; }

    /// <summary>After <see cref="Evaluate"/>: how often a drop of each cell moves on to larger ones [1/s].</summary>
    public double[] Growth { get; }

    /// <summary>The same tables with memory of its own, for another depth.</summary>
    public PairRates WithOwnMemory() => new(this);

    /// <summary>Writes the rate of change by collisions.</summary>
    /// <param name="water">Volume fraction of water in each cell [1].</param>
    /// <param name="rate">Receives the rate [1/s].</param>
    public void Evaluate(ReadOnlySpan<double> water, Span<double> rate)
    {
        var total = 0.0;
        for (var i = 0; i < water.Length; i++)
        {
            total += Math.Abs(water[i]);
        }

        var active = cells;
        while (active > 0 && Math.Abs(water[active - 1]) <= Negligible * total)
        {
            active--;
        }

        var end = (active + Lanes - 1) / Lanes * Lanes;
        Fill(water, active, end);
        past = 0;
        for (var at = 0; at < end; at += Lanes)
        {
            Collide(at, active);
        }

        Gather(end, rate);
    }

    private void Fill(ReadOnlySpan<double> water, int active, int end)
    {
        for (var i = 0; i < active; i++)
        {
            number[front + i] = water[i] * perVolume[i];
        }

        number.AsSpan(front + active, Math.Max(filled, end) - active).Clear();
        for (var i = end; i < filled; i += Lanes)
        {
            Growth.AsSpan(i, Lanes).Clear();
            loss.AsSpan(i, Lanes).Clear();
            for (var row = 0; row < giftRows; row++)
            {
                gifts.AsSpan((row * giftStride) + giftPad + i, Lanes).Clear();
            }
        }

        filled = end;
    }

    /// <summary>
    /// What eight cells make as the larger partner, by row of <c>gifts</c>: row t goes t − 2 cells up. Shifts run downwards, so each row is complete when its
    /// last contribution has come, and what is not stands in registers.
    /// </summary>
    private void Collide(int at, int active)
    {
        ref var n = ref MemoryMarshal.GetArrayDataReference(number);
        ref var k = ref table.Larger(at / Lanes);
        ref var firstShare = ref MemoryMarshal.GetArrayDataReference(shares);
        ref var gift = ref gifts[giftPad + at];
        var own = Vector512.LoadUnsafe(ref n, (nuint)(front + at));
        var last = Math.Min(active, at + Lanes);
        Vector512<double> all = default, growth = default, plus2 = default, plus1 = default, zero = default, minus1 = default, minus2 = default;
        double stepDown2 = (ratio + 1) / (ratio * ratio), stepDown1 = 1 / ratio, stepUp2 = 1 + ratio, stepUp3 = 1 + ratio + (ratio * ratio);
        var distance = 0;
        for (var shift = highestShift; shift >= 0; shift--)
        {
            Vector512<double> sum = default, linear = default, a = default, b = default, e = default, f = default;
            for (var end = Math.Min(shiftEnd[shift], last); distance < end; distance++)
            {
                var hits = Vector512.LoadUnsafe(ref k, (nuint)(distance * Lanes)) * Vector512.LoadUnsafe(ref n, (nuint)(front + at - distance));
                ref var share = ref Unsafe.Add(ref firstShare, (nuint)(Shares * distance));
                sum += hits;
                linear = Vector512.FusedMultiplyAdd(hits, Vector512.Create(share), linear);
                a = Vector512.FusedMultiplyAdd(hits, Vector512.Create(Unsafe.Add(ref share, 1)), a);
                b = Vector512.FusedMultiplyAdd(hits, Vector512.Create(Unsafe.Add(ref share, 2)), b);
                e = Vector512.FusedMultiplyAdd(hits, Vector512.Create(Unsafe.Add(ref share, 3)), e);
                f = Vector512.FusedMultiplyAdd(hits, Vector512.Create(Unsafe.Add(ref share, 4)), f);
            }

            all += sum;
            growth += shift == 0 ? linear : sum;
            if (at + shift < Redistribution.Below || at + shift + Lanes > cells - 3)
            {
                // by value: registers whose address is taken would live in memory
                var (six, two) = Edges(at, shift, own, sum + (linear * (ratio - 1)));
                (sum, linear, a, b, e, f) = (sum & two, linear & two, a & six, b & six, e & six, f & six);
            }

            var upper = linear + (a * stepDown2) + (b * stepDown1) - (e * stepUp2) - (f * stepUp3);
            (own * (plus2 + f)).StoreUnsafe(ref gift, (nuint)((shift + 5) * giftStride));
            plus2 = plus1 + e;
            plus1 = zero + upper;
            zero = minus1 + sum - upper - a - b - e - f;
            minus1 = minus2 + b;
            minus2 = a;
        }

        (own * plus2).StoreUnsafe(ref gift, (nuint)(4 * giftStride));
        (own * plus1).StoreUnsafe(ref gift, (nuint)(3 * giftStride));
        (own * zero).StoreUnsafe(ref gift, (nuint)(2 * giftStride));
        (own * minus1).StoreUnsafe(ref gift, (nuint)giftStride);
        (own * minus2).StoreUnsafe(ref gift, 0);
        var caught = Caught(at, active);
        (all + caught).StoreUnsafe(ref loss[at]);
        (growth + caught).StoreUnsafe(ref Growth[at]);
    }

    /// <summary>
    /// Near the ends of the grid: new drops without room for six shares get two, and those from the last cell on are left to it whole.
    /// </summary>
    /// <returns>Masks of the cells whose new drops have room for six and for two.</returns>
    private (Vector512<double> Six, Vector512<double> Two) Edges(int at, int shift, Vector512<double> own, Vector512<double> made)
    {
        var target = Vector512.Create((double)(at + shift)) + Vector512.Create(0.0, 1, 2, 3, 4, 5, 6, 7);
        var beyond = Vector512.GreaterThanOrEqual(target, Vector512.Create(cells - 1.0));
        var volume = Vector512.LoadUnsafe(ref volumes[at]);
        past += Vector512.Sum(own * volume * made & beyond) * Math.Pow(ratio, shift);
        var six = Vector512.GreaterThanOrEqual(target, Vector512.Create((double)Redistribution.Below)) & Vector512.LessThan(target, Vector512.Create(cells - 3.0));
        return (six, Vector512.LessThan(target, Vector512.Create(cells - 1.0)));
    }

    /// <summary>How often drops of eight cells are the smaller partner.</summary>
    private Vector512<double> Caught(int at, int active)
    {
        ref var n = ref number[front + at];
        ref var k = ref table.Smaller(at / Lanes);
        Vector512<double> even = default, odd = default;
        var reach = active - at;
        for (var distance = 0; distance < reach; distance += 2)
        {
            // past the last cell stand zeros: an odd reach needs no case of its own
            even = Vector512.FusedMultiplyAdd(Vector512.LoadUnsafe(ref k, (nuint)(distance * Lanes)), Vector512.LoadUnsafe(ref n, (nuint)distance), even);
            odd = Vector512.FusedMultiplyAdd(Vector512.LoadUnsafe(ref k, (nuint)((distance + 1) * Lanes)), Vector512.LoadUnsafe(ref n, (nuint)(distance + 1)), odd);
        }

        return even + odd;
    }

    /// <summary>Adds what each cell is given; what grows past the last cell stays in it.</summary>
    private void Gather(int end, Span<double> rate)
    {
        ref var gift = ref MemoryMarshal.GetArrayDataReference(gifts);
        var reach = Math.Min(Stride, (end + giftRows + Lanes - 1) / Lanes * Lanes);
        rate[reach..].Clear();
        for (var at = 0; at < reach; at += Lanes)
        {
            var sum = -Vector512.LoadUnsafe(ref number[front + at]) * Vector512.LoadUnsafe(ref loss[at]);
            for (var row = 0; row < giftRows; row++)
            {
                sum += Vector512.LoadUnsafe(ref gift, (nuint)((row * giftStride) + giftPad + at - (row - Redistribution.Below)));
            }

            (sum * Vector512.LoadUnsafe(ref volumes[at])).StoreUnsafe(ref rate[at]);
        }

        rate[cells..].Clear();
        rate[cells - 1] += past;
    }

    private int Shift(int distance) => (int)Math.Floor((Math.Log(1 + Math.Pow(ratio, -distance)) / Math.Log(ratio)) + 1e-12);
}
