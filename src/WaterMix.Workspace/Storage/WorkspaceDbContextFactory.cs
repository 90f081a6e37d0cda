using Microsoft.EntityFrameworkCore;
using Microsoft.EntityFrameworkCore.Design;

namespace WaterMix.Workspace.Storage;

/// <summary>Lets <c>dotnet ef migrations add NAME --project src/WaterMix.Workspace --output-dir Storage/Migrations</c> see the tables without an app.</summary>
internal sealed class WorkspaceDbContextFactory : IDesignTimeDbContextFactory<WorkspaceDbContext>
{
    public WorkspaceDbContext CreateDbContext(string[] args) =>
        new(new DbContextOptionsBuilder<WorkspaceDbContext>().UseSqlite("Data Source=:memory:").Options);
}
