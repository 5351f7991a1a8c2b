using ReleaseKit.SampleMaker;

if (args is not [var folder] || !Directory.Exists(folder))
{
    Console.Error.WriteLine("Call: dotnet run --project tests/ReleaseKit.SampleMaker -- sample-release (the folder that holds release.json).");
    return 2;
}

Sample.Write(new Sample().Noised(), folder);
return 0;
