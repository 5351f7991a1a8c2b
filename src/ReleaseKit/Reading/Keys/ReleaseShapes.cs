namespace ReleaseKit.Reading.Keys;

/// <summary>The objects of release.json.</summary>
public static class ReleaseShapes
{
    public static ObjectShape Root { get; } = new("release:",
        [
            ("title", "\"title\": \"Energy Hardship Register 2031\""),
            ("identifier", "\"identifier\": \"ehr-2031\""),
            ("publisher", "\"publisher\": { \"name\": \"Office\", \"contact\": \"figures@office.example\" }"),
            ("published", "\"published\": \"2032-03-16T09:30:00+01:00\""),
            ("tables", "\"tables\": [ { \"id\": \"arrears\", \"file\": \"tables/arrears.csv\", … } ]"),
        ],
        [
            "$schema", "lead", "referencePeriod", "next", "address", "licence", "languages", "coverage", "reliability", "edition", "units", "look",
            "narrative", "short", "headlines", "charts",
        ],
        ["derived", "replaces", "changes"]);

    public static ObjectShape Publisher { get; } = new("release:publisher",
        [("name", "\"name\": \"Norrvale Office for Public Figures\""), ("contact", "\"contact\": \"figures@nopf.example\"")], ["homepage"], []);

    public static ObjectShape Licence { get; } = new("release:licence", [("name", "\"name\": \"CC BY 4.0\"")], ["url"], []);

    public static ObjectShape Coverage { get; } = new("release:coverage", [], ["main", "also"], [])
    {
        Example = "{ \"main\": 0.95, \"also\": [0.5, 0.99] }",
    };

    public static ObjectShape Reliability { get; } = new("release:reliability", [], ["close", "rough"], [])
    {
        Example = "{ \"close\": 0.1, \"rough\": 0.5 }",
    };

    public static ObjectShape Edition { get; } = new("release:edition", [], ["number", "printing", "status"], ["replaces", "changes"])
    {
        Example = "{ \"number\": 1, \"printing\": 1, \"status\": \"first\" }",
    };

    public static ObjectShape Forms { get; } = new("release:forms", [("one", "\"one\": \"household\""), ("other", "\"other\": \"households\"")], [], []);

    public static ObjectShape Look { get; } = new("release:look", [], ["accent", "foot"], [])
    {
        Example = "{ \"accent\": \"#7A1D4E\" }",
    };

    public static ObjectShape Narrative { get; } = new("release:narrative", [("file", "\"file\": \"narrative/summary.md\"")], ["language"], []);

    public static ObjectShape Headline { get; } = new("release:headline",
        [("figure", "\"figure\": \"arrears/in_arrears?ward=All\"")], ["title", "meaning"], ["selectedFrom", "selectedAs"]);

    public static ObjectShape Table { get; } = new("release:table",
        [
            ("id", "\"id\": \"arrears\""), ("file", "\"file\": \"tables/arrears.csv\""), ("title", "\"title\": \"Households in arrears, by ward\""),
            ("stub", "\"stub\": [ { \"column\": \"ward\", \"title\": \"Ward\" } ]"),
            ("figures", "\"figures\": [ { \"column\": \"in_arrears\", \"title\": \"Households in arrears\", \"kind\": \"count\", \"noise\": [ { \"mechanism\": \"ward-arrears\" } ] } ]"),
        ],
        ["universe", "source", "notes", "columns", "adds", "page", "places", "rows", "hidden", "statuses"],
        ["sampling"]);

    public static ObjectShape Note { get; } = new("release:note", [("text", "\"text\": \"New boundary in 2031.\"")], ["at"], []);

    public static ObjectShape Stub { get; } = new("release:stub", [("column", "\"column\": \"ward\"")], ["title", "all", "period"], []);

    public static ObjectShape Figure { get; } = new("release:figure",
        [("column", "\"column\": \"in_arrears\"")],
        ["title", "unit", "kind", "per", "in", "decimals", "lowest", "highest", "multiplier", "shown", "noise", "unadjustedColumn"],
        ["derived", "publishedWhen", "drawColumn", "sampling"]);

    public static ObjectShape NoiseRule { get; } = new("release:noiseRule", [],
        ["where", "mechanism", "sumOver", "exact", "public"], ["sameDrawAs", "stated", "mechanisms"])
    {
        Example = "{ \"mechanism\": \"ward-arrears\" }",
    };

    public static ObjectShape Column { get; } = new("release:column", [("from", "\"from\": \"public\"")], ["mechanism"], []);

    public static ObjectShape Addition { get; } = new("release:addition",
        [("figure", "\"figure\": \"in_arrears\""), ("over", "\"over\": \"ward\"")], ["total"], []);

    public static ObjectShape Page { get; } = new("release:page", [], ["cutBy"], [])
    {
        Example = "{ \"cutBy\": \"district\" }",
    };

    public static ObjectShape Rows { get; } = new("release:rows", [], [], ["foundInData"]);

    public static ObjectShape Hidden { get; } = new("release:hidden", [("by", "\"by\": \"public-rule\"")], ["inTotals"], []);

    public static ObjectShape Statuses { get; } = new("release:statuses", [], ["column", "marks"], [])
    {
        Example = "{ \"marks\": { \"[c]\": \"Q\" } }",
    };

    public static ObjectShape Chart { get; } = new("release:chart",
        [("id", "\"id\": \"by-district\""), ("title", "\"title\": \"In arrears by district\""), ("figures", "\"figures\": \"arrears/in_arrears?ward=All\"")],
        ["form"], []);
}
