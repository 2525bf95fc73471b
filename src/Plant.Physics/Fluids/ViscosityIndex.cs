namespace Plant.Physics.Fluids;

/// <summary>Viscosity index.</summary>
public static class ViscosityIndex
{
    // quadratics a·Y² + b·Y + c for L and d·Y² + e·Y + f for H that follow the standard's table, by upper end of Y
    private static readonly (double To, double A, double B, double C, double D, double E, double F)[] Pieces =
    [
        (3.8, 1.14673, 1.7576, -0.109, 0.84155, 1.5521, -0.077),
        (4.4, 3.38095, -15.4952, 33.196, 0.78571, 1.7929, -0.183),
        (5.0, 2.5, -7.2143, 13.812, 0.82143, 1.5679, 0.119),
        (6.4, 0.101, 16.635, -45.469, 0.04985, 9.1613, -18.557),
        (7.0, 3.35714, -23.5643, 78.466, 0.22619, 7.7369, -16.656),
        (7.7, 0.01191, 21.475, -72.87, 0.79762, -0.7321, 14.61),
        (9.0, 0.41858, 16.1558, -56.04, 0.05794, 10.5156, -28.24),
        (12, 0.88779, 7.5527, -16.6, 0.26665, 6.7015, -10.81),
        (15, 0.7672, 10.7972, -38.18, 0.20073, 8.4658, -22.49),
        (18, 0.97305, 5.3135, -2.2, 0.28889, 5.9741, -4.93),
        (22, 0.97256, 5.25, -0.98, 0.24504, 7.416, -16.73),
        (28, 0.91413, 7.4759, -21.82, 0.20323, 9.1267, -34.23),
        (40, 0.87031, 9.7157, -50.77, 0.18411, 10.1015, -46.75),
        (55, 0.84703, 12.6752, -133.31, 0.17029, 11.4866, -80.62),
        (70, 0.85921, 11.1009, -83.19, 0.1713, 11.368, -76.94),
        (double.PositiveInfinity, 0.8353, 14.67, -216, 0.1684, 11.85, -97),
    ];

    /// <summary>Viscosity index from the viscosities at 40 and 100 °C.</summary>
    /// <param name="viscosity40Mm2S">Kinematic viscosity at 40 °C [mm²/s].</param>
    /// <param name="viscosity100Mm2S">Kinematic viscosity at 100 °C [mm²/s].</param>
    /// <returns>Viscosity index [1], not rounded; null below 2 mm²/s at 100 °C, where it is not defined.</returns>
    /// <remarks>
    /// Equation: A: 100(L − U)/(L − H) up to 100; B: N = (log H − log U)/log Y, (10^N − 1)/0.00715 + 100 above.
    /// Source: ASTM D2270 (equations read). Up to 70 mm²/s L and H are piecewise quadratics that follow the standard's table (from memory, within 0.1 % of the entries checked); exact rounding needs the table itself.
    /// Valid for: 2 mm²/s and more at 100 °C.
    /// </remarks>
    /// <exception cref="ArgumentOutOfRangeException">A viscosity is not above 0.</exception>
    public static double? Of(double viscosity40Mm2S, double viscosity100Mm2S)
    {
        var u = Guard.Positive(viscosity40Mm2S);
        var y = Guard.Positive(viscosity100Mm2S);
        if (y < 2)
        {
            return null;
        }

        var (l, h) = LimitsMm2S(y);
        return u >= h ? 100 * (l - u) / (l - h) : ((Math.Pow(10, (Math.Log10(h) - Math.Log10(u)) / Math.Log10(y)) - 1) / 0.00715) + 100;
    }

    /// <summary>Viscosities at 40 °C of the oils of index 0 (L) and 100 (H) with the same viscosity at 100 °C.</summary>
    /// <param name="viscosity100Mm2S">Kinematic viscosity at 100 °C [mm²/s].</param>
    /// <returns>L and H [mm²/s].</returns>
    public static (double L, double H) LimitsMm2S(double viscosity100Mm2S)
    {
        var y = Guard.Between(viscosity100Mm2S, 2, 1e6);
        foreach (var piece in Pieces)
        {
            if (y <= piece.To)
            {
                return ((((piece.A * y) + piece.B) * y) + piece.C, (((piece.D * y) + piece.E) * y) + piece.F);
            }
        }

        throw new InvalidOperationException("the last piece has no end");
    }
}
