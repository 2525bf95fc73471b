namespace Plant.Physics.Fluids;

/// <summary>Chemical family of a working fluid; it decides the defaults and what may be done to the fluid.</summary>
public enum FluidFamily
{
    /// <summary>Mineral lubricating oil.</summary>
    Mineral,

    /// <summary>Polyalphaolefin.</summary>
    Pao,

    /// <summary>Synthetic ester (diester, polyol ester).</summary>
    Ester,

    /// <summary>Phosphate ester, as in fire-resistant control fluids.</summary>
    PhosphateEster,

    /// <summary>Polyalkylene glycol; soluble in water or not.</summary>
    Pag,

    /// <summary>Natural ester (vegetable oil).</summary>
    NaturalEster,

    /// <summary>Silicone fluid.</summary>
    Silicone,

    /// <summary>Mineral transformer oil.</summary>
    TransformerMineral,

    /// <summary>Diesel fuel.</summary>
    Diesel,
}
