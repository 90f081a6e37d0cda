using WaterMix.Web.Tests;

// Starting the app reads and solves the invented cruise: once for all tests is enough.
[assembly: AssemblyFixture(typeof(RunningApp))]
[assembly: AssemblyFixture(typeof(SmallUploadsApp))]
