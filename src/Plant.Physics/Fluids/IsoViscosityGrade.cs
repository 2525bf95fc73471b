namespace Plant.Physics.Fluids;

/// <summary>Viscosity grades.</summary>
public static class IsoViscosityGrade
{
    private static readonly (int Grade, double MidpointMm2S)[] Grades =
    [
        (2, 2.2), (3, 3.2), (5, 4.6), (7, 6.8), (10, 10), (15, 15), (22, 22), (32, 32), (46, 46), (68, 68), (100, 100), (150, 150), (220, 220),
        (320, 320), (460, 460), (680, 680), (1000, 1000), (1500, 1500), (2200, 2200), (3200, 3200),
    ];

    /// <summary>Grade of a viscosity.</summary>
    /// <param name="viscosity40Mm2S">Kinematic viscosity at 40 °C [mm²/s].</param>
    /// <returns>The grade; null between grades.</returns>
    /// <remarks>Equation: midpoint ± 10 %. Source: ISO 3448 (from memory, unverified).</remarks>
    public static int? Of(double viscosity40Mm2S)
    {
        Guard.Positive(viscosity40Mm2S);
        foreach (var (grade, midpoint) in Grades)
        {
            if (viscosity40Mm2S >= midpoint * 0.9 && viscosity40Mm2S <= midpoint * 1.1)
            {
                return grade;
            }
        }

        return null;
    }

    /// <summary>Midpoint viscosity of a grade.</summary>
    /// <param name="grade">The grade [1].</param>
    /// <returns>Kinematic viscosity at 40 °C [mm²/s]; the grade's own number where the list does not hold it.</returns>
    /// <remarks>Equation: the list. Source: ISO 3448 (from memory, unverified). Valid for: grades 2 to 3200.</remarks>
    public static double MidpointMm2S(double grade)
    {
        Guard.Positive(grade);
        foreach (var (known, midpoint) in Grades)
        {
            if (known.Equals((int)grade) && grade == Math.Floor(grade))
            {
                return midpoint;
            }
        }

        return grade;
    }
}
