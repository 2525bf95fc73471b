namespace Plant.Physics;

/// <content>Sources of the separators.</content>
public static partial class Citations
{
    /// <summary>Mixed tank with a side stream.</summary>
    public const string MixedTank = "water balance of a well mixed tank with a side stream, closed form";

    /// <summary>Removal of undissolved water.</summary>
    public const string Undissolved = "definition of the removal efficiency, applied to what is above saturation";

    /// <summary>Floor of an absorbent.</summary>
    public const string AbsorbentFloor = "an absorbent takes dissolved water down to a relative saturation of about 0.5 (judgement)";

    /// <summary>Ideal vapour in purge air.</summary>
    public const string PurgeAir = "ideal water vapour carried out by air, equal activity of oil and headspace";

    /// <summary>Latent heat.</summary>
    public const string LatentHeat = "latent heat 2.501e6 − 2361·t J/kg (from memory, within 0.2 % of steam tables to 100 °C)";

    /// <summary>Young and Laplace.</summary>
    public const string YoungLaplace = "Young 1805, Laplace 1806, capillary pressure of a round pore (read)";

    /// <summary>Two conducting spheres.</summary>
    public const string TwoSpheres = "two uncharged conducting spheres in a field along their axis, bispherical series (Davis 1964, from memory; derived anew and checked by multipoles)";

    /// <summary>Far dipoles.</summary>
    public const string FarDipole = "two induced dipoles far apart";

    /// <summary>Taylor 1964.</summary>
    public const string Taylor = "Taylor 1964, break-up of a conducting drop in a field (read; 0.21025 by the spheroid balance)";

    /// <summary>Charge relaxation.</summary>
    public const string Relaxation = "Maxwell and Wagner, relaxation of charge (from memory)";

    /// <summary>Kuwabara 1959.</summary>
    public const string Kuwabara = "Kuwabara 1959, flow through a cell of fibres (from memory)";

    /// <summary>Lee and Liu 1982.</summary>
    public const string LeeLiu = "Lee and Liu 1982, diffusion to fibres (coefficient from memory)";

    /// <summary>Filter bed.</summary>
    public const string FibreBed = "penetration of a fibre bed, exponential in thickness (from memory)";

    /// <summary>Spielman and Goren.</summary>
    public const string SpielmanGoren = "Spielman and Goren 1968, London attraction to a fibre; limit of thin trajectories, derived anew";

    /// <summary>Davies 1952.</summary>
    public const string Davies = "Davies 1952, pressure drop of fibre beds, solidity 0.006 to 0.3 (from memory)";

    /// <summary>Einstein.</summary>
    public const string StokesEinstein = "Stokes and Einstein, diffusion coefficient kT/(3πμd)";

    /// <summary>Bayes.</summary>
    public const string Bayes = "Bayes' rule; priors and signatures are judgement and meant to be edited";
}
