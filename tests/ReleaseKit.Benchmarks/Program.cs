using BenchmarkDotNet.Running;
using ReleaseKit.Benchmarks;

if (args is ["questions"])
    QuestionTable.Print(Console.Out);
else
    BenchmarkSwitcher.FromAssembly(typeof(Program).Assembly).Run(args);
