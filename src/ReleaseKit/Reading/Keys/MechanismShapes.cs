namespace ReleaseKit.Reading.Keys;

/// <summary>The objects of mechanisms.json.</summary>
public static class MechanismShapes
{
    public static ObjectShape Root { get; } = new("mechanisms:",
        [
            ("unitOfPrivacy", "\"unitOfPrivacy\": { \"who\": \"household\", \"over\": \"the year 2031\" }"),
            ("neighbouring", "\"neighbouring\": \"add-or-remove\""),
            ("accounting", "\"accounting\": \"concentrated\""),
            ("authorised", "\"authorised\": { \"epsilon\": 6.0, \"delta\": 1e-9 }"),
            ("mechanisms", "\"mechanisms\": [ { \"id\": \"ward-arrears\", \"law\": \"discrete-gaussian\", \"sigma\": 9.5, \"sensitivity\": { \"cellsPerUnit\": 1, \"perCell\": 1 } } ]"),
        ],
        ["$schema", "practice", "composition"], ["spentBefore"]);

    public static ObjectShape UnitOfPrivacy { get; } = new("mechanisms:unitOfPrivacy", [("who", "\"who\": \"household\"")], ["over"], []);

    public static ObjectShape Who { get; } = new("mechanisms:forms", [("one", "\"one\": \"household\""), ("other", "\"other\": \"households\"")], [], []);

    public static ObjectShape Authorised { get; } = new("mechanisms:authorised", [], ["epsilon", "delta", "rho", "by", "on", "paper", "unspent", "over"], [])
    {
        Example = "{ \"epsilon\": 6.0, \"delta\": 1e-9 }",
    };

    public static ObjectShape Practice { get; } = new("mechanisms:practice", [],
        ["heldBy", "sampler", "rows", "corrections", "tuned", "span", "renewal"], [])
    {
        Example = "{ \"sampler\": \"exact integer sampler\" }",
    };

    public static ObjectShape Composition { get; } = new("mechanisms:composition", [], ["together"], [])
    {
        Example = "{ \"together\": [ \"ward-arrears\" ] }",
    };

    public static ObjectShape Group { get; } = new("mechanisms:group", [], [], ["disjoint", "by"]);

    public static ObjectShape Mechanism { get; } = new("mechanisms:mechanism",
        [("id", "\"id\": \"ward-arrears\""), ("law", "\"law\": \"discrete-gaussian\"")],
        [
            "scale", "sigma", "halfWidth", "epsilon", "gamma", "cutoff", "grid", "file", "sensitivity", "spent", "afterwards", "answers", "level",
            "clipped", "denominator", "covers", "use", "describedAt",
        ],
        ["reportTruth", "categories", "respondents", "questionsPerUnit", "weights", "target", "domain", "records", "noTies"]);

    public static ObjectShape Sensitivity { get; } = new("mechanisms:sensitivity", [],
        ["cellsPerUnit", "perCell", "signed", "perUnit", "moves", "l1", "l2", "l1Levels"], [])
    {
        Example = "{ \"cellsPerUnit\": 1, \"perCell\": 1 }",
    };

    public static ObjectShape Spent { get; } = new("mechanisms:spent", [], ["epsilon", "delta", "rho"], [])
    {
        Example = "{ \"rho\": 0.005540167 }",
    };

    public static ObjectShape AfterStep { get; } = new("mechanisms:afterStep", [],
        ["roundTo", "how", "ties", "notBelow", "notAbove", "zeroBelow"], ["adjusted"])
    {
        Example = "{ \"roundTo\": 5 }",
    };

    public static ObjectShape Clipped { get; } = new("mechanisms:clipped", [("from", "\"from\": 0"), ("to", "\"to\": 400")], [], []);

    public static ObjectShape Denominator { get; } = new("mechanisms:denominator", [("public", "\"public\": \"accounts_2030\"")], [], []);

    public static ObjectShape FromColumn { get; } = new("mechanisms:fromColumn", [("column", "\"column\": \"owed_scale\"")], [], []);
}
