namespace Plant.Physics;

/// <summary>The published sources and the standing of what was taken from them; working steps cite these.</summary>
public static partial class Citations
{
    /// <summary>Kell 1975.</summary>
    public const string Kell = "Kell, J. Chem. Eng. Data 20 (1975) 97, density of water at 1 atm (coefficients from memory, within 0.016 kg/m³ of IAPWS)";

    /// <summary>IAPWS liquid water at 0.1 MPa.</summary>
    public const string Iapws = "IAPWS SR6-08, liquid water at 0.1 MPa (read)";

    /// <summary>IAPWS surface tension.</summary>
    public const string IapwsTension = "IAPWS R1-76(2014), surface tension of water (read)";

    /// <summary>Wagner and Pruß.</summary>
    public const string WagnerPruss = "Wagner and Pruß 2002, saturation pressure (from memory, within 0.006 % of IAPWS-IF97)";

    /// <summary>ASTM D341.</summary>
    public const string D341 = "ASTM D341, viscosity-temperature with low-viscosity terms (read)";

    /// <summary>ASTM D2270.</summary>
    public const string D2270 = "ASTM D2270, viscosity index (equations read; L and H up to 70 mm²/s by piecewise quadratics from memory)";

    /// <summary>ISO 3448.</summary>
    public const string Iso3448 = "ISO 3448, viscosity grades (from memory, unverified)";

    /// <summary>ASTM D1250.</summary>
    public const string D1250 = "ASTM D1250-80, volume correction at base 15 °C (read)";

    /// <summary>Linear expansion.</summary>
    public const string Expansion = "linear expansion about 15 °C, by definition";

    /// <summary>Solubility.</summary>
    public const string Solubility = "log10 S = A − B/T, form of IEEE C57.106 (curve as given for the fluid)";

    /// <summary>Defaults of a family.</summary>
    public const string FamilyDefault = "default of the fluid's family (from memory, unverified)";

    /// <summary>Stokes and Schiller–Naumann.</summary>
    public const string SchillerNaumann = "Schiller and Naumann 1933, drag of a sphere (read)";

    /// <summary>Hadamard and Rybczynski.</summary>
    public const string HadamardRybczynski = "Hadamard 1911, Rybczynski 1911, clean fluid sphere (from memory)";

    /// <summary>Richardson and Zaki.</summary>
    public const string RichardsonZaki = "Richardson and Zaki 1954, hindered settling, n = 4.65 (read)";

    /// <summary>Overflow rate.</summary>
    public const string Overflow = "overflow rate of a settling tank: Hazen 1904 (from memory)";

    /// <summary>Geometry.</summary>
    public const string Geometry = "geometry";

    /// <summary>Faraday.</summary>
    public const string Faraday = "Faraday's law with CODATA constants, z = 2, 93.35761 µg/C";

    /// <summary>ISO 12937.</summary>
    public const string Iso12937 = "ISO 12937 repeatability 1.874·√w mg/kg (from memory, unverified)";

    /// <summary>ASTM D6304.</summary>
    public const string D6304 = "ASTM D6304-16 repeatability 0.03813·X^0.6 (from memory, unverified)";

    /// <summary>Cantley 1977.</summary>
    public const string Cantley = "Cantley 1977, tapered roller bearings at 25, 100 and 400 ppm (read)";

    /// <summary>Normal measurement error.</summary>
    public const string Normal = "normal distribution of the measurement error";

    /// <summary>Headspace equilibrium.</summary>
    public const string Headspace = "equal activity of water in oil and headspace";

    /// <summary>Stokes.</summary>
    public const string Stokes = "Stokes 1851, slow rigid sphere";

    /// <summary>Smoluchowski.</summary>
    public const string Smoluchowski = "Smoluchowski 1916, 1917, collisions by diffusion and by laminar shear (from memory)";

    /// <summary>Differential settling.</summary>
    public const string DifferentialSettling = "collisions of drops that settle at different speeds, swept cylinder (from memory)";

    /// <summary>Population balance on cells.</summary>
    public const string KumarRamkrishna = "population balance on geometric cells after Kumar and Ramkrishna 1996 (from memory), six moments kept";

    /// <summary>Dipoles in a field.</summary>
    public const string FieldAttraction = "attraction of two conducting drops in a field, far dipoles at contact (judgement: no published sizing law, calibrate)";

    /// <summary>Judgement.</summary>
    public const string Judgement = "judgement, no published value: calibrate";
}
