using Convection.Correlations.Registry;

namespace Convection.Correlations.Literature;

/// <summary>The published correlations that this library ships.</summary>
public static class PublishedLiterature
{
    /// <summary>Version of the shipped data. It changes whenever a number, a range or a doubt changes.</summary>
    public const string DataVersion = "2026.12";

    /// <summary>The registry of everything shipped.</summary>
    /// <remarks>Made once, when first asked for; immutable and safe to share between threads.</remarks>
    public static CorrelationRegistry Registry => Holder.Registry;

    private static class Holder
    {
        public static readonly CorrelationRegistry Registry = new(
            [
                .. AlamdariHammond1983.All,
                .. Ashrae1993.All,
                .. Ashrae2001.All,
                .. Ashrae2009.All,
                .. Ashrae2012.All,
                .. AwbiHatton1999.All,
                .. BeausoleilMorrison2001.All,
                .. Causone2009.All,
                .. Churchill1977.All,
                .. ChurchillChu1975.All,
                .. Cibse1986.All,
                .. Colburn1933.All,
                .. En12642.All,
                .. En12645.All,
                .. En673.All,
                .. Fisher1995.All,
                .. FisherPedersen1997.All,
                .. FohannoPolidori2006.All,
                .. FujiiImura1972.All,
                .. Glueck1982.All,
                .. Goldstein1973.All,
                .. GoldsteinNovoselac2010.All,
                .. Iso118552.All,
                .. Iso15099.All,
                .. Iso6946.All,
                .. Karadag2009.All,
                .. KhalifaMarshall1990.All,
                .. Lienhard2020.All,
                .. LloydMoran1974.All,
                .. McAdams1954.All,
                .. Min1956.All,
                .. Novoselac2006.All,
                .. Olesen2008.All,
                .. Pohlhausen1921.All,
                .. RadziemskaLewandowski2001.All,
                .. RaithbyHollands1998.All,
                .. Schulenberg1985.All,
                .. Siebers1983.All,
                .. Spitler1991.All,
            ],
            DataVersion);
    }
}
