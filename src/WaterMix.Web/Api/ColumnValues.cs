namespace WaterMix.Web.Api;

/// <summary>The value of a column for one sample, by the sample's index from 0; NaN where there is none.</summary>
internal delegate double ColumnValues(int row);
