using System.Text;

namespace Convection.Correlations.Catalogue;

/// <summary>What is not shipped, why, and how a user who has the paper adds it.</summary>
internal static class HeldBackPage
{
    private static readonly (string What, string Why)[] Rows =
    [
        ("Khalifa & Marshall 1990, two more equations", "coefficients recalled without their place"),
        ("Awbi & Hatton 1999, partially heated surfaces", "coefficients not recorded"),
        ("Hatton & Awbi 1995, wall and floor", "an early fit, superseded in 1999; recalled, low"),
        ("Awbi & Hatton 2000, jets over heated surfaces", "constants, assignment and a unit are recalled in several ways"),
        ("McAdams 1954, vertical turbulent with 0.13", "a compromise for liquids and gases; for air 0.10 agrees with Churchill & Chu"),
        ("Fujii & Imura 1972, horizontal facing up", "0.13 and 0.16 circulate in opposite order"),
        ("Jaffer 2023, any inclination", "formula not recorded"),
        ("Karadağ & Teke 2008, heated floor", "formula not recorded"),
        ("Causone et al. 2009, totals", "13.2 does not equal 5.6 + 4.4, nor 5.8 quite 5.6 + 0.3; other reference temperatures may explain it"),
        ("Andrés-Chicote et al. 2012, chilled ceiling", "4.2 recalled with low to medium confidence"),
        ("Cholewa et al. 2013; Koca et al. 2014", "numbers not recorded"),
        ("Wallentén 2001; Delaforce et al. 1993; Halcrow 1987; Altmayer et al. 1983; Bauman et al. 1983", "formulas or numbers not recorded"),
        ("Li et al. 1987, stratified office", "numbers recalled with low confidence"),
        ("Fisher 1995, ceiling under a free side jet", "0.00444 is implausibly small; a digit slip (0.0444) cannot be excluded"),
        ("Fisher 1995, attached side jets and other regressions", "coefficients not recorded"),
        ("Goldstein & Novoselac 2010, window with blinds", "coefficients not recorded"),
        ("Novoselac et al. 2006, displacement floor and ceiling with mixing jet", "constant recalled as 0.47, 0.48 and 0.49"),
        ("Jeong & Mumma 2003, chilled ceiling with supply air", "form not recorded; only its size, 5 to 35 %, is quoted"),
        ("Neiswanger et al. 1987; Chandra & Kerestecioglu 1984; Rincón-Casado et al. 2018; Kong 2006", "coefficients not recorded"),
        ("Artmann et al. 2010; Le Dréau et al. 2013; Leenknegt et al. 2012, night ventilation", "no usable form recorded"),
        ("Gao et al. 2015, largest value under an offset jet", "not a coefficient of a room surface"),
        ("McAdams speed forms, ISO 6946 4 + 4v, CIBSE and Loveday & Taki", "wind on outside surfaces; at interior speeds they exceed physics"),
    ];

    public static string Write()
    {
        var text = new StringBuilder();
        text.Append("# What is held back\n\nThese are known to exist and are not shipped. Whoever has the paper can add them in ten lines.\n\n| what | why |\n|---|---|\n");
        foreach ((string what, string why) in Rows)
        {
            text.Append("| ").Append(what).Append(" | ").Append(why).Append(" |\n");
        }

        return text.Append("""

            ## Adding one

            ```csharp
            var mine = new Correlation
            {
                Id = CorrelationId.Parse("author-2001/floor-displacement"),
                Title = "floor of a room with a displacement inlet",
                Publication = new() { Key = "author-2001", Authors = "A. Author", Year = 2001, Title = "Title", Source = "Journal 1(2), 3-4", ShortName = "Author (2001)" },
                Family = CorrelationFamily.Forced,
                Applies = new() { Surfaces = SurfaceSet.Floor, Driver = FlowDriver.DisplacementInlet },
                Law = new FlowLaw(DrivingVariable.AirChangeRate, intercept: 0, slope: 0.5, exponent: 0.8),
                Reference = ReferenceTemperature.SupplyAir,
                Range = new(new RangeLimit(RangeVariable.AirChangeRate, new(2, 8), RangeOrigin.Source)),
                Evidence = new(EvidenceKind.FullScaleRoom, "what was measured, and where"),
                TextCheck = TextCheck.Quoted,
            };
            CorrelationRegistry registry = PublishedLiterature.Registry.With(mine);
            ```

            The numbers above are placeholders. A registry checks that the parts fit together, and `RoomConvection.Bind(room, registry)` ranks
            the new correlation like any other.

            [All correlations](README.md)

            """).ToString();
    }
}
