namespace WaterMix.Web.Api;

/// <summary>The form of <c>POST /api/solve</c>, for the description only: the parts are read as they arrive.</summary>
/// <param name="Samples">The sample files.</param>
/// <param name="Model">The mixing model.</param>
/// <param name="EndMembers">The set that the model names, unless it is in the model.</param>
/// <param name="Columns">A column match.</param>
internal sealed record SolveForm(IFormFileCollection Samples, IFormFile Model, IFormFile? EndMembers, IFormFile? Columns);

/// <summary>The form of <c>POST /api/inspect</c>, likewise.</summary>
/// <param name="Samples">The sample files.</param>
/// <param name="Columns">A column match.</param>
internal sealed record InspectForm(IFormFileCollection Samples, IFormFile? Columns);
