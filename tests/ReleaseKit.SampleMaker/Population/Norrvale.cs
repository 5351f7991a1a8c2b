namespace ReleaseKit.SampleMaker.Population;

/// <summary>A ward: accounts on the public list of 2030, and how often a household there is behind or goes cold, in 10,000.</summary>
public sealed record Ward(string Name, int ListedIn2030, int BehindIn10000, int ColdIn10000);

public sealed record District(string Name, IReadOnlyList<Ward> Wards)
{
    public int ListedIn2030 => Wards.Sum(ward => ward.ListedIn2030);
}

/// <summary>The invented land of Norrvale. Names and the list of 2030 are public; the rates are not published.</summary>
public static class Norrvale
{
    public static IReadOnlyList<District> Districts { get; } =
    [
        new("Aldermoor",
        [
            new("Harrow Lane", 1563, 892, 218),
            new("Tithe Barn", 1708, 816, 192),
            new("Upper Weir", 1048, 860, 317),
            new("Chantry", 1092, 743, 329),
            new("Larkfield", 1018, 882, 309),
            new("Stone Cross", 1339, 659, 202),
            new("Almond Row", 118, 761, 287),
            new("Priory Gate", 1043, 711, 203),
        ]),
        new("Brackwater",
        [
            new("Lantern Quay", 2028, 1217, 195),
            new("Saltmarket", 2593, 1289, 211),
            new("Ferry Bank", 1357, 1322, 340),
            new("Ropewalk", 2093, 1031, 327),
            new("Customs Steps", 2099, 1203, 192),
            new("Netherport", 1352, 1023, 322),
            new("Chandlers Row", 1172, 1148, 287),
            new("Tern Island", 26, 870, 260),
            new("Gull Rock", 22, 1073, 318),
        ]),
        new("Cindry",
        [
            new("Old Kiln", 1141, 1442, 258),
            new("Ashpit Row", 2047, 1499, 226),
            new("Bellfounders", 1111, 1447, 326),
            new("Cinder Hill", 2208, 1246, 275),
            new("Furnace End", 1099, 1430, 362),
            new("Glassworks", 1028, 1438, 195),
            new("Tilers Yard", 2167, 1255, 307),
            new("Signal Cottages", 44, 1498, 316),
        ]),
        new("Dunmarsh",
        [
            new("Peatside", 1775, 960, 299),
            new("Long Drove", 2099, 1032, 272),
            new("Skerry End", 39, 953, 243),
            new("Reedings", 2526, 892, 358),
            new("Lapwing Fen", 2497, 924, 200),
            new("Turf Bridge", 2076, 953, 314),
            new("Drainers Row", 1913, 975, 366),
            new("Windpump", 48, 1029, 253),
        ]),
        new("Eskerholt",
        [
            new("Crossgates", 2147, 537, 210),
            new("Mill Rise", 1948, 714, 222),
            new("Quarry Top", 2450, 675, 218),
            new("Beacon Down", 1901, 715, 190),
            new("Sheepwash", 2268, 539, 375),
            new("Juniper Bank", 2042, 793, 382),
            new("Kettle Hole", 61, 660, 267),
            new("Drovers Rest", 2323, 679, 332),
            new("High Shieling", 41, 510, 300),
        ]),
        new("Fennick",
        [
            new("Reedham Cut", 1917, 996, 384),
            new("Heron Stairs", 1834, 735, 395),
            new("Sluice House", 1091, 838, 301),
            new("Osier Beds", 2327, 1040, 196),
            new("Willow Lock", 1024, 858, 345),
            new("Cutters Green", 2083, 1048, 390),
            new("Staithe Row", 1812, 845, 363),
            new("Otter Pool", 74, 897, 407),
        ]),
    ];

    public static int ListedIn2030 => Districts.Sum(district => district.ListedIn2030);
}
