using System.Text.Json;
using Json.Schema;
using ReleaseKit.Reading.Keys;
using ReleaseKit.Tests.Folders;
using Xunit;

namespace ReleaseKit.Tests.Reading;

/// <summary>The JSON Schemas (draft 2020-12) that editors use say the same as the reader.</summary>
public sealed class SchemaTests
{
    private static readonly JsonDocumentOptions Lenient = new() { AllowTrailingCommas = true, CommentHandling = JsonCommentHandling.Skip };

    public static TheoryData<string> Shapes => [.. AllShapes.Keys];

    private static Dictionary<string, ObjectShape> AllShapes { get; } = new[] { typeof(ReleaseShapes), typeof(MechanismShapes), typeof(SignOffShapes) }
        .SelectMany(shapes => shapes.GetProperties()).Select(property => (ObjectShape)property.GetValue(null)!).ToDictionary(shape => shape.Name);

    [Theory]
    [MemberData(nameof(Shapes))]
    public void Schema_and_reader_know_the_same_keys(string shape) =>
        Assert.Equal(AllShapes[shape].Keys.Order(), Definition(shape).GetProperty("properties").EnumerateObject().Select(key => key.Name).Order());

    [Theory]
    [MemberData(nameof(Shapes))]
    public void Schema_and_reader_require_the_same_keys(string shape)
    {
        var required = Definition(shape).TryGetProperty("required", out var list) ? list.EnumerateArray().Select(key => key.GetString()) : [];
        Assert.Equal(AllShapes[shape].Must.Select(must => must.Key).Order(), required.Order());
    }

    [Theory]
    [MemberData(nameof(Shapes))]
    public void Every_key_has_a_description(string shape) => Assert.All(
        Definition(shape).GetProperty("properties").EnumerateObject(),
        key => Assert.NotEqual("", Described(shape, key.Value).GetProperty("description").GetString()));

    [Fact]
    public void Every_definition_with_keys_of_its_own_is_read()
    {
        var defined = new[] { "release", "mechanisms", "signoff" }.SelectMany(file => Schema(file).RootElement.GetProperty("$defs").EnumerateObject()
            .Where(definition => definition.Value.TryGetProperty("properties", out _)).Select(definition => $"{file}:{definition.Name}"));
        Assert.Empty(defined.Except(AllShapes.Keys));
    }

    [Theory]
    [InlineData("release")]
    [InlineData("mechanisms")]
    public void Example_is_valid(string file) => AssertValid(file, Path.Combine(Repository.Example, $"{file}.json"));

    [Theory]
    [InlineData("release")]
    [InlineData("mechanisms")]
    [InlineData("signoff")]
    public void Sample_is_valid(string file) => AssertValid(file, Path.Combine(Repository.Sample, $"{file}.json"));

    [Fact]
    public void Small_folder_is_valid()
    {
        using var folder = new TestFolder();
        AssertValid("release", Path.Combine(folder.Root, "release.json"));
        AssertValid("mechanisms", Path.Combine(folder.Root, "mechanisms.json"));
    }

    [Fact]
    public void Misspelt_key_is_not_valid()
    {
        using var release = JsonDocument.Parse(TestFolder.Release.Replace("\"headlines\"", "\"headline\"", StringComparison.Ordinal), Lenient);
        Assert.False(Evaluate("release", release).IsValid);
    }

    private static void AssertValid(string file, string path)
    {
        using var document = JsonDocument.Parse(File.ReadAllText(path), Lenient);
        var result = Evaluate(file, document);
        var errors = (result.Details ?? []).Where(detail => detail.Errors is { Count: > 0 }).Select(detail => $"{detail.InstanceLocation}: {string.Join("; ", detail.Errors!.Values)}");
        Assert.True(result.IsValid, string.Join("\n", errors));
    }

    private static EvaluationResults Evaluate(string file, JsonDocument document) => JsonSchema.FromText(Schema(file).RootElement.GetRawText())
        .Evaluate(document.RootElement, new EvaluationOptions { OutputFormat = OutputFormat.List, RequireFormatValidation = true });

    private static JsonElement Definition(string shape)
    {
        var (file, name) = (shape.Split(':')[0], shape.Split(':')[1]);
        var root = Schema(file).RootElement;
        return name.Length == 0 ? root : root.GetProperty("$defs").GetProperty(name);
    }

    /// <summary>The key itself, or the definition that it refers to.</summary>
    private static JsonElement Described(string shape, JsonElement key) =>
        key.TryGetProperty("description", out _) ? key : Definition($"{shape.Split(':')[0]}:{key.GetProperty("$ref").GetString()!.Split('/')[^1]}");

    private static JsonDocument Schema(string file) =>
        JsonDocument.Parse(File.ReadAllText(Path.Combine(AppContext.BaseDirectory, "site-templates", "schemas", $"{file}.schema.json")));
}
